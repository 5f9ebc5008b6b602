package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/**
 * A law that carries the velocity of a column's usable cells to heights where nothing was measured.
 *
 * <p>A law has no state and may be shared between threads. It is linear in the velocities, so that
 * a vector is carried component by component.
 */
public interface VelocityLaw {

  /**
   * Transport between two heights above the bed, per unit width (m²/s), with the sign of the
   * component.
   *
   * @param column at least one usable cell
   * @param component which component of velocity
   * @param exponent exponent of the power law (1/6 → 0.1667); laws without one ignore it
   * @param fromM lower height (m)
   * @param toM upper height (m)
   */
  double transport(Column column, Component component, double exponent, double fromM, double toM);

  /** Whether the exponent of the power law matters to the law. */
  default boolean takesExponent() {
    return true;
  }
}
