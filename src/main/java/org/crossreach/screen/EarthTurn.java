package org.crossreach.screen;

import java.util.Arrays;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;

/**
 * Turns recorded velocities into earth components: out of the beams, out of the boat's axes, onto
 * true north, and onto the true speed of sound.
 *
 * <p>Where the instrument frame has no vertical component, the vertical velocity is taken as 0.
 * Immutable; safe to share between threads.
 */
final class EarthTurn {

  private final Frame frame;
  private final BeamLayout layout;
  private final int leftBeam;
  private final Attitude attitude;
  private final SoundRatio sound;

  /**
   * Prepares the turn.
   *
   * @param layout beams, asked for only in the beam frame
   * @param leftBeam index of a beam that is not to be used, -1 for none
   */
  EarthTurn(
      Ensembles ensembles, BeamLayout layout, int leftBeam, Attitude attitude, SoundRatio sound) {
    this.frame = ensembles.frame();
    this.layout = layout;
    this.leftBeam = leftBeam;
    this.attitude = attitude;
    this.sound = sound;
  }

  /** Whether the horizontal components depend on the third and fourth recorded one. */
  boolean needsAll() {
    return attitude.tilts();
  }

  /**
   * Turns the velocities of one ensemble in place: the recorded components on entry, east, north,
   * up and error (m/s) on return.
   *
   * @param size how many cells
   * @param all whether up and error are wanted
   */
  void turn(int ensemble, VelocityRow row, int size, boolean all) {
    if (frame == Frame.BEAM) {
      layout.solve(row.east, row.north, row.up, row.error, size, leftBeam);
    }
    double r = sound.at(ensemble);
    attitude.rotation(ensemble, row.rotation);
    if (attitude.tilts()) {
      tilted(row, size, r);
    } else {
      level(row, size, r);
      if (all) {
        scale(row.up, size, r);
      }
    }
    if (all) {
      scale(row.error, size, r);
    }
  }

  private static void scale(double[] values, int size, double factor) {
    for (int k = 0; k < size; k++) {
      values[k] *= factor;
    }
  }

  private static void level(VelocityRow row, int size, double r) {
    double cos = r * row.rotation[0];
    double sin = r * row.rotation[1];
    double[] east = row.east;
    double[] north = row.north;
    for (int k = 0; k < size; k++) {
      double x = east[k];
      double y = north[k];
      east[k] = cos * x + sin * y;
      north[k] = cos * y - sin * x;
    }
  }

  private static void tilted(VelocityRow row, int size, double r) {
    double[] m = row.rotation;
    for (int k = 0; k < size; k++) {
      double x = row.east[k];
      double y = row.north[k];
      double z = row.up[k];
      if (Double.isNaN(z)) {
        z = -(m[6] * x + m[7] * y) / m[8];
      }
      row.east[k] = r * (m[0] * x + m[1] * y + m[2] * z);
      row.north[k] = r * (m[3] * x + m[4] * y + m[5] * z);
      row.up[k] = r * (m[6] * x + m[7] * y + m[8] * z);
    }
  }

  /** Marks components that the record does not have. */
  static void missing(double[] values) {
    Arrays.fill(values, Double.NaN);
  }
}
