package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * The power law of velocity above the bed, {@code u(z) = a z^m}, fitted so that it carries the same
 * transport as the cells: {@code a = (m + 1) S / D} with {@code S} the sum of velocity times height
 * over the cells and {@code D} the sum of {@code upper^(m+1) - lower^(m+1)}.
 *
 * <p>Source: Simpson and Oltmann 1993, USGS Water-Supply Paper 2395.
 */
final class PowerLaw {

  private PowerLaw() {}

  /**
   * {@code a / (m + 1)} (m/s over m^m): multiplied with a difference of heights to the power m + 1
   * it gives a transport (m²/s).
   *
   * @param from first cell of the column used
   * @param to one past the last cell used
   */
  static double amplitude(Column column, Component component, int from, int to, double exponent) {
    double sum = 0;
    double divisor = 0;
    double upper = Double.NaN;
    for (int j = from; j < to; j++) {
      sum += column.velocityMps(component, j) * column.heightM(j);
      if (j == from || !column.joined(j - 1)) {
        upper = raised(column.upperM(j), exponent);
      }
      if (j == to - 1 || !column.joined(j)) {
        divisor += upper - raised(column.lowerM(j), exponent);
      }
    }
    return sum / divisor;
  }

  /** Height to the power m + 1. */
  static double raised(double height, double exponent) {
    return Math.pow(height, exponent + 1);
  }
}
