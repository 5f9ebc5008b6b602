package org.crossreach.screen;

import java.util.Arrays;

/**
 * The velocities of an ensemble and of its neighbours in time, cell beside cell: where an ensemble
 * has other cells, those are taken that hold the centres of the middle ensemble's cells.
 *
 * <p>Velocities stand either as they are, over the ground where the boat's velocity is known, or
 * relative to the middle of their own ensemble.
 */
final class AlignedRows {

  private static final int REACH = RowWindow.REACH;
  private static final int ROWS = 2 * REACH + 1;

  /** More than half of the rows before and after. */
  private static final int MAJORITY = REACH + 1;

  private final CellFacts facts;
  private final RowWindow window;
  private final double[][] east = new double[ROWS][];
  private final double[][] north = new double[ROWS][];
  private final double[][] shiftedEast;
  private final double[][] shiftedNorth;
  private final double[] nowhere;
  private final double[] middleEast = new double[ROWS];
  private final double[] middleNorth = new double[ROWS];
  private final double[] offsetEast = new double[ROWS];
  private final double[] offsetNorth = new double[ROWS];

  /** For each cell of the middle ensemble how many rows are near to it. */
  private final int[] agreeing;

  AlignedRows(CellFacts facts, RowWindow window) {
    this.facts = facts;
    this.window = window;
    agreeing = new int[facts.cells()];
    nowhere = new double[facts.cells()];
    Arrays.fill(nowhere, Double.NaN);
    shiftedEast = new double[ROWS][facts.cells()];
    shiftedNorth = new double[ROWS][facts.cells()];
  }

  /** Lays an ensemble in the middle. */
  void centreOn(int ensemble) {
    window.centreOn(ensemble);
    for (int d = -REACH; d <= REACH; d++) {
      int other = ensemble + d;
      int row = d + REACH;
      boolean there = other >= 0 && other < facts.size();
      east[row] = there ? window.east(other) : nowhere;
      north[row] = there ? window.north(other) : nowhere;
      if (there) {
        middleEast[row] = window.middleEast(other);
        middleNorth[row] = window.middleNorth(other);
        if (!sameCells(ensemble, other)) {
          shift(ensemble, other, row);
        }
      }
    }
  }

  private boolean sameCells(int a, int b) {
    double[] first = facts.firstCellM();
    double[] size = facts.cellSizeM();
    return first[a] == first[b] && size[a] == size[b];
  }

  private void shift(int ensemble, int other, int row) {
    double first = facts.firstCellM()[ensemble];
    double size = facts.cellSizeM()[ensemble];
    double otherTop = facts.firstCellM()[other] - 0.5 * facts.cellSizeM()[other];
    double otherSize = facts.cellSizeM()[other];
    for (int k = 0; k < facts.cells(); k++) {
      int cell = (int) Math.floor((first + k * size - otherTop) / otherSize);
      boolean there = cell >= 0 && cell < facts.cells();
      shiftedEast[row][k] = there ? east[row][cell] : Double.NaN;
      shiftedNorth[row][k] = there ? north[row][cell] : Double.NaN;
    }
    east[row] = shiftedEast[row];
    north[row] = shiftedNorth[row];
  }

  /**
   * Finds the used cells of the middle ensemble that do not agree with most cells of the same depth
   * before and after: those that have fewer than four such cells near in each component. More than
   * half of six are four, so that the median of all six is near to a cell that is not found.
   *
   * @param near how near (m/s), in the way chosen by {@link #relative}
   * @param reasons reasons of the middle ensemble's cells
   * @param found receives the cells
   * @return how many there are
   */
  int disagreeing(double near, byte[] reasons, int[] found) {
    Arrays.fill(agreeing, 0);
    for (int distance = 1; distance < REACH; distance++) {
      agree(distance, near);
    }
    int size = 0;
    for (int k = 0; k < reasons.length; k++) {
      if (reasons[k] == 0 && agreeing[k] < MAJORITY) {
        found[size++] = k;
      }
    }
    if (size == 0) {
      return 0;
    }
    agree(REACH, near);
    int left = 0;
    for (int s = 0; s < size; s++) {
      if (agreeing[found[s]] < MAJORITY) {
        found[left++] = found[s];
      }
    }
    return left;
  }

  /**
   * Counts the cells of the middle ensemble to which those of two other rows are near.
   *
   * @param distance how many rows before and after the middle one the two lie
   */
  private void agree(int distance, double near) {
    int before = REACH - distance;
    int after = REACH + distance;
    double[] eastBefore = east[before];
    double[] northBefore = north[before];
    double[] eastAfter = east[after];
    double[] northAfter = north[after];
    double[] ownEast = east[REACH];
    double[] ownNorth = north[REACH];
    double shiftEastBefore = offsetEast[before] - offsetEast[REACH];
    double shiftNorthBefore = offsetNorth[before] - offsetNorth[REACH];
    double shiftEastAfter = offsetEast[after] - offsetEast[REACH];
    double shiftNorthAfter = offsetNorth[after] - offsetNorth[REACH];
    int[] count = agreeing;
    for (int k = 0; k < count.length; k++) {
      double e = ownEast[k];
      double n = ownNorth[k];
      if (Math.abs(eastBefore[k] - e - shiftEastBefore) <= near
          && Math.abs(northBefore[k] - n - shiftNorthBefore) <= near) {
        count[k]++;
      }
      if (Math.abs(eastAfter[k] - e - shiftEastAfter) <= near
          && Math.abs(northAfter[k] - n - shiftNorthAfter) <= near) {
        count[k]++;
      }
    }
  }

  /** Chooses how velocities stand: relative to the middle of their ensemble, or as they are. */
  void relative(boolean toMiddle) {
    for (int row = 0; row < ROWS; row++) {
      offsetEast[row] = toMiddle ? middleEast[row] : 0;
      offsetNorth[row] = toMiddle ? middleNorth[row] : 0;
    }
  }

  /**
   * Whether a cell of an ensemble is there and used; d is 0 for the middle one, -1 for the one
   * before.
   */
  boolean has(int d, int cell) {
    double[] row = east[d + REACH];
    return cell >= 0 && cell < row.length && !Double.isNaN(row[cell]);
  }

  /** Eastward velocity (m/s) of a cell that {@linkplain #has is there}. */
  double east(int d, int cell) {
    return east[d + REACH][cell] - offsetEast[d + REACH];
  }

  /** Northward velocity (m/s) of a cell that {@linkplain #has is there}. */
  double north(int d, int cell) {
    return north[d + REACH][cell] - offsetNorth[d + REACH];
  }
}
