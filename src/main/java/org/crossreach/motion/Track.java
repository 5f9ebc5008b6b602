package org.crossreach.motion;

import org.crossreach.screen.ScreenedPass;
import org.crossreach.survey.Gaps;

/**
 * Velocity and position of the boat over the bed at every ensemble, on true east and north.
 *
 * <p>The displacement of ensemble i is its boat velocity times the time since ensemble i - 1; that
 * of the first ensemble is 0. A missing velocity is linear in time between its neighbours.
 * Positions stand at the end of the ensemble's averaging interval, from the place of the first
 * ensemble.
 */
public final class Track {

  private final double[] boatEastMps;
  private final double[] boatNorthMps;
  private final boolean[] filled;
  private final double[] displacementEastM;
  private final double[] displacementNorthM;
  private final double[] eastM;
  private final double[] northM;
  private final double[] lengthM;

  private Track(double[] boatEastMps, double[] boatNorthMps, boolean[] filled, double[] elapsedS) {
    int size = elapsedS.length;
    this.boatEastMps = boatEastMps;
    this.boatNorthMps = boatNorthMps;
    this.filled = filled;
    displacementEastM = new double[size];
    displacementNorthM = new double[size];
    eastM = new double[size];
    northM = new double[size];
    lengthM = new double[size];
    for (int i = 1; i < size; i++) {
      double dt = elapsedS[i] - elapsedS[i - 1];
      displacementEastM[i] = boatEastMps[i] * dt;
      displacementNorthM[i] = boatNorthMps[i] * dt;
      eastM[i] = eastM[i - 1] + displacementEastM[i];
      northM[i] = northM[i - 1] + displacementNorthM[i];
      lengthM[i] = lengthM[i - 1] + Math.hypot(displacementEastM[i], displacementNorthM[i]);
    }
  }

  /**
   * The track by bottom tracking.
   *
   * @param pass the screened samples
   * @return the track; every value is NaN when no ensemble has a boat velocity
   */
  public static Track of(ScreenedPass pass) {
    int size = pass.size();
    double[] elapsed = new double[size];
    double[] east = new double[size];
    double[] north = new double[size];
    boolean[] filled = new boolean[size];
    for (int i = 0; i < size; i++) {
      elapsed[i] = pass.ensembles().elapsedS(i);
      east[i] = pass.boatEastMps(i);
      north[i] = pass.boatNorthMps(i);
      filled[i] = Double.isNaN(east[i]) || Double.isNaN(north[i]);
    }
    return new Track(
        Gaps.fillLinear(east, elapsed), Gaps.fillLinear(north, elapsed), filled, elapsed);
  }

  /** Number of ensembles. */
  public int size() {
    return eastM.length;
  }

  /** Eastward velocity of the boat over the bed (m/s). */
  public double boatEastMps(int ensemble) {
    return boatEastMps[ensemble];
  }

  /** Northward velocity of the boat over the bed (m/s). */
  public double boatNorthMps(int ensemble) {
    return boatNorthMps[ensemble];
  }

  /** Whether the boat velocity of an ensemble was filled in from its neighbours. */
  public boolean filled(int ensemble) {
    return filled[ensemble];
  }

  /** Eastward displacement during an ensemble (m). */
  public double displacementEastM(int ensemble) {
    return displacementEastM[ensemble];
  }

  /** Northward displacement during an ensemble (m). */
  public double displacementNorthM(int ensemble) {
    return displacementNorthM[ensemble];
  }

  /** Position east of the first ensemble (m). */
  public double eastM(int ensemble) {
    return eastM[ensemble];
  }

  /** Position north of the first ensemble (m). */
  public double northM(int ensemble) {
    return northM[ensemble];
  }

  /** Length of the way from the first ensemble (m), never decreasing. */
  public double lengthM(int ensemble) {
    return lengthM[ensemble];
  }

  /** Length of the way from the first ensemble to each one (m), as a fresh array. */
  public double[] lengthsM() {
    return lengthM.clone();
  }

  /** Straight distance between the first and the last position (m). */
  public double madeGoodM() {
    int last = size() - 1;
    return Math.hypot(eastM[last], northM[last]);
  }
}
