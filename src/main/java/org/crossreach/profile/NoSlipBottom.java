package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * The power law through the usable cells whose centre lies in the lowest fifth of the depth, or
 * through the lowest usable cell where there is none, carried to the bed.
 *
 * <p>Source: Mueller and Wagner 2009, USGS Techniques and Methods 3-A22 (from memory).
 */
final class NoSlipBottom implements UnmeasuredLaw {

  private static final double SHARE_OF_DEPTH = 0.2;

  @Override
  public double transport(Column column, Component component, double exponent) {
    int size = column.size();
    int from = size - 1;
    while (from > 0 && column.centreM(from - 1) <= SHARE_OF_DEPTH * column.depthM()) {
      from--;
    }
    return PowerLaw.amplitude(column, component, from, size, exponent)
        * PowerLaw.raised(column.lowerM(size - 1), exponent);
  }
}
