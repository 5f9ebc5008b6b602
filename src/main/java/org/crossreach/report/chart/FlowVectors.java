package org.crossreach.report.chart;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * Depth-mean velocities of the water at evenly spread places of the boat's track, in the axes of
 * the section: across from the left to the right bank, and downstream. Each is the mean over the
 * ensembles around it, weighted with the boat's progress.
 */
final class FlowVectors {

  final double[] stationM;
  final double[] downstreamM;
  final double[] acrossMps;
  final double[] downstreamMps;

  private FlowVectors(int count) {
    stationM = new double[count];
    downstreamM = new double[count];
    acrossMps = new double[count];
    downstreamMps = new double[count];
  }

  /**
   * Takes the vectors of a pass.
   *
   * @param pass the pass
   * @param shape its stations
   * @param count number of vectors, at least 1; where no ensemble falls the vector is NaN
   */
  static FlowVectors of(PassDischarge pass, SectionShape shape, int count) {
    FlowVectors sums = new FlowVectors(count);
    double[] weight = new double[count];
    Section section = shape.section();
    double from = shape.leftEndM();
    double width = (shape.rightEndM() - from) / count;
    for (int i = 0; i < shape.size(); i++) {
      double middle = 0.5 * (shape.fromM(i) + shape.toM(i));
      int k = (int) Math.floor((middle - from) / width);
      double progress = shape.toM(i) - shape.fromM(i);
      if (k < 0 || k >= count || !(progress > 0)) {
        continue;
      }
      double perDepth = progress / section.depthM(i);
      weight[k] += progress;
      sums.stationM[k] += progress * middle;
      sums.downstreamM[k] += progress * downstreamM(section, i);
      sums.acrossMps[k] += perDepth * pass.transports().total(Component.ALONG, i);
      sums.downstreamMps[k] += perDepth * pass.transports().total(Component.NORMAL, i);
    }
    for (int k = 0; k < count; k++) {
      double all = weight[k] > 0 ? weight[k] : Double.NaN;
      sums.stationM[k] /= all;
      sums.downstreamM[k] /= all;
      sums.acrossMps[k] /= all;
      sums.downstreamMps[k] /= all;
    }
    return sums;
  }

  /** Distance of the boat downstream of where the pass began (m). */
  static double downstreamM(Section section, int ensemble) {
    return section.line().normal(section.track().eastM(ensemble), section.track().northM(ensemble));
  }

  int count() {
    return stationM.length;
  }

  /** The largest speed among the vectors (m/s), 0 when there is none. */
  double fastestMps() {
    double fastest = 0;
    for (int k = 0; k < count(); k++) {
      double speed = Math.hypot(acrossMps[k], downstreamMps[k]);
      fastest = speed > fastest ? speed : fastest;
    }
    return fastest;
  }
}
