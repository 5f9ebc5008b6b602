package org.crossreach.discharge;

import org.crossreach.profile.Transports;
import org.crossreach.section.Component;
import org.crossreach.section.Line;
import org.crossreach.section.Section;

/**
 * Size, directions, speeds and shares of one pass.
 *
 * @param widthM width of the section along its line, edges included (m)
 * @param areaM2 area of the section normal to its line, edges included (m²)
 * @param flowAzimuthDeg direction towards which the water flows, mean over the section weighted
 *     with transport and progress, clockwise from true north (deg)
 * @param boatSpeedMps length of the boat's way over the duration (m/s)
 * @param durationS time from the first to the last ensemble (s)
 * @param usableCellsPct usable cells as a share of the recorded cells above the side-lobe limit (%)
 * @param filled how much of the discharge between the edges rests on filled values
 */
public record PassGeometry(
    double widthM,
    double areaM2,
    double flowAzimuthDeg,
    double boatSpeedMps,
    double durationS,
    double usableCellsPct,
    FilledShare filled) {

  /** Share of the discharge between the edges that rests on filled values (%). */
  public double filledDischargePct() {
    return filled.totalPct();
  }

  /** Mean depth: area over width (m). */
  public double meanDepthM() {
    return areaM2 / widthM;
  }

  static PassGeometry of(ColumnDischarge columns, double edgeDistanceM, double edgeAreaM2) {
    Section section = columns.section();
    Transports transports = columns.transports();
    int last = section.size() - 1;
    double width = edgeDistanceM;
    double area = edgeAreaM2;
    double normal = 0;
    double along = 0;
    for (int i = 0; i <= last; i++) {
      double progress = section.progressM(i);
      width += progress;
      area += progress * section.depthM(i);
      normal += transports.total(Component.NORMAL, i) * Math.abs(progress);
      along += transports.total(Component.ALONG, i) * Math.abs(progress);
    }
    Line line = section.line();
    double duration = section.pass().ensembles().elapsedS(last);
    return new PassGeometry(
        width,
        area,
        Line.azimuthDeg(
            along * line.east() - normal * line.north(),
            along * line.north() + normal * line.east()),
        section.track().lengthM(last) / duration,
        duration,
        section.pass().usableCellsPct(),
        FilledShare.of(columns));
  }
}
