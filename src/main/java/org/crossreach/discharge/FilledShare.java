package org.crossreach.discharge;

import org.crossreach.section.Section;

/**
 * How much of the discharge between the edges rests on values that were filled in (%), by absolute
 * discharge of each ensemble.
 *
 * <p>An ensemble counts once, by the first that applies: its whole column was filled in, its boat
 * velocity was, its depth was; otherwise only what flows through the gaps between its cells counts.
 *
 * @param columnsPct columns without a usable cell, filled from the columns beside them
 * @param boatVelocitiesPct boat velocities, filled in time
 * @param depthsPct depths, filled along the track
 * @param gapsPct gaps between usable cells, filled in depth
 */
public record FilledShare(
    double columnsPct, double boatVelocitiesPct, double depthsPct, double gapsPct) {

  /** Share that rests on anything filled in (%), 0 to 100; 0 when nothing flows. */
  public double totalPct() {
    return Math.min(100, columnsPct + boatVelocitiesPct + depthsPct + gapsPct);
  }

  static FilledShare of(ColumnDischarge columns) {
    Section section = columns.section();
    double inColumns = 0;
    double inBoatVelocities = 0;
    double inDepths = 0;
    double inGaps = 0;
    double all = 0;
    for (int i = 0; i < section.size(); i++) {
      double total = Math.abs(columns.total(i));
      all += total;
      if (!columns.transports().own(i)) {
        inColumns += total;
      } else if (section.track().filled(i)) {
        inBoatVelocities += total;
      } else if (section.depthFilled(i)) {
        inDepths += total;
      } else {
        inGaps += Math.min(total, Math.abs(columns.ofGaps(i)));
      }
    }
    double percent = all > 0 ? 100 / all : 0;
    return new FilledShare(
        percent * inColumns, percent * inBoatVelocities, percent * inDepths, percent * inGaps);
  }
}
