package org.crossreach.screen;

import static org.crossreach.survey.EnsembleQuantity.BOTTOM_1;
import static org.crossreach.survey.EnsembleQuantity.BOTTOM_2;
import static org.crossreach.survey.EnsembleQuantity.BOTTOM_3;
import static org.crossreach.survey.EnsembleQuantity.BOTTOM_4;

import java.util.List;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;

/**
 * The boat's velocity over the bed by bottom tracking on true east, north and up, and why a value
 * is not used.
 */
final class BottomTrack {

  /**
   * Smallest automatic limit of error and vertical velocity (m/s): less is within what pitch, heave
   * and rounding to mm/s leave.
   */
  private static final double FLOOR_MPS = 0.05;

  /**
   * Smallest automatic limit of a departure in boat velocity (m/s): for three ensembles of a second
   * it moves the boat by a boat's width at the most.
   */
  private static final double BOAT_FLOOR_MPS = 0.1;

  /** Smallest automatic limit as a share of the boat's median speed: a helmsman's hand. */
  private static final double BOAT_FLOOR_SHARE = 0.1;

  final double[] eastMps;
  final double[] northMps;
  final double[] upMps;
  final byte[] reasons;
  private final double[] error;
  private final boolean[] threeBeam;

  /**
   * Turns and screens the boat's velocities.
   *
   * @param turn for bottom tracking
   * @param found receives the limits
   */
  BottomTrack(Ensembles ensembles, EarthTurn turn, Screening screening, List<FoundLimit> found) {
    int size = ensembles.size();
    eastMps = new double[size];
    northMps = new double[size];
    upMps = new double[size];
    error = new double[size];
    reasons = new byte[size];
    threeBeam = new boolean[size];
    read(ensembles, turn);
    boolean errors = ensembles.frame() == Frame.BEAM || anyPresent(error);
    for (int i = 0; i < size; i++) {
      threeBeam[i] = errors && !missing(i) && Double.isNaN(error[i]);
      if (missing(i)) {
        reasons[i] = Reason.MISSING.code();
      } else if (threeBeam[i] && !screening.threeBeam()) {
        reasons[i] = Reason.THREE_BEAM.code();
      }
    }
    departures(
        error,
        screening.bottomErrorVelocity(),
        Criterion.BOTTOM_ERROR_VELOCITY,
        Reason.ERROR_VELOCITY,
        found);
    departures(
        upMps,
        screening.bottomVerticalVelocity(),
        Criterion.BOTTOM_VERTICAL_VELOCITY,
        Reason.VERTICAL_VELOCITY,
        found);
    jumps(screening.boatSpeed(), found);
    for (int i = 0; i < size; i++) {
      if (reasons[i] != 0) {
        eastMps[i] = Double.NaN;
        northMps[i] = Double.NaN;
        upMps[i] = Double.NaN;
      }
    }
  }

  private void read(Ensembles ensembles, EarthTurn turn) {
    // Beams see the bed come towards them where the other frames give the boat over the bed.
    double sign = ensembles.frame() == Frame.BEAM ? -1 : 1;
    EnsembleQuantity[] components = {BOTTOM_1, BOTTOM_2, BOTTOM_3, BOTTOM_4};
    VelocityRow row = new VelocityRow(1);
    double[][] receivers = {row.east, row.north, row.up, row.error};
    for (int i = 0; i < eastMps.length; i++) {
      for (int c = 0; c < components.length; c++) {
        receivers[c][0] = ensembles.value(components[c], i);
      }
      turn.turn(i, row, 1, true);
      eastMps[i] = sign * row.east[0];
      northMps[i] = sign * row.north[0];
      upMps[i] = sign * row.up[0];
      error[i] = sign * row.error[0];
    }
  }

  private boolean missing(int i) {
    return Double.isNaN(eastMps[i]) || Double.isNaN(northMps[i]);
  }

  private static boolean anyPresent(double[] values) {
    for (double value : values) {
      if (!Double.isNaN(value)) {
        return true;
      }
    }
    return false;
  }

  private void departures(
      double[] values, Limit limit, Criterion criterion, Reason reason, List<FoundLimit> found) {
    if (!AutomaticLimit.on(limit)) {
      return;
    }
    Sample sample = new Sample();
    for (int i = 0; i < values.length; i++) {
      if (reasons[i] == 0) {
        sample.add(values[i]);
      }
    }
    RobustScale scale = sample.scale();
    double value =
        limit.kind() == Limit.Kind.GIVEN
            ? limit.value()
            : AutomaticLimit.departure(scale, FLOOR_MPS);
    found.add(new FoundLimit(criterion, limit.kind(), scale.median(), value));
    for (int i = 0; i < values.length; i++) {
      if (reasons[i] == 0 && Math.abs(values[i] - scale.median()) > value) {
        reasons[i] = reason.code();
      }
    }
  }

  private void jumps(Limit limit, List<FoundLimit> found) {
    if (!AutomaticLimit.on(limit)) {
      return;
    }
    VectorJumps jumps = new VectorJumps(accepted(eastMps), accepted(northMps));
    boolean given = limit.kind() == Limit.Kind.GIVEN;
    double least = Math.max(BOAT_FLOOR_MPS, BOAT_FLOOR_SHARE * jumps.medianLength());
    double value = given ? limit.value() : jumps.automatic(least);
    found.add(new FoundLimit(Criterion.BOAT_SPEED, limit.kind(), Double.NaN, value));
    boolean[] beyond = jumps.beyond(value, given ? value : least);
    for (int i = 0; i < beyond.length; i++) {
      if (beyond[i]) {
        reasons[i] = Reason.BOAT_SPEED.code();
      }
    }
  }

  private double[] accepted(double[] values) {
    double[] accepted = values.clone();
    for (int i = 0; i < accepted.length; i++) {
      if (reasons[i] != 0) {
        accepted[i] = Double.NaN;
      }
    }
    return accepted;
  }

  /** Number of used velocities that rest on three beams. */
  int threeBeamUsed() {
    int count = 0;
    for (int i = 0; i < reasons.length; i++) {
      count += reasons[i] == 0 && threeBeam[i] ? 1 : 0;
    }
    return count;
  }

  /** Whether any velocity is used. */
  boolean any() {
    return anyPresent(eastMps);
  }
}
