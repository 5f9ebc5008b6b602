package org.crossreach.evidence;

import org.crossreach.profile.Laws;
import org.crossreach.profile.VelocityLaw;
import org.crossreach.profile.Zone;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.TopLaw;

/**
 * A law for one unmeasured zone, with the rule of its exponent.
 *
 * @param zone top or bottom
 * @param law key of the law in settings
 * @param velocityLaw the law
 * @param rule where the exponent comes from; {@link ExponentRule#FIXED} for a law without one
 * @param hasExponent whether the law has an exponent at all
 */
public record Candidate(
    Zone zone, String law, VelocityLaw velocityLaw, ExponentRule rule, boolean hasExponent) {

  static Candidate of(TopLaw law, ExponentRule rule) {
    boolean hasExponent =
        switch (law) {
          case POWER -> true;
          case CONSTANT, THREE_POINT -> false;
        };
    return new Candidate(
        Zone.TOP, law.key(), Laws.of(law), hasExponent ? rule : ExponentRule.FIXED, hasExponent);
  }

  static Candidate of(BottomLaw law, ExponentRule rule) {
    return new Candidate(Zone.BOTTOM, law.key(), Laws.of(law), rule, true);
  }

  /** Whether this is the same choice as another. */
  boolean same(Candidate other) {
    return zone == other.zone && law.equals(other.law) && rule == other.rule;
  }

  /** The law and, where it has an exponent, its rule, for example {@code power, fit-all}. */
  public String label() {
    return hasExponent ? law + ", " + rule.key() : law;
  }
}
