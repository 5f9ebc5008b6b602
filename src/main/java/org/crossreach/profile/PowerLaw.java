package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * The power law of velocity above the bed, {@code u(z) = a z^m}, through all usable cells, fitted
 * so that it carries the same transport as they: {@code a = (m + 1) S / D} with {@code S} the sum
 * of velocity times height over the cells and {@code D} the sum of {@code upper^(m+1) -
 * lower^(m+1)}.
 *
 * <p>Source: Simpson and Oltmann 1993, USGS Water-Supply Paper 2395.
 */
final class PowerLaw implements VelocityLaw {

  @Override
  public double transport(
      Column column, Component component, double exponent, double fromM, double toM) {
    return amplitude(column, component, 0, exponent) * between(fromM, toM, exponent);
  }

  /** Difference of two heights to the power m + 1. */
  static double between(double fromM, double toM, double exponent) {
    return raised(toM, exponent) - raised(fromM, exponent);
  }

  /**
   * {@code a / (m + 1)} (m/s over m^m): multiplied with {@link #between} it gives a transport
   * (m²/s).
   *
   * @param from first cell of the column used; all below it are used too
   */
  static double amplitude(Column column, Component component, int from, double exponent) {
    int size = column.size();
    double sum = 0;
    double divisor = 0;
    double upper = Double.NaN;
    for (int j = from; j < size; j++) {
      sum += column.velocityMps(component, j) * column.heightM(j);
      // Within a run of joined cells the powers cancel: only its ends count.
      if (j == from || !column.joined(j - 1)) {
        upper = raised(column.upperM(j), exponent);
      }
      if (j == size - 1 || !column.joined(j)) {
        divisor += upper - raised(column.lowerM(j), exponent);
      }
    }
    return sum / divisor;
  }

  private static double raised(double height, double exponent) {
    return Math.pow(height, exponent + 1);
  }
}
