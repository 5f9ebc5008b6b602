package org.crossreach.section;

/**
 * Room for the usable cells of one ensemble, from the top down; to be filled again for each
 * ensemble. One column belongs to one thread.
 *
 * <p>Heights are above the bed (m). Velocities are of the water over the ground (m/s): {@code
 * normal} positive downstream, {@code along} positive from the left to the right bank.
 */
public final class Column {

  int size;
  double depthM;
  final int[] cell;
  final double[] upperM;
  final double[] lowerM;
  final double[] normalMps;
  final double[] alongMps;

  /** Sums of velocity times height over the cells (m²/s). */
  double normalTransport;

  double alongTransport;

  /**
   * Makes room.
   *
   * @param cells largest number of cells
   */
  public Column(int cells) {
    cell = new int[cells];
    upperM = new double[cells];
    lowerM = new double[cells];
    normalMps = new double[cells];
    alongMps = new double[cells];
  }

  /** Number of usable cells. */
  public int size() {
    return size;
  }

  /** Depth of the water (m). */
  public double depthM() {
    return depthM;
  }

  /** Number of the cell in its ensemble, from 0 at the top. */
  public int cell(int j) {
    return cell[j];
  }

  /** Height of the cell's upper edge above the bed (m). */
  public double upperM(int j) {
    return upperM[j];
  }

  /** Height of the cell's lower edge above the bed (m). */
  public double lowerM(int j) {
    return lowerM[j];
  }

  /** Height of the cell's centre above the bed (m). */
  public double centreM(int j) {
    return 0.5 * (upperM[j] + lowerM[j]);
  }

  /** Height of the cell (m). */
  public double heightM(int j) {
    return upperM[j] - lowerM[j];
  }

  /** Velocity component of a cell (m/s). */
  public double velocityMps(Component component, int j) {
    return component == Component.NORMAL ? normalMps[j] : alongMps[j];
  }

  /** Sum of velocity times height over all cells (m²/s). */
  public double transportM2s(Component component) {
    return component == Component.NORMAL ? normalTransport : alongTransport;
  }

  /** Whether no cell is missing between cell {@code first} and the lowest one. */
  public boolean unbroken(int first) {
    return cell[size - 1] - cell[first] == size - 1 - first;
  }

  /** Whether no cell is missing between cell {@code j} and the next one below. */
  public boolean joined(int j) {
    return cell[j] + 1 == cell[j + 1];
  }

  /**
   * Takes over some cells of another column, with its depth.
   *
   * @param source the other column
   * @param from first cell taken
   * @param to one past the last cell taken
   */
  public void takePart(Column source, int from, int to) {
    size = to - from;
    depthM = source.depthM;
    System.arraycopy(source.cell, from, cell, 0, size);
    System.arraycopy(source.upperM, from, upperM, 0, size);
    System.arraycopy(source.lowerM, from, lowerM, 0, size);
    System.arraycopy(source.normalMps, from, normalMps, 0, size);
    System.arraycopy(source.alongMps, from, alongMps, 0, size);
    sum();
  }

  private void sum() {
    normalTransport = 0;
    alongTransport = 0;
    for (int j = 0; j < size; j++) {
      normalTransport += normalMps[j] * (upperM[j] - lowerM[j]);
      alongTransport += alongMps[j] * (upperM[j] - lowerM[j]);
    }
  }

  /**
   * Turns the axes: what was normal to the section becomes the component along a given direction,
   * what was along it the component to the right of that direction.
   *
   * @param normalPart the direction's part normal to the section, of a unit vector
   * @param alongPart the direction's part along the section, positive to the right bank
   */
  public void turnTo(double normalPart, double alongPart) {
    for (int j = 0; j < size; j++) {
      double normal = normalMps[j];
      double along = alongMps[j];
      normalMps[j] = normalPart * normal + alongPart * along;
      alongMps[j] = normalPart * along - alongPart * normal;
    }
    sum();
  }
}
