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
    double sum = from == 0 ? column.transportM2s(component) : 0;
    for (int j = from; from > 0 && j < column.size(); j++) {
      sum += column.velocityMps(component, j) * column.heightM(j);
    }
    return sum / divisor(column, from, exponent);
  }

  private static double divisor(Column column, int from, double exponent) {
    int last = column.size() - 1;
    if (column.unbroken(from)) {
      return between(column.lowerM(last), column.upperM(from), exponent);
    }
    double divisor = 0;
    double upper = Double.NaN;
    for (int j = from; j <= last; j++) {
      // Within a run of joined cells the powers cancel: only its ends count.
      if (j == from || !column.joined(j - 1)) {
        upper = raised(column.upperM(j), exponent);
      }
      if (j == last || !column.joined(j)) {
        divisor += upper - raised(column.lowerM(j), exponent);
      }
    }
    return divisor;
  }

  private static double raised(double height, double exponent) {
    return Math.pow(height, exponent + 1);
  }
}
