package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** The power law through all usable cells, carried to the surface. */
final class PowerTop implements UnmeasuredLaw {

  @Override
  public double transport(Column column, Component component, double exponent) {
    double amplitude = PowerLaw.amplitude(column, component, 0, column.size(), exponent);
    return amplitude
        * (PowerLaw.raised(column.depthM(), exponent)
            - PowerLaw.raised(column.upperM(0), exponent));
  }
}
