package org.crossreach.report;

/** A physical quantity that a report shows, with its symbol in each system of units. */
public enum Quantity {
  /** Length, depth, distance, stage. */
  LENGTH("m", "ft", 1),
  /** Area of the section. */
  AREA("m²", "ft²", 2),
  /** Velocity of the water or the boat. */
  VELOCITY("m/s", "ft/s", 1),
  /** Discharge per unit width. */
  UNIT_DISCHARGE("m²/s", "ft²/s", 2),
  /** Discharge. */
  DISCHARGE("m³/s", "ft³/s", 3);

  /**
   * The international foot (m), exact. Source: NIST Special Publication 811 (2008), table B.8: 1
   * foot = 3.048 E-01 m.
   */
  public static final double FOOT_M = 0.3048;

  private final String si;
  private final String us;
  private final double feet;

  Quantity(String si, String us, int powerOfLength) {
    this.si = si;
    this.us = us;
    this.feet = 1 / Math.pow(FOOT_M, powerOfLength);
  }

  /** Symbol of the unit, for example {@code m³/s}. */
  public String symbol(Units units) {
    return switch (units) {
      case SI -> si;
      case US -> us;
    };
  }

  /**
   * A value in the reader's unit.
   *
   * @param units the reader's system
   * @param value the value in SI
   */
  public double in(Units units, double value) {
    return switch (units) {
      case SI -> value;
      case US -> value * feet;
    };
  }

  /**
   * Values in the reader's unit, as a fresh array.
   *
   * @param units the reader's system
   * @param values the values in SI
   */
  public double[] in(Units units, double[] values) {
    double[] converted = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      converted[i] = in(units, values[i]);
    }
    return converted;
  }
}
