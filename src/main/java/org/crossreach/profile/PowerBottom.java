package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** The power law through all usable cells, carried to the bed. */
final class PowerBottom implements UnmeasuredLaw {

  @Override
  public double transport(Column column, Component component, double exponent) {
    int size = column.size();
    return PowerLaw.amplitude(column, component, 0, size, exponent)
        * PowerLaw.raised(column.lowerM(size - 1), exponent);
  }
}
