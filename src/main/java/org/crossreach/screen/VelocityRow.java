package org.crossreach.screen;

import java.util.Arrays;

/**
 * Room for the water velocities of one ensemble, to be filled again for each ensemble.
 *
 * <p>Components in m/s on true east and north, relative to the boat, indexed by cell. One row
 * belongs to one thread and one pass.
 */
public final class VelocityRow {

  final double[] east;
  final double[] north;
  final double[] up;
  final double[] error;
  final double[] rotation = new double[9];

  /** Why each cell is not used, 0 when it is; known once its pass was screened. */
  final byte[] reasons;

  /** Room for another quantity of the cells. */
  final double[] other;

  /**
   * Makes room.
   *
   * @param cells number of cells
   */
  public VelocityRow(int cells) {
    east = new double[cells];
    north = new double[cells];
    up = new double[cells];
    error = new double[cells];
    reasons = new byte[cells];
    other = new double[cells];
    Arrays.fill(up, Double.NaN);
    Arrays.fill(error, Double.NaN);
  }

  /** Whether a cell may be used. */
  public boolean usable(int cell) {
    return reasons[cell] == 0;
  }

  /** Eastward velocity of the water relative to the boat (m/s). */
  public double eastMps(int cell) {
    return east[cell];
  }

  /** Northward velocity of the water relative to the boat (m/s). */
  public double northMps(int cell) {
    return north[cell];
  }
}
