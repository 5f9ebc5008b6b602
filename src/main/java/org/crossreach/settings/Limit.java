package org.crossreach.settings;

/**
 * How a screen finds its limit: not at all, from the pass's own distribution, or as given.
 *
 * @param kind how
 * @param value the given limit in the screen's unit, NaN unless given
 */
public record Limit(Kind kind, double value) {

  /** How a limit is found. */
  public enum Kind {
    /** The screen is switched off. */
    OFF,
    /** From the pass's own distribution. */
    AUTO,
    /** As given. */
    GIVEN
  }

  public static final Limit OFF = new Limit(Kind.OFF, Double.NaN);
  public static final Limit AUTO = new Limit(Kind.AUTO, Double.NaN);

  public Limit {
    if ((kind == Kind.GIVEN) == Double.isNaN(value)) {
      throw new IllegalArgumentException("value belongs to GIVEN and to nothing else");
    }
  }

  /** A given limit, in the screen's unit. */
  public static Limit of(double value) {
    return new Limit(Kind.GIVEN, value);
  }
}
