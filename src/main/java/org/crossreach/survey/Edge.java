package org.crossreach.survey;

/**
 * The unmeasured water between the boat's first or last ensemble and a bank.
 *
 * <p>Either {@code coefficient} or {@code dischargeM3s} is a number and the other is NaN.
 *
 * @param distanceM distance from the boat to the edge of the water (m)
 * @param coefficient edge coefficient C of {@code Q = C V d L}, for example 0.3535; NaN when the
 *     discharge itself was given
 * @param dischargeM3s discharge of the edge as given (m³/s, positive downstream), NaN when it is to
 *     be computed
 */
public record Edge(double distanceM, double coefficient, double dischargeM3s) {

  /**
   * Coefficient of a sloping (triangular) edge. Source: Simpson and Oltmann 1993, USGS Water-Supply
   * Paper 2395, after Fulford and Sauer 1986 (from memory).
   */
  public static final double SLOPING = 0.3535;

  /** Coefficient of an edge at a vertical wall. Source: as {@link #SLOPING} (from memory). */
  public static final double WALL = 0.91;

  public Edge {
    if (Double.isNaN(coefficient) == Double.isNaN(dischargeM3s)) {
      throw new IllegalArgumentException(
          "an edge has either a coefficient or a discharge, not coefficient="
              + coefficient
              + " and dischargeM3s="
              + dischargeM3s);
    }
  }
}
