package org.crossreach.discharge;

import org.crossreach.section.Section;

/** How much of a pass's discharge rests on values that were filled in. */
final class FilledShare {

  private FilledShare() {}

  /**
   * Share of the discharge between the edges that rests on filled gaps between cells, filled
   * columns, filled depths or filled boat velocities (%), by absolute discharge of each ensemble.
   *
   * @return 0 to 100; 0 when nothing flows
   */
  static double percent(ColumnDischarge columns) {
    Section section = columns.section();
    double filled = 0;
    double all = 0;
    for (int i = 0; i < section.size(); i++) {
      double total = Math.abs(columns.total(i));
      all += total;
      if (!columns.transports().own(i) || section.depthFilled(i) || section.track().filled(i)) {
        filled += total;
      } else {
        filled += Math.min(total, Math.abs(columns.ofGaps(i)));
      }
    }
    return all > 0 ? 100 * filled / all : 0;
  }
}
