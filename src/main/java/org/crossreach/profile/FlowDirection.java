package org.crossreach.profile;

import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The horizontal axis along which the water of a pass flows, as a unit vector in the section's
 * axes.
 *
 * <p>It is the axis in which the squares of the columns' transports are largest, so that water
 * which flows downstream here and upstream there does not cancel; it points downstream. A velocity
 * along it keeps its sign and, other than a magnitude, has no bias from noise.
 *
 * @param normal its part normal to the section, at least 0
 * @param along its part along the section, positive to the right bank
 */
public record FlowDirection(double normal, double along) {

  /**
   * The axis of a pass; normal to the section where nothing flows.
   *
   * @param section the pass on its line
   * @param step every how many columns one is looked at, at least 1
   */
  static FlowDirection of(Section section, int step) {
    double nn = 0;
    double na = 0;
    double aa = 0;
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < section.size(); i += step) {
      section.read(i, row, column);
      double n = MeasuredZone.throughCells(column, Component.NORMAL);
      double a = MeasuredZone.throughCells(column, Component.ALONG);
      nn += n * n;
      na += n * a;
      aa += a * a;
    }
    double angle = 0.5 * Math.atan2(2 * na, nn - aa);
    return new FlowDirection(Math.cos(angle), Math.sin(angle));
  }
}
