package org.crossreach.screen;

/**
 * Compares each cell with its neighbours in time and depth.
 *
 * <p>Cells are compared relative to the middle of their own ensemble, so that neither the boat's
 * own motion nor its error shows; an ensemble with fewer than four used cells has no middle worth
 * the name and is compared as it is, over the ground. Neighbours are the cells of the same depth in
 * the three ensembles before and after, and, where the ensemble has usable cells both above and
 * below, those above and below in the ensemble itself and in the one before and after: at most
 * twelve. Depth counts on both sides or not at all, so that the shear near the bed is no departure.
 * A cell with fewer than three neighbours is not judged. The departure is the length of the vector
 * from the component-wise median of the neighbours. One screen belongs to one thread.
 */
final class SpikeScreen {

  private static final int FEWEST_NEIGHBOURS = 3;
  private static final int FEWEST_CELLS = 4;
  private static final double HALF_SQRT_2 = Math.sqrt(0.5);

  private final CellFacts facts;
  private final RowWindow window;
  private final double[][] east = new double[2 * RowWindow.REACH + 1][];
  private final double[][] north = new double[2 * RowWindow.REACH + 1][];
  private final double[][] shiftedEast;
  private final double[][] shiftedNorth;
  private final double[] offsetEast = new double[east.length];
  private final double[] offsetNorth = new double[north.length];
  private final double[] nearEast = new double[12];
  private final double[] nearNorth = new double[12];
  private boolean asTheyAre;
  private int neighbours;
  private double departureEast;
  private double departureNorth;

  SpikeScreen(CellFacts facts, RowWindow window) {
    this.facts = facts;
    this.window = window;
    shiftedEast = new double[east.length][facts.cells()];
    shiftedNorth = new double[north.length][facts.cells()];
  }

  /** Prepares the ensemble whose cells are to be compared. */
  void centreOn(int ensemble) {
    window.centreOn(ensemble);
    asTheyAre = window.used(ensemble) < FEWEST_CELLS && facts.boatKnown();
    for (int d = -RowWindow.REACH; d <= RowWindow.REACH; d++) {
      int other = ensemble + d;
      int at = d + RowWindow.REACH;
      boolean there = other >= 0 && other < facts.size();
      east[at] = there ? window.east(other) : null;
      north[at] = there ? window.north(other) : null;
      if (there) {
        offsetEast[at] = asTheyAre ? 0 : window.middleEast(other);
        offsetNorth[at] = asTheyAre ? 0 : window.middleNorth(other);
        if (!sameCells(ensemble, other)) {
          shift(ensemble, other, at);
        }
      }
    }
  }

  private boolean sameCells(int a, int b) {
    return facts.firstCellM(a) == facts.firstCellM(b) && facts.cellSizeM(a) == facts.cellSizeM(b);
  }

  /** Takes from an ensemble with other cells those that hold the centres of this one's cells. */
  private void shift(int ensemble, int other, int at) {
    double first = facts.firstCellM(ensemble);
    double size = facts.cellSizeM(ensemble);
    double otherTop = facts.firstCellM(other) - 0.5 * facts.cellSizeM(other);
    double otherSize = facts.cellSizeM(other);
    for (int k = 0; k < facts.cells(); k++) {
      int cell = (int) Math.floor((first + k * size - otherTop) / otherSize);
      boolean there = cell >= 0 && cell < facts.cells();
      shiftedEast[at][k] = there ? east[at][cell] : Double.NaN;
      shiftedNorth[at][k] = there ? north[at][cell] : Double.NaN;
    }
    east[at] = shiftedEast[at];
    north[at] = shiftedNorth[at];
  }

  /** Whether the ensemble's cells are compared as they are, over the ground. */
  boolean asTheyAre() {
    return asTheyAre;
  }

  /** Whether a usable cell departs from its neighbours by more than a limit (m/s). */
  boolean departs(int cell, double limit) {
    collect(cell);
    if (neighbours < FEWEST_NEIGHBOURS || agrees(cell, limit * HALF_SQRT_2)) {
      return false;
    }
    compare(cell);
    return departureEast * departureEast + departureNorth * departureNorth > limit * limit;
  }

  /**
   * Measures the departure of a usable cell into {@link #departureEast()} and {@link
   * #departureNorth()}, NaN when it has too few neighbours.
   */
  void measure(int cell) {
    collect(cell);
    if (neighbours < FEWEST_NEIGHBOURS) {
      departureEast = Double.NaN;
      departureNorth = Double.NaN;
    } else {
      compare(cell);
    }
  }

  /**
   * Measures the departure of the middle of the ensemble from those of its neighbours into {@link
   * #departureEast()} and {@link #departureNorth()}, NaN when it has too few neighbours.
   */
  void measureMiddle(int ensemble) {
    neighbours = 0;
    for (int d = -RowWindow.REACH; d <= RowWindow.REACH; d++) {
      int other = ensemble + d;
      if (d != 0 && other >= 0 && other < facts.size() && window.used(other) > 0) {
        nearEast[neighbours] = window.middleEast(other);
        nearNorth[neighbours] = window.middleNorth(other);
        neighbours++;
      }
    }
    boolean enough = neighbours >= FEWEST_NEIGHBOURS;
    departureEast =
        enough ? window.middleEast(ensemble) - Median.of(nearEast, neighbours) : Double.NaN;
    departureNorth =
        enough ? window.middleNorth(ensemble) - Median.of(nearNorth, neighbours) : Double.NaN;
  }

  double departureEast() {
    return departureEast;
  }

  double departureNorth() {
    return departureNorth;
  }

  private double ownEast(int cell) {
    return east[RowWindow.REACH][cell] - offsetEast[RowWindow.REACH];
  }

  private double ownNorth(int cell) {
    return north[RowWindow.REACH][cell] - offsetNorth[RowWindow.REACH];
  }

  private void compare(int cell) {
    departureEast = ownEast(cell) - Median.of(nearEast, neighbours);
    departureNorth = ownNorth(cell) - Median.of(nearNorth, neighbours);
  }

  /**
   * Whether more than half of the neighbours lie so near in both components that their medians do,
   * too: this settles nearly every cell without a median.
   */
  private boolean agrees(int cell, double near) {
    double e = ownEast(cell);
    double n = ownNorth(cell);
    int count = 0;
    for (int j = 0; j < neighbours; j++) {
      if (Math.abs(nearEast[j] - e) <= near && Math.abs(nearNorth[j] - n) <= near) {
        count++;
      }
    }
    return 2 * count > neighbours;
  }

  private void collect(int cell) {
    neighbours = 0;
    double[] own = east[RowWindow.REACH];
    boolean inside =
        cell > 0
            && cell + 1 < own.length
            && !Double.isNaN(own[cell - 1])
            && !Double.isNaN(own[cell + 1]);
    for (int at = 0; at < east.length; at++) {
      if (east[at] == null) {
        continue;
      }
      if (at != RowWindow.REACH) {
        take(at, cell);
      }
      if (inside && Math.abs(at - RowWindow.REACH) <= 1) {
        take(at, cell - 1);
        take(at, cell + 1);
      }
    }
  }

  private void take(int at, int cell) {
    double e = east[at][cell];
    if (!Double.isNaN(e)) {
      nearEast[neighbours] = e - offsetEast[at];
      nearNorth[neighbours] = north[at][cell] - offsetNorth[at];
      neighbours++;
    }
  }
}
