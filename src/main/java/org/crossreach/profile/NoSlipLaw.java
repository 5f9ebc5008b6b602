package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * The power law through the usable cells whose centre lies in the lowest fifth of the depth, or
 * through the lowest usable cell where there is none.
 *
 * <p>Source: Mueller and Wagner 2009, USGS Techniques and Methods 3-A22 (from memory).
 */
final class NoSlipLaw implements VelocityLaw {

  private static final double SHARE_OF_DEPTH = 0.2;

  @Override
  public double transport(
      Column column, Component component, double exponent, double fromM, double toM) {
    int first = column.size() - 1;
    while (first > 0 && column.centreM(first - 1) <= SHARE_OF_DEPTH * column.depthM()) {
      first--;
    }
    return PowerLaw.amplitude(column, component, first, exponent)
        * PowerLaw.between(fromM, toM, exponent);
  }
}
