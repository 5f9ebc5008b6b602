package org.crossreach.report.chart;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.profile.Zone;

/**
 * Discharge per unit width (m²/s) by zone in panels of equal width between the ends of the measured
 * water. The sum over panels and zones, times the panels' width, is what flows between the edges.
 */
final class DischargePanels {

  private final double fromM;
  private final double widthM;
  private final double[][] perWidth;

  /**
   * Spreads the discharge of each ensemble evenly over the way that it covers.
   *
   * @param pass the pass
   * @param shape its stations
   * @param count number of panels, at least 1
   */
  DischargePanels(PassDischarge pass, SectionShape shape, int count) {
    fromM = shape.leftEndM();
    widthM = (shape.rightEndM() - fromM) / count;
    perWidth = new double[Zone.values().length][count];
    for (int i = 0; i < shape.size(); i++) {
      double from = (shape.fromM(i) - fromM) / widthM;
      double to = (shape.toM(i) - fromM) / widthM;
      if (!(to > from)) {
        continue;
      }
      for (Zone zone : Zone.values()) {
        double each = pass.columns().of(zone, i) / widthM / (to - from);
        // What lies beyond the ends goes to the outermost panels: nothing is lost.
        for (int k = panel(from, count); k <= panel(to, count); k++) {
          double low = k == 0 ? from : Math.max(from, k);
          double high = k == count - 1 ? to : Math.min(to, k + 1);
          perWidth[zone.ordinal()][k] += Math.max(0, high - low) * each;
        }
      }
    }
  }

  private static int panel(double place, int count) {
    return (int) Math.max(0, Math.min(count - 1, Math.floor(place)));
  }

  int count() {
    return perWidth[0].length;
  }

  /** The end of a panel nearer to the left bank (m). */
  double fromM(int panel) {
    return fromM + panel * widthM;
  }

  /** Width of a panel (m). */
  double widthM() {
    return widthM;
  }

  /** Discharge per unit width of one zone in one panel (m²/s). */
  double perWidth(Zone zone, int panel) {
    return perWidth[zone.ordinal()][panel];
  }

  /** Discharge of a panel, all zones (m³/s). */
  double dischargeM3s(int panel) {
    double sum = 0;
    for (double[] zone : perWidth) {
      sum += zone[panel];
    }
    return sum * widthM;
  }
}
