package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;

/**
 * One way to estimate the unmeasured water.
 *
 * @param top law near the surface
 * @param bottom law near the bed
 * @param rule where the exponent comes from
 */
public record Combination(TopLaw top, BottomLaw bottom, ExponentRule rule) {

  /** Every combination of the registered laws and rules, in a fixed order. */
  public static List<Combination> all() {
    List<Combination> all = new ArrayList<>();
    for (TopLaw top : TopLaw.values()) {
      for (BottomLaw bottom : BottomLaw.values()) {
        for (ExponentRule rule : ExponentRule.values()) {
          all.add(new Combination(top, bottom, rule));
        }
      }
    }
    return List.copyOf(all);
  }

  /** The combination that settings have chosen. */
  public static Combination of(Settings settings) {
    return new Combination(settings.top(), settings.bottom(), settings.exponent().rule());
  }

  /** The settings with this combination in place of their own; the fixed value stays. */
  public Settings in(Settings settings) {
    return settings
        .withTop(top)
        .withBottom(bottom)
        .withExponent(new Exponent(rule, settings.exponent().value()));
  }

  /** The law and rule near the surface. */
  Candidate atTop() {
    return Candidate.of(top, rule);
  }

  /** The law and rule near the bed. */
  Candidate atBottom() {
    return Candidate.of(bottom, rule);
  }

  /** How many of the three choices differ. */
  int changesFrom(Combination other) {
    return (top == other.top ? 0 : 1)
        + (bottom == other.bottom ? 0 : 1)
        + (rule == other.rule ? 0 : 1);
  }

  /** For people, for example {@code top power, bottom no-slip, exponent fixed}. */
  public String text() {
    return "top " + top.key() + ", bottom " + bottom.key() + ", exponent " + rule.key();
  }
}
