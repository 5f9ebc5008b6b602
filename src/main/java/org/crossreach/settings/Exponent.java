package org.crossreach.settings;

/**
 * The exponent of the power law and where it comes from.
 *
 * @param rule where it comes from
 * @param value the fixed exponent, for example 0.1667 for one sixth; also the fallback where a fit
 *     cannot tell
 */
public record Exponent(ExponentRule rule, double value) {

  /** Lowest and highest exponent that is accepted. */
  public static final double LOWEST = 0.01;

  public static final double HIGHEST = 1.0;

  /** One sixth, the usual fixed exponent. Source: Lee et al. 2013, Engineering 5, 933. */
  public static final double ONE_SIXTH = 1.0 / 6.0;

  public Exponent {
    if (!(value >= LOWEST && value <= HIGHEST)) {
      throw new IllegalArgumentException(
          "value must be from " + LOWEST + " to " + HIGHEST + ", not " + value);
    }
  }
}
