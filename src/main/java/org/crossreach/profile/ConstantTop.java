package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** The velocity of the highest usable cell, carried to the surface unchanged. */
final class ConstantTop implements UnmeasuredLaw {

  @Override
  public double transport(Column column, Component component, double exponent) {
    return column.velocityMps(component, 0) * (column.depthM() - column.upperM(0));
  }
}
