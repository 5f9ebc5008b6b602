package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Exponents;
import org.crossreach.discharge.LaidMeasurement;
import org.crossreach.discharge.Reducer;
import org.crossreach.profile.Zone;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;

/**
 * Every choice of extrapolation for one measurement, with the evidence for each.
 *
 * @param measurement what was recorded
 * @param settings the chosen settings
 * @param exponents the exponents by every rule
 * @param choices every combination of top law, bottom law and exponent rule, in a fixed order
 * @param top what the hidden cells say about the top
 * @param bottom what the hidden cells say about the bottom
 */
public record Comparison(
    Measurement measurement,
    Settings settings,
    Map<ExponentRule, Exponents> exponents,
    List<Choice> choices,
    Verdict top,
    Verdict bottom) {

  public Comparison {
    exponents = Map.copyOf(exponents);
    choices = List.copyOf(choices);
  }

  /**
   * Compares the choices. Passes are screened and laid once and integrated for each choice.
   *
   * @param measurement what was recorded
   * @param settings the chosen settings
   * @param reducer does the reductions
   * @throws UnusableInput when a used pass cannot be reduced
   */
  public static Comparison of(Measurement measurement, Settings settings, Reducer reducer)
      throws UnusableInput {
    LaidMeasurement laid = reducer.lay(measurement, settings);
    Map<ExponentRule, Exponents> exponents = new EnumMap<>(ExponentRule.class);
    for (ExponentRule rule : ExponentRule.values()) {
      Exponent exponent = new Exponent(rule, settings.exponent().value());
      exponents.put(rule, Exponents.of(laid, exponent, reducer.threads()));
    }
    List<Candidate> tops = new ArrayList<>();
    List<Candidate> bottoms = new ArrayList<>();
    for (ExponentRule rule :
        List.of(ExponentRule.FIXED, ExponentRule.FIT_ALL, ExponentRule.FIT_PASS)) {
      for (TopLaw law : TopLaw.values()) {
        Candidate candidate = Candidate.of(law, rule);
        if (tops.stream().noneMatch(candidate::same)) {
          tops.add(candidate);
        }
      }
      for (BottomLaw law : BottomLaw.values()) {
        bottoms.add(Candidate.of(law, rule));
      }
    }
    List<Prediction> top = HiddenCells.predict(laid, exponents, Zone.TOP, tops);
    List<Prediction> bottom = HiddenCells.predict(laid, exponents, Zone.BOTTOM, bottoms);
    List<Choice> choices = choices(laid, settings, exponents, reducer, top, bottom);
    ExponentRule rule = settings.exponent().rule();
    return new Comparison(
        measurement,
        settings,
        exponents,
        choices,
        Verdict.of(find(top, Candidate.of(settings.top(), rule)), top),
        Verdict.of(find(bottom, Candidate.of(settings.bottom(), rule)), bottom));
  }

  private static List<Choice> choices(
      LaidMeasurement laid,
      Settings settings,
      Map<ExponentRule, Exponents> exponents,
      Reducer reducer,
      List<Prediction> tops,
      List<Prediction> bottoms) {
    double chosen =
        Result.of(reducer.integrate(laid, settings, exponents.get(settings.exponent().rule())))
            .summary()
            .dischargeM3s()
            .mean();
    List<Choice> choices = new ArrayList<>();
    for (TopLaw top : TopLaw.values()) {
      for (BottomLaw bottom : BottomLaw.values()) {
        for (ExponentRule rule : ExponentRule.values()) {
          Settings other =
              settings
                  .withTop(top)
                  .withBottom(bottom)
                  .withExponent(new Exponent(rule, settings.exponent().value()));
          Result result = Result.of(reducer.integrate(laid, other, exponents.get(rule)));
          double mean = result.summary().dischargeM3s().mean();
          choices.add(
              new Choice(
                  other,
                  result,
                  100 * (mean - chosen) / Math.abs(chosen),
                  find(tops, Candidate.of(top, rule)),
                  find(bottoms, Candidate.of(bottom, rule))));
        }
      }
    }
    return choices;
  }

  private static Prediction find(List<Prediction> predictions, Candidate candidate) {
    return predictions.stream()
        .filter(each -> each.candidate().same(candidate))
        .findFirst()
        .orElseThrow();
  }

  /** The combination that was chosen. */
  public Choice chosen() {
    return choices.stream()
        .filter(each -> each.settings().equals(settings))
        .findFirst()
        .orElseThrow();
  }

  /**
   * The combination that the evidence favours: the chosen one unless another law predicts a zone
   * better, and not by chance; then the one with the smallest error by the hidden cells among those
   * that take the better law in that zone and keep the chosen one in the other.
   */
  public Choice favoured() {
    Choice best = null;
    for (Choice each : choices) {
      if (fits(top, each.top())
          && fits(bottom, each.bottom())
          && sameRules(each)
          && (best == null || each.score() < best.score())) {
        best = each;
      }
    }
    return anyBetter() && best != null ? best : chosen();
  }

  /** Whether the exponent's rule is that of a zone in which another law is favoured. */
  private boolean sameRules(Choice choice) {
    ExponentRule rule = choice.settings().exponent().rule();
    return !anyBetter() || takes(top, rule) || takes(bottom, rule);
  }

  private static boolean takes(Verdict verdict, ExponentRule rule) {
    Candidate best = verdict.best().candidate();
    return verdict.finding() == Verdict.Finding.FAVOURS_ANOTHER && best.rule() == rule;
  }

  private boolean anyBetter() {
    return top.finding() == Verdict.Finding.FAVOURS_ANOTHER
        || bottom.finding() == Verdict.Finding.FAVOURS_ANOTHER;
  }

  private static boolean fits(Verdict verdict, Prediction prediction) {
    Prediction wanted =
        verdict.finding() == Verdict.Finding.FAVOURS_ANOTHER ? verdict.best() : verdict.chosen();
    return prediction.candidate().law().equals(wanted.candidate().law());
  }

  /** What the evidence favours and what it would change, in one sentence. */
  public String conclusion() {
    Choice favoured = favoured();
    if (anyBetter()) {
      return String.format(
          Locale.ROOT,
          "The evidence favours %s; it would change the discharge by %+.2f %%.",
          favoured.label(),
          favoured.changePct());
    }
    boolean doubt =
        top.finding() != Verdict.Finding.SUPPORTS || bottom.finding() != Verdict.Finding.SUPPORTS;
    return doubt
        ? "The evidence cannot tell; it gives no reason to leave " + chosen().label() + "."
        : "The evidence supports " + chosen().label() + ".";
  }
}
