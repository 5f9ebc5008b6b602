package org.crossreach.section;

import org.crossreach.motion.Track;
import org.crossreach.screen.ScreenedPass;
import org.crossreach.screen.VelocityRow;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Gaps;

/**
 * One pass laid on its section line: depth, progress and velocity of every ensemble.
 *
 * <p>Immutable; safe to share between threads.
 */
public final class Section {

  private final ScreenedPass pass;
  private final Track track;
  private final Line line;
  private final Bank startBank;
  private final double[] depthM;
  private final boolean[] depthFilled;
  private final double[] progressM;
  private final double[] sidewaysM;

  private Section(
      ScreenedPass pass,
      Track track,
      Line line,
      Bank startBank,
      double[] depthM,
      boolean[] depthFilled) {
    this.pass = pass;
    this.track = track;
    this.line = line;
    this.startBank = startBank;
    this.depthM = depthM;
    this.depthFilled = depthFilled;
    progressM = new double[depthM.length];
    sidewaysM = new double[depthM.length];
    double forward = forward();
    for (int i = 0; i < depthM.length; i++) {
      double east = track.displacementEastM(i);
      double north = track.displacementNorthM(i);
      progressM[i] = forward * line.along(east, north);
      sidewaysM[i] = forward * line.normal(east, north);
    }
  }

  /**
   * Lays a pass on a line. A missing depth is linear along the track between its neighbours.
   *
   * @param pass the screened samples
   * @param track the boat's track over the bed
   * @param line the section line
   * @param startBank bank from which the boat started
   */
  public static Section of(ScreenedPass pass, Track track, Line line, Bank startBank) {
    double[] measured = new double[pass.size()];
    boolean[] filled = new boolean[pass.size()];
    for (int i = 0; i < measured.length; i++) {
      measured[i] = pass.draftM() + pass.depthBelowFaceM(i);
      filled[i] = Double.isNaN(measured[i]);
    }
    double[] depth = Gaps.fillLinear(measured, track.lengthsM());
    return new Section(pass, track, line, startBank, depth, filled);
  }

  /** The screened samples. */
  public ScreenedPass pass() {
    return pass;
  }

  /** The boat's track over the bed. */
  public Track track() {
    return track;
  }

  /** The section line. */
  public Line line() {
    return line;
  }

  /** Bank from which the boat started. */
  public Bank startBank() {
    return startBank;
  }

  /** Number of ensembles. */
  public int size() {
    return depthM.length;
  }

  /** Depth of the water (m), filled in where no beam has a usable one. */
  public double depthM(int ensemble) {
    return depthM[ensemble];
  }

  /** Whether the depth of an ensemble was filled in from its neighbours. */
  public boolean depthFilled(int ensemble) {
    return depthFilled[ensemble];
  }

  /**
   * How far the boat came along the line during an ensemble (m), positive towards the bank opposite
   * to the start.
   */
  public double progressM(int ensemble) {
    return progressM[ensemble];
  }

  /**
   * How far the boat moved normal to the line during an ensemble (m), positive downstream, and
   * negated for a start at the right bank, so that {@code normal x progress - along x sideways} is
   * the flux through the boat's path, positive downstream, for both.
   */
  public double sidewaysM(int ensemble) {
    return sidewaysM[ensemble];
  }

  /** Distance along the line from the first ensemble (m), positive towards the opposite bank. */
  public double distanceM(int ensemble) {
    return forward() * line.along(track.eastM(ensemble), track.northM(ensemble));
  }

  private double forward() {
    return startBank == Bank.LEFT ? 1 : -1;
  }

  /** Room for the columns of this section. */
  public Column newColumn() {
    return new Column(pass.maxCells());
  }

  /** Room for the velocities of this section's ensembles. */
  public VelocityRow newRow() {
    return new VelocityRow(pass.maxCells());
  }

  /**
   * Reads the usable cells of an ensemble.
   *
   * @param ensemble from 0
   * @param row room for the ensemble's velocities
   * @param column receives the cells
   */
  public void read(int ensemble, VelocityRow row, Column column) {
    pass.read(ensemble, row);
    double boatEast = track.boatEastMps(ensemble);
    double boatNorth = track.boatNorthMps(ensemble);
    double depth = depthM[ensemble];
    double top = pass.topOfCellsM(ensemble);
    double cellSize = pass.cellSizeM(ensemble);
    int[] cell = column.cell;
    double[] uppers = column.upperM;
    double[] lowers = column.lowerM;
    double[] normals = column.normalMps;
    double[] alongs = column.alongMps;
    double normalSum = 0;
    double alongSum = 0;
    int cells = cell.length;
    int j = 0;
    for (int k = 0; k < cells; k++) {
      double upper = depth - (top + k * cellSize);
      double lower = depth - (top + (k + 1) * cellSize);
      upper = upper > depth ? depth : upper;
      lower = lower < 0 ? 0 : lower;
      if (!row.usable(k) || !(upper > lower)) {
        continue;
      }
      double east = row.eastMps(k) + boatEast;
      double north = row.northMps(k) + boatNorth;
      double normal = line.normal(east, north);
      double along = line.along(east, north);
      cell[j] = k;
      uppers[j] = upper;
      lowers[j] = lower;
      normals[j] = normal;
      alongs[j] = along;
      normalSum += normal * (upper - lower);
      alongSum += along * (upper - lower);
      j++;
    }
    column.normalTransport = normalSum;
    column.alongTransport = alongSum;
    column.size = j;
    column.depthM = depth;
  }
}
