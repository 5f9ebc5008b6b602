package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * The straight line through the three highest usable cells (least squares), for profiles that wind
 * has slowed or driven. A column with fewer than {@value #FEWEST_CELLS} usable cells takes the
 * constant law instead.
 *
 * <p>Source: Mueller and Wagner 2009, USGS Techniques and Methods 3-A22 (from memory).
 */
final class ThreePointLaw implements VelocityLaw {

  static final int FEWEST_CELLS = 6;

  private final VelocityLaw fallback = new ConstantLaw();

  @Override
  public double transport(
      Column column, Component component, double exponent, double fromM, double toM) {
    if (column.size() < FEWEST_CELLS) {
      return fallback.transport(column, component, exponent, fromM, toM);
    }
    double meanHeight = (column.centreM(0) + column.centreM(1) + column.centreM(2)) / 3;
    double mean = 0;
    double slope = 0;
    double spread = 0;
    for (int j = 0; j < 3; j++) {
      double height = column.centreM(j) - meanHeight;
      double velocity = column.velocityMps(component, j);
      mean += velocity / 3;
      slope += height * velocity;
      spread += height * height;
    }
    slope /= spread;
    return (toM - fromM) * (mean + slope * (0.5 * (fromM + toM) - meanHeight));
  }

  @Override
  public boolean takesExponent() {
    return false;
  }
}
