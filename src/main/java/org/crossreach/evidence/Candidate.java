package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.profile.Laws;
import org.crossreach.profile.VelocityLaw;
import org.crossreach.profile.Zone;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.Choice;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.TopLaw;

/**
 * A law for one unmeasured zone, with the rule for its exponent where it has one.
 *
 * @param zone {@link Zone#TOP} or {@link Zone#BOTTOM}
 * @param law key of the law in the settings
 * @param rule rule for the exponent; empty when the exponent does not matter to the law
 */
public record Candidate(Zone zone, String law, Optional<ExponentRule> rule) {

  static Candidate of(TopLaw law, ExponentRule rule) {
    return new Candidate(Zone.TOP, law.key(), rule(Laws.of(law), rule));
  }

  static Candidate of(BottomLaw law, ExponentRule rule) {
    return new Candidate(Zone.BOTTOM, law.key(), rule(Laws.of(law), rule));
  }

  private static Optional<ExponentRule> rule(VelocityLaw law, ExponentRule rule) {
    return law.takesExponent() ? Optional.of(rule) : Optional.empty();
  }

  /** Every candidate for the surface, then every one for the bed, in a fixed order. */
  static List<Candidate> all() {
    List<Candidate> all = new ArrayList<>();
    for (Combination each : Combination.all()) {
      addNew(all, each.atTop());
    }
    for (Combination each : Combination.all()) {
      addNew(all, each.atBottom());
    }
    return List.copyOf(all);
  }

  private static void addNew(List<Candidate> all, Candidate candidate) {
    if (!all.contains(candidate)) {
      all.add(candidate);
    }
  }

  /** The law itself. */
  VelocityLaw velocityLaw() {
    return switch (zone) {
      case TOP -> Laws.of(option(TopLaw.class));
      case BOTTOM -> Laws.of(option(BottomLaw.class));
      case MEASURED -> throw new IllegalStateException("nothing is estimated where cells are");
    };
  }

  private <E extends Enum<E> & Choice> E option(Class<E> options) {
    return Choice.find(options, law).orElseThrow();
  }

  /** How freely the exponent varies: not at all, once, or in each pass. */
  int freedom() {
    return rule.isEmpty() ? 0 : freedom(rule.get());
  }

  static int freedom(ExponentRule rule) {
    return switch (rule) {
      case FIXED -> 0;
      case FIT_ALL -> 1;
      case FIT_PASS -> 2;
    };
  }

  /** For people, for example {@code power fit-all} or {@code constant}. */
  public String text() {
    return rule.isEmpty() ? law : law + " " + rule.get().key();
  }
}
