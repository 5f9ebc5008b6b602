package org.crossreach.evidence;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.crossreach.acceptance.Rivers;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.discharge.Reduction;
import org.crossreach.profile.Zone;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.Simulation;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Hidden cells find the law by which a virtual river flows, and say so when they cannot tell.
 *
 * <p>Validation: the law of each river is known. Noise: 0.15 m/s in every cell, 1.5 cm/s in the
 * boat's velocity, 1 % in every beam's depth, turbulence of 5 % that stays correlated for 9 s.
 */
class ComparerTest {

  private static final String NOISE =
      "{\"water_mps\": 0.15, \"boat_mps\": 0.015, \"depth_share\": 0.01,"
          + " \"turbulence_share\": 0.05, \"turbulence_s\": 9}";

  /** One short pass of a poor instrument. */
  private static final String HEAVY_NOISE =
      "{\"water_mps\": 0.6, \"boat_mps\": 0.03, \"depth_share\": 0.02,"
          + " \"turbulence_share\": 0.1, \"turbulence_s\": 9}";

  static Stream<Arguments> truths() {
    return Stream.of(
        Arguments.of(
            "constant near the surface",
            "{\"law\": \"constant-above\", \"exponent\": 0.16667, \"share\": 0.6}",
            Zone.TOP,
            "constant"),
        Arguments.of(
            "slowed by wind",
            "{\"law\": \"wind-above\", \"exponent\": 0.16667, \"share\": 0.6,"
                + " \"surface_factor\": 0.8}",
            Zone.TOP,
            "three-point"),
        Arguments.of(
            "no slip at a rough bed under nearly even water",
            "{\"law\": \"rough-below\", \"exponent\": 0.05, \"share\": 0.3,"
                + " \"bed_exponent\": 0.16667}",
            Zone.BOTTOM,
            "no-slip"),
        Arguments.of(
            "log law, top",
            "{\"law\": \"logarithmic\", \"roughness_m\": 0.003}",
            Zone.TOP,
            "power"),
        Arguments.of(
            "log law, bottom",
            "{\"law\": \"logarithmic\", \"roughness_m\": 0.003}",
            Zone.BOTTOM,
            "power"),
        Arguments.of(
            "power law", "{\"law\": \"power\", \"exponent\": 0.16667}", Zone.TOP, "power"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("truths")
  void findsTheTrueLaw(String name, String vertical, Zone zone, String law) throws Exception {
    Score score = score(vertical, NOISE, 4, zone, law, 3);
    assertEquals(3, score.right(), name + ": " + score);
  }

  /** At least 90 of 100 right, and of the others more undecided than wrong. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("truths")
  @Tag("study")
  void findsTheTrueLawNineTimesInTen(String name, String vertical, Zone zone, String law)
      throws Exception {
    Score score = score(vertical, NOISE, 4, zone, law, 100);
    assertTrue(score.right() >= 90, name + ": " + score);
    assertTrue(score.wrong() <= score.undecided() || score.wrong() <= 2, name + ": " + score);
  }

  /** Where noise drowns the difference it is seldom wrong: it says that it cannot tell. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("truths")
  @Tag("study")
  void cannotTellRatherThanWrong(String name, String vertical, Zone zone, String law)
      throws Exception {
    Score score = score(vertical, HEAVY_NOISE, 1, zone, law, 100);
    assertTrue(score.wrong() <= 15, name + ": " + score);
    assertTrue(score.wrong() < score.undecided() || score.wrong() <= 5, name + ": " + score);
  }

  private record Score(int right, int undecided, int wrong) {}

  private static Score score(
      String vertical, String noise, int passes, Zone zone, String law, int seeds)
      throws Exception {
    Recipe recipe =
        new Rivers().vertical(vertical).noise(noise).skew(8).wobble(2).passes(passes).recipe();
    int right = 0;
    int undecided = 0;
    for (int seed = 0; seed < seeds; seed++) {
      Comparison comparison = compare(recipe.withSeed(seed), Settings.defaults());
      ZoneEvidence evidence = zone == Zone.TOP ? comparison.top() : comparison.bottom();
      undecided += evidence.law().isEmpty() ? 1 : 0;
      right += evidence.law().orElse("").equals(law) ? 1 : 0;
    }
    return new Score(right, undecided, seeds - right - undecided);
  }

  private static Comparison compare(Recipe recipe, Settings settings) throws Exception {
    return new Comparer(2).compare(Simulation.run(recipe).measurement(), settings);
  }

  /** Shared work gives to the last bit what each combination gives alone. */
  @Test
  void everyCombinationIsTheReductionItself() throws Exception {
    Simulation simulation = Simulation.run(new Rivers().noise(NOISE).recipe());
    Comparison comparison = new Comparer(1).compare(simulation.measurement(), Settings.defaults());
    assertEquals(18, comparison.combinations().size());
    for (CombinationResult each : comparison.combinations()) {
      Settings settings = each.combination().in(Settings.defaults());
      Result alone = Result.of(new Reducer(1).reduce(simulation.measurement(), settings));
      assertEquals(
          alone.summary().dischargeM3s().mean(),
          each.dischargeM3s().mean(),
          each.combination().text());
    }
    assertEquals(0, comparison.of(comparison.chosenCombination()).changePct());
  }

  @Test
  void comparesWhatIsReducedAlready() throws Exception {
    Simulation simulation = Simulation.run(new Rivers().noise(NOISE).recipe());
    Comparison anew = new Comparer(1).compare(simulation.measurement(), Settings.defaults());
    Reduction reduction = new Reducer(1).reduce(simulation.measurement(), Settings.defaults());
    Comparison later = new Comparer(1).compare(reduction);
    assertEquals(anew.verdict(), later.verdict());
    assertEquals(anew.top(), later.top());
    assertEquals(anew.bottom(), later.bottom());
  }

  /** Without noise the right law misses nothing, and the chosen settings stay. */
  @Test
  void rightLawPredictsExactly() throws Exception {
    Comparison comparison = compare(new Rivers().recipe(), Settings.defaults());
    CandidateEvidence top = comparison.evidenceAtTop(comparison.chosenCombination());
    CandidateEvidence bottom = comparison.evidenceAtBottom(comparison.chosenCombination());
    // What is left comes from cells that are not quite a depth's share in sloping water.
    assertEquals(0, top.biasPct(), 0.02);
    assertEquals(0, bottom.biasPct(), 0.05);
    CandidateEvidence constant =
        comparison.top().on(Candidate.of(TopLaw.CONSTANT, ExponentRule.FIXED));
    assertTrue(constant.biasPct() < -1, "a constant is too slow for a power law: " + constant);
    assertEquals(Verdict.Kind.KEEP, comparison.verdict().kind());
  }

  @Test
  void favoursAnotherLawWithItsReason() throws Exception {
    Recipe wind =
        new Rivers()
            .vertical(
                "{\"law\": \"wind-above\", \"exponent\": 0.16667, \"share\": 0.6,"
                    + " \"surface_factor\": 0.7}")
            .noise(NOISE)
            .passes(4)
            .recipe();
    Verdict verdict = compare(wind, Settings.defaults()).verdict();
    assertEquals(Verdict.Kind.CHANGE, verdict.kind());
    assertEquals(TopLaw.THREE_POINT, verdict.combination().top());
    assertTrue(verdict.changePct() < -1, verdict.toString());
    assertTrue(verdict.sentence().contains("it would change the discharge by"), verdict.sentence());
    Settings changed = verdict.combination().in(Settings.defaults());
    Verdict again = compare(wind, changed).verdict();
    assertEquals(Verdict.Kind.KEEP, again.kind(), "what was favoured is kept: " + again);
  }

  /** Noise that turns single columns round does not make the flow of a slack stronger. */
  @Test
  void slackWaterBringsNoBias() throws Exception {
    double bias = 0;
    for (int seed = 0; seed < 4; seed++) {
      Recipe slack = new Rivers().noise("{\"water_mps\": 6}").passes(6).recipe().withSeed(seed);
      Comparison comparison = compare(slack, Settings.defaults());
      CandidateEvidence top = comparison.evidenceAtTop(comparison.chosenCombination());
      bias += top.biasPct() / top.half95Pct() * 1.96 / 4;
    }
    assertEquals(0, bias, 1.5, "mean of four in standard errors: three of its own");
  }

  /** Columns of fewer than seven cells cannot spare one. */
  @Test
  void saysWhenNoCellCanBeHidden() throws Exception {
    Comparison comparison =
        compare(
            new Rivers().faults("{\"lost_cells\": 0.8}").noise(NOISE).recipe(),
            Settings.defaults());
    assertEquals(Verdict.Kind.CANNOT_TELL, comparison.verdict().kind());
    assertEquals(comparison.chosenCombination(), comparison.verdict().combination());
    assertTrue(comparison.top().law().isEmpty());
    assertTrue(comparison.bottom().law().isEmpty());
  }

  @Test
  void knowsWhichLawsHaveAnExponent() {
    assertEquals("constant", Candidate.of(TopLaw.CONSTANT, ExponentRule.FIT_ALL).text());
    assertEquals("no-slip fit-all", Candidate.of(BottomLaw.NO_SLIP, ExponentRule.FIT_ALL).text());
    assertEquals(5 + 6, Candidate.all().size());
  }
}
