package org.crossreach.evidence;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.crossreach.acceptance.Rivers;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.settings.Settings;
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
 * <p>Validation: the law of each river is known; noise as in a good field record.
 */
class ComparisonTest {

  private static final String NOISE =
      "{\"water_mps\": 0.15, \"boat_mps\": 0.015, \"depth_share\": 0.01,"
          + " \"turbulence_share\": 0.05, \"turbulence_s\": 9}";

  static Stream<Arguments> truths() {
    return Stream.of(
        Arguments.of(
            "constant near the surface",
            "{\"law\": \"constant-above\", \"exponent\": 0.1667, \"share\": 0.6}",
            true,
            "constant"),
        Arguments.of(
            "slowed by wind",
            "{\"law\": \"wind-above\", \"exponent\": 0.1667, \"share\": 0.6,"
                + " \"surface_factor\": 0.7}",
            true,
            "three-point"),
        Arguments.of(
            "no slip at a rough bed under nearly even water",
            "{\"law\": \"rough-below\", \"exponent\": 0.04, \"share\": 0.3,"
                + " \"bed_exponent\": 0.1667}",
            false,
            "no-slip"),
        Arguments.of(
            "log law", "{\"law\": \"logarithmic\", \"roughness_m\": 0.003}", true, "power"),
        Arguments.of(
            "log law", "{\"law\": \"logarithmic\", \"roughness_m\": 0.003}", false, "power"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("truths")
  void ranksTheTrueLawFirst(String name, String vertical, boolean top, String law)
      throws Exception {
    assertTrue(right(vertical, top, law, 5) >= 4, name);
  }

  /** At least 90 of 100. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("truths")
  @Tag("study")
  void ranksTheTrueLawFirstNineTimesInTen(String name, String vertical, boolean top, String law)
      throws Exception {
    assertTrue(right(vertical, top, law, 100) >= 90, name);
  }

  private static int right(String vertical, boolean top, String law, int seeds) throws Exception {
    Recipe recipe = new Rivers().vertical(vertical).noise(NOISE).passes(4).recipe();
    int right = 0;
    for (int seed = 0; seed < seeds; seed++) {
      Comparison comparison = compare(recipe.withSeed(seed));
      Verdict verdict = top ? comparison.top() : comparison.bottom();
      right += verdict.best().candidate().law().equals(law) ? 1 : 0;
    }
    return right;
  }

  @Test
  void chosenCombinationIsTheReductionItself() throws Exception {
    Simulation simulation = Simulation.run(new Rivers().noise(NOISE).recipe());
    Comparison comparison = compare(simulation.recipe());
    double mean =
        Result.of(new Reducer(1).reduce(simulation.measurement(), Settings.defaults()))
            .summary()
            .dischargeM3s()
            .mean();
    assertEquals(mean, comparison.chosen().discharge().mean());
    assertEquals(0, comparison.chosen().changePct());
    assertEquals(18, comparison.choices().size());
  }

  /** Without noise and with the right law nothing is left of the error. */
  @Test
  void rightLawPredictsExactly() throws Exception {
    Comparison comparison = compare(new Rivers().recipe());
    assertEquals(0, comparison.chosen().top().biasPct(), 0.02);
    assertEquals(0, comparison.chosen().bottom().biasPct(), 0.05);
    assertEquals(Verdict.Finding.SUPPORTS, comparison.top().finding());
    assertTrue(comparison.conclusion().startsWith("The evidence supports top power"));
    for (Choice choice : comparison.choices()) {
      if (choice.settings().top().key().equals("constant")) {
        assertTrue(choice.top().biasPct() < -1, "a constant is too slow for a power law");
      }
    }
  }

  /** Two cells in a column cannot spare one. */
  @Test
  void saysWhenThereIsNoEvidence() throws Exception {
    Comparison comparison =
        compare(new Rivers().faults("{\"lost_cells\": 0.8}").noise(NOISE).recipe());
    assertEquals(Verdict.Finding.NO_EVIDENCE, comparison.bottom().finding());
    assertTrue(comparison.conclusion().startsWith("The evidence cannot tell"));
    assertEquals(comparison.chosen(), comparison.favoured());
  }

  private static Comparison compare(Recipe recipe) throws Exception {
    return Comparison.of(Simulation.run(recipe).measurement(), Settings.defaults(), new Reducer(2));
  }
}
