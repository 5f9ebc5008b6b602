package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** The velocity of the highest usable cell, unchanged. */
final class ConstantLaw implements VelocityLaw {

  @Override
  public double transport(
      Column column, Component component, double exponent, double fromM, double toM) {
    return column.velocityMps(component, 0) * (toM - fromM);
  }

  @Override
  public boolean takesExponent() {
    return false;
  }
}
