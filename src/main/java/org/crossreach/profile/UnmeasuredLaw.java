package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** A law that carries the velocity of a column into its unmeasured top or bottom. */
public interface UnmeasuredLaw {

  /**
   * Transport through the unmeasured part of a column, per unit width (m²/s), with the sign of the
   * component.
   *
   * @param column at least one usable cell
   * @param component which component of velocity
   * @param exponent exponent of the power law (1/6 → 0.1667); laws without one ignore it
   */
  double transport(Column column, Component component, double exponent);
}
