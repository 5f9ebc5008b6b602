package org.crossreach.report.chart;

import java.util.Arrays;
import org.crossreach.profile.Transports;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Section;
import org.crossreach.survey.Gaps;

/**
 * The limits of the zones at equally spaced stations: means over the ensembles that cover each
 * strip. Depths are below the surface (m).
 *
 * <p>Stations run from the left to the right end of the measured water, both included; a station
 * that no ensemble covers is linear between its neighbours.
 */
final class Verticals {

  /** Stations (m from the left bank), strictly increasing. */
  final double[] stationM;

  /** Depth of the bed. */
  final double[] bedM;

  /** Upper edge of the highest usable cell. */
  final double[] topM;

  /** Lower edge of the lowest usable cell. */
  final double[] bottomM;

  /** Limit below which side lobes return from the bed. */
  final double[] sideLobeM;

  private Verticals(int count) {
    stationM = new double[count];
    bedM = new double[count];
    topM = new double[count];
    bottomM = new double[count];
    sideLobeM = new double[count];
  }

  /**
   * Takes the verticals of a pass.
   *
   * @param shape the pass
   * @param transports tells which ensembles have cells of their own
   * @param count number of stations, at least 2
   */
  static Verticals of(SectionShape shape, Transports transports, int count) {
    double[] weight = new double[count];
    double[] ownWeight = new double[count];
    Verticals sums = new Verticals(count);
    double left = shape.leftEndM();
    double spacing = (shape.rightEndM() - left) / (count - 1);
    Section section = shape.section();
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < shape.size(); i++) {
      section.read(i, row, column);
      double first = (shape.fromM(i) - left) / spacing + 0.5;
      double last = (shape.toM(i) - left) / spacing + 0.5;
      for (int k = Math.max(0, (int) first); k < count && k < last; k++) {
        double overlap = Math.min(k + 1, last) - Math.max(k, first);
        weight[k] += overlap;
        sums.bedM[k] += overlap * section.depthM(i);
        sums.sideLobeM[k] += overlap * section.pass().sideLobeLimitM(i);
        if (transports.own(i)) {
          ownWeight[k] += overlap;
          sums.topM[k] += overlap * (column.depthM() - column.upperM(0));
          sums.bottomM[k] += overlap * (column.depthM() - column.lowerM(column.size() - 1));
        }
      }
    }
    for (int k = 0; k < count; k++) {
      sums.stationM[k] = left + k * spacing;
    }
    return sums.over(weight, ownWeight);
  }

  private Verticals over(double[] weight, double[] ownWeight) {
    Verticals means = new Verticals(stationM.length);
    System.arraycopy(stationM, 0, means.stationM, 0, stationM.length);
    mean(bedM, weight, means.bedM);
    mean(sideLobeM, weight, means.sideLobeM);
    mean(topM, ownWeight, means.topM);
    mean(bottomM, ownWeight, means.bottomM);
    return means;
  }

  private void mean(double[] sum, double[] weight, double[] target) {
    double[] mean = new double[sum.length];
    Arrays.setAll(mean, k -> weight[k] > 1e-9 ? sum[k] / weight[k] : Double.NaN);
    System.arraycopy(Gaps.fillLinear(mean, stationM), 0, target, 0, target.length);
  }
}
