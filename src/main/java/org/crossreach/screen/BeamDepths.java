package org.crossreach.screen;

import java.util.List;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Limit;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Depths below the transducer face by the four slant beams and the vertical one, without the beams
 * that stand apart.
 *
 * <p>A beam is left out of an ensemble when it departs, by more than the limit as a share of depth,
 * both from the running median of its own neighbours in time and from the median of the ensemble's
 * beams: on a steep bank the beams differ but each follows its own bed, at a step all beams step.
 * It is left out, too, when it departs by more than half the depth from the median of at least
 * three beams (those on a slope of 1:1 differ by a quarter), or from what it saw both before and
 * after. Two beams that differ do not outvote each other.
 */
final class BeamDepths {

  private static final EnsembleQuantity[] BEAMS = {
    EnsembleQuantity.DEPTH_BEAM_1_M,
    EnsembleQuantity.DEPTH_BEAM_2_M,
    EnsembleQuantity.DEPTH_BEAM_3_M,
    EnsembleQuantity.DEPTH_BEAM_4_M,
    EnsembleQuantity.DEPTH_VERTICAL_M
  };

  private static final int SLANT_BEAMS = 4;
  private static final int VERTICAL = 4;

  /** Neighbours on either side that a beam's running median takes. */
  private static final int REACH = 5;

  /** Neighbours on one side that tell what a beam saw before, or after. */
  private static final int BESIDE = 3;

  /** Smallest automatic limit: the bed's own roughness under a beam's footprint. */
  private static final double FLOOR_SHARE = 0.05;

  /** Smallest departure (m) that the automatic screen takes for a fault in shallow water. */
  private static final double FLOOR_M = 0.1;

  /** Departure that is enough alone, as a share of depth. */
  private static final double ALONE_SHARE = 0.5;

  private final double[][] depthM = new double[BEAMS.length][];
  private final boolean[] recorded;
  private long rejected;

  /**
   * Reads and screens the beams.
   *
   * @param sound what depths are multiplied by
   * @param limit of the screen, as a share of depth (0.2 = 20 %)
   * @param found receives the limit
   */
  BeamDepths(Ensembles ensembles, SoundRatio sound, Limit limit, List<FoundLimit> found) {
    int size = ensembles.size();
    recorded = new boolean[size];
    for (int b = 0; b < BEAMS.length; b++) {
      depthM[b] = new double[size];
      for (int i = 0; i < size; i++) {
        depthM[b][i] = sound.at(i) * ensembles.value(BEAMS[b], i);
        recorded[i] |= !Double.isNaN(depthM[b][i]);
      }
    }
    if (AutomaticLimit.on(limit)) {
      screen(limit, found);
    }
  }

  private void screen(Limit limit, List<FoundLimit> found) {
    double[] middle = new double[recorded.length];
    boolean[] majority = new boolean[recorded.length];
    double[] valid = new double[BEAMS.length];
    for (int i = 0; i < middle.length; i++) {
      int count = 0;
      for (double[] beam : depthM) {
        if (!Double.isNaN(beam[i])) {
          valid[count++] = beam[i];
        }
      }
      middle[i] = count > 1 ? Median.of(valid, count) : Double.NaN;
      majority[i] = count > 2;
    }
    boolean given = limit.kind() == Limit.Kind.GIVEN;
    double share = given ? limit.value() : automaticShare(middle);
    found.add(new FoundLimit(Criterion.DEPTH_BEAMS, limit.kind(), Double.NaN, share));
    double least = given ? 0 : FLOOR_M;
    for (double[] beam : depthM) {
      double[] before = beam.clone();
      for (int i = 0; i < middle.length; i++) {
        double depth = before[i];
        if (Double.isNaN(depth)) {
          continue;
        }
        boolean apart =
            departs(depth, middle[i], share, least)
                && departs(depth, RunningMedian.at(before, i, REACH), share, least);
        boolean farApart =
            majority[i] && departs(depth, middle[i], ALONE_SHARE, 0) || juts(before, i);
        if (apart || farApart) {
          beam[i] = Double.NaN;
          rejected++;
        }
      }
    }
  }

  /** Whether a depth is by far greater, or by far smaller, than both before and after. */
  private static boolean juts(double[] depths, int i) {
    int previous = RunningMedian.next(depths, i, -1);
    int following = RunningMedian.next(depths, i, 1);
    if (previous < 0 || following >= depths.length) {
      return false;
    }
    double depth = depths[i];
    if (!departs(depth, depths[previous], ALONE_SHARE, 0)
        && !departs(depth, depths[following], ALONE_SHARE, 0)) {
      return false;
    }
    double before = RunningMedian.beside(depths, i, BESIDE, -1);
    double after = RunningMedian.beside(depths, i, BESIDE, 1);
    return depth > (1 + ALONE_SHARE) * Math.max(before, after)
        || depth < (1 - ALONE_SHARE) * Math.min(before, after);
  }

  private static boolean departs(double depth, double from, double share, double least) {
    return Math.abs(depth - from) > Math.max(least, share * from);
  }

  /** The narrower of the two distributions decides: on a slope the beams differ, not in time. */
  private double automaticShare(double[] middle) {
    Sample own = new Sample();
    Sample others = new Sample();
    for (double[] beam : depthM) {
      own.addScatter(beam, true);
      for (int i = 0; i < middle.length; i += Sample.stride(middle.length, 1)) {
        others.add((beam[i] - middle[i]) / middle[i]);
      }
    }
    double sigma = own.scale().sigma();
    if (others.size() > 0) {
      sigma = Math.min(sigma, others.scale().sigma());
    }
    return Math.max(FLOOR_SHARE, AutomaticLimit.SIGMAS * sigma);
  }

  /** Number of beam depths that were left out. */
  long rejected() {
    return rejected;
  }

  /** Why an ensemble has no depth, {@link Reason#NONE} when it has one. */
  Reason reason(int ensemble) {
    for (double[] beam : depthM) {
      if (!Double.isNaN(beam[ensemble])) {
        return Reason.NONE;
      }
    }
    return recorded[ensemble] ? Reason.DEPTH_BEAMS : Reason.MISSING;
  }

  /** Depth below the face by the chosen beams alone (m), NaN when they have none. */
  double by(DepthSource source, int ensemble) {
    return switch (source) {
      case SLANT_MEAN -> mean(ensemble);
      case SLANT_INVERSE_DISTANCE -> harmonicMean(ensemble);
      case VERTICAL -> depthM[VERTICAL][ensemble];
    };
  }

  /**
   * Depth below the face by the beams that stand in for the chosen ones where those have none (m):
   * the vertical beam for the slant ones, the mean of the slant ones for the vertical beam.
   */
  double instead(DepthSource source, int ensemble) {
    return source == DepthSource.VERTICAL ? mean(ensemble) : depthM[VERTICAL][ensemble];
  }

  /** Shallowest depth of any beam below the face (m), NaN where an ensemble has none. */
  double[] shallowest() {
    double[] least = new double[recorded.length];
    for (int i = 0; i < least.length; i++) {
      least[i] = Double.NaN;
      for (double[] beam : depthM) {
        least[i] = beam[i] < least[i] || Double.isNaN(least[i]) ? beam[i] : least[i];
      }
    }
    return least;
  }

  private double mean(int i) {
    double sum = 0;
    int count = 0;
    for (int b = 0; b < SLANT_BEAMS; b++) {
      double value = depthM[b][i];
      if (!Double.isNaN(value)) {
        sum += value;
        count++;
      }
    }
    return count == 0 ? Double.NaN : sum / count;
  }

  private double harmonicMean(int i) {
    double sum = 0;
    int count = 0;
    for (int b = 0; b < SLANT_BEAMS; b++) {
      double value = depthM[b][i];
      if (!Double.isNaN(value)) {
        sum += 1 / value;
        count++;
      }
    }
    return count == 0 ? Double.NaN : count / sum;
  }
}
