package org.crossreach.screen;

import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Gaps;
import org.crossreach.survey.Instrument;

/**
 * How the axes of a record lie on true east, north and up, ensemble by ensemble.
 *
 * <p>With H the heading of the forward axis plus declination plus heading offset, clockwise from
 * true north, P the pitch, positive bow up, and R the roll, positive port side up: {@code [E N U] =
 * Rz(H) Rx(P) Ry(R) [x y z]} in the instrument and beam frames; {@code Rz(H)} alone in the ship
 * frame; in the earth frame only the turn from the compass's north, {@code Rz(declination +
 * offset)}. A missing heading, pitch or roll is taken linearly in time from its neighbours, heading
 * the short way round; a record without pitch or roll is taken as level.
 *
 * <p>Source: rotation derived from the signs of {@code formats/}. Immutable.
 */
final class Attitude {

  private final Frame frame;
  private final double turnDeg;
  private final double[] headingDeg;
  private final double[] pitchDeg;
  private final double[] rollDeg;
  private final int headingsFilled;

  Attitude(Ensembles ensembles, Instrument instrument, double[] elapsedS) {
    frame = ensembles.frame();
    turnDeg = instrument.northTurnDeg();
    double[] heading = column(ensembles, EnsembleQuantity.HEADING_DEG);
    headingsFilled = frame == Frame.EARTH ? 0 : missing(heading);
    headingDeg = headingsFilled == 0 ? heading : fillHeading(heading, elapsedS);
    pitchDeg = filled(column(ensembles, EnsembleQuantity.PITCH_DEG), elapsedS);
    rollDeg = filled(column(ensembles, EnsembleQuantity.ROLL_DEG), elapsedS);
  }

  private static double[] column(Ensembles ensembles, EnsembleQuantity quantity) {
    double[] column = new double[ensembles.size()];
    for (int i = 0; i < column.length; i++) {
      column[i] = ensembles.value(quantity, i);
    }
    return column;
  }

  private static int missing(double[] column) {
    int count = 0;
    for (double value : column) {
      count += Double.isNaN(value) ? 1 : 0;
    }
    return count;
  }

  private static double[] filled(double[] column, double[] elapsedS) {
    return missing(column) == 0 ? column : Gaps.fillLinear(column, elapsedS);
  }

  /**
   * Fills gaps along the circle: each heading first stands within half a turn of the one before.
   */
  private static double[] fillHeading(double[] heading, double[] elapsedS) {
    double[] unwound = heading.clone();
    double before = Double.NaN;
    for (int i = 0; i < unwound.length; i++) {
      if (!Double.isNaN(unwound[i])) {
        if (!Double.isNaN(before)) {
          unwound[i] = before + Math.IEEEremainder(unwound[i] - before, 360);
        }
        before = unwound[i];
      }
    }
    return Gaps.fillLinear(unwound, elapsedS);
  }

  /** Number of ensembles whose heading was filled in, where the frame needs one. */
  int headingsFilled() {
    return headingsFilled;
  }

  /** Whether the frame tilts with the boat, so that pitch and roll are needed. */
  boolean tilts() {
    return frame == Frame.INSTRUMENT || frame == Frame.BEAM;
  }

  /** Whether the record has pitch and roll. */
  boolean tiltKnown() {
    return pitchDeg.length == 0 || !(Double.isNaN(pitchDeg[0]) || Double.isNaN(rollDeg[0]));
  }

  /** Angle between the instrument's upward axis and the vertical (deg), NaN when not recorded. */
  double tiltDeg(int ensemble) {
    double pitch = Math.toRadians(pitchDeg[ensemble]);
    double roll = Math.toRadians(rollDeg[ensemble]);
    return Math.toDegrees(StrictMath.acos(StrictMath.cos(pitch) * StrictMath.cos(roll)));
  }

  /**
   * Writes the rotation of an ensemble, row by row: east, north and up from the first, second and
   * third axis.
   *
   * @param nine receives the matrix
   */
  void rotation(int ensemble, double[] nine) {
    double h = Math.toRadians(turnDeg + (frame == Frame.EARTH ? 0 : headingDeg[ensemble]));
    double ch = StrictMath.cos(h);
    double sh = StrictMath.sin(h);
    double cp = 1;
    double sp = 0;
    double cr = 1;
    double sr = 0;
    if (tilts()) {
      double p = Math.toRadians(levelIfUnknown(pitchDeg[ensemble]));
      double r = Math.toRadians(levelIfUnknown(rollDeg[ensemble]));
      cp = StrictMath.cos(p);
      sp = StrictMath.sin(p);
      cr = StrictMath.cos(r);
      sr = StrictMath.sin(r);
    }
    nine[0] = ch * cr + sh * sp * sr;
    nine[1] = sh * cp;
    nine[2] = ch * sr - sh * sp * cr;
    nine[3] = -sh * cr + ch * sp * sr;
    nine[4] = ch * cp;
    nine[5] = -sh * sr - ch * sp * cr;
    nine[6] = -cp * sr;
    nine[7] = sp;
    nine[8] = cp * cr;
  }

  private static double levelIfUnknown(double angleDeg) {
    return Double.isNaN(angleDeg) ? 0 : angleDeg;
  }
}
