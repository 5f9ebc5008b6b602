package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;

/** Transport through the measured zone of a column per unit width (m²/s). */
final class MeasuredZone {

  private MeasuredZone() {}

  /** Transport through the usable cells themselves. */
  static double throughCells(Column column, Component component) {
    return column.transportM2s(component);
  }

  /**
   * Transport through the gaps between usable cells: velocity linear in depth between the centres
   * of the cells above and below the gap.
   */
  static double throughGaps(Column column, Component component) {
    if (column.unbroken(0)) {
      return 0;
    }
    double sum = 0;
    for (int j = 0; j + 1 < column.size(); j++) {
      if (column.joined(j)) {
        continue;
      }
      double above = column.velocityMps(component, j);
      double below = column.velocityMps(component, j + 1);
      double middle = 0.5 * (column.lowerM(j) + column.upperM(j + 1));
      double weight =
          (middle - column.centreM(j + 1)) / (column.centreM(j) - column.centreM(j + 1));
      sum += (below + weight * (above - below)) * (column.lowerM(j) - column.upperM(j + 1));
    }
    return sum;
  }
}
