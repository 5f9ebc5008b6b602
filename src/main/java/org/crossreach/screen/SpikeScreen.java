package org.crossreach.screen;

/**
 * Compares each cell with its neighbours in time and depth.
 *
 * <p>Cells are compared over the ground, so that the boat's own motion does not show; and, where
 * the boat's velocity is unknown or so uncertain that the comparison is sharper that way, relative
 * to the middle of their own ensemble. An ensemble with fewer than four used cells has no middle
 * worth the name and is compared over the ground alone.
 *
 * <p>Neighbours are the cells of the same depth in the three ensembles before and after; where
 * fewer than three of them are used, those above and below in the ensemble itself and in the one
 * before and after as well, if the ensemble has usable cells on both sides: depth counts on both
 * sides or not at all, so that the shear near the bed is no departure. The departure is the length
 * of the vector from the component-wise median of the neighbours. Where velocity changes across, as
 * on a steep bank, what that explains is allowed on top of the least limit. A cell with fewer than
 * three neighbours is not judged. One screen belongs to one thread.
 */
final class SpikeScreen {

  private static final int REACH = RowWindow.REACH;
  private static final int FEWEST_NEIGHBOURS = 3;
  private static final int FEWEST_CELLS = 4;
  private static final int MOST_NEIGHBOURS = 2 * REACH + 6;

  private static final double HALF_SQRT_2 = Math.sqrt(0.5);

  private final CellFacts facts;
  private final RowWindow window;
  private final AlignedRows rows;
  private final double[] nearEast = new double[MOST_NEIGHBOURS];
  private final double[] nearNorth = new double[MOST_NEIGHBOURS];
  private final int[] suspect;
  private boolean hasMiddle;
  private int neighbours;
  private double departureEast;
  private double departureNorth;

  SpikeScreen(CellFacts facts, RowWindow window) {
    this.facts = facts;
    this.window = window;
    this.rows = new AlignedRows(facts, window);
    this.suspect = new int[facts.cells()];
  }

  /** Prepares the ensemble whose cells are to be compared. */
  void centreOn(int ensemble) {
    rows.centreOn(ensemble);
    hasMiddle = window.used(ensemble) >= FEWEST_CELLS || !facts.boatKnown();
  }

  /**
   * Marks the cells of the ensemble that depart from their neighbours.
   *
   * @param limits largest departures (m/s), NaN where nothing is known to judge by
   * @param reasons reasons of the ensemble's cells; a used one that departs becomes a spike
   * @return how many cells depart
   */
  int mark(SpikeLimits limits, byte[] reasons) {
    int marked = 0;
    if (compares(false)) {
      marked += mark(false, limits.overGround(), limits.least(), reasons);
    }
    if (compares(true) && window.hasMiddles()) {
      marked += mark(true, limits.relative(), limits.least(), reasons);
    }
    return marked;
  }

  private int mark(boolean toMiddle, double limit, double least, byte[] reasons) {
    rows.relative(toMiddle);
    int suspects = rows.disagreeing(limit * HALF_SQRT_2, reasons, suspect);
    int marked = 0;
    for (int s = 0; s < suspects; s++) {
      if (departs(suspect[s], limit, least)) {
        reasons[suspect[s]] = Reason.SPIKE.code();
        marked++;
      }
    }
    return marked;
  }

  /** Whether the ensemble's cells can be compared in a way. */
  private boolean compares(boolean toMiddle) {
    return toMiddle ? hasMiddle : facts.boatKnown();
  }

  private boolean departs(int cell, double limit, double least) {
    collect(cell);
    if (neighbours < FEWEST_NEIGHBOURS || agrees(cell, limit * HALF_SQRT_2)) {
      return false;
    }
    compare(cell);
    return length(departureEast, departureNorth) > Math.max(limit, least + changeAcross(cell));
  }

  /**
   * How far a cell may lie from the median of its neighbours because velocity changes across (m/s):
   * half of the change from one side to the other; where there is one side alone, as at the foot of
   * a bank, one and a half times the change along it, since near the bed velocity changes ever
   * faster.
   */
  private double changeAcross(int cell) {
    boolean before = side(cell, -1);
    double beforeEast = Median.of(nearEast, neighbours);
    double beforeNorth = Median.of(nearNorth, neighbours);
    if (before && side(cell, 1)) {
      double afterEast = Median.of(nearEast, neighbours);
      double afterNorth = Median.of(nearNorth, neighbours);
      return 0.5 * length(afterEast - beforeEast, afterNorth - beforeNorth);
    }
    if (!side(cell, before ? -1 : 1)) {
      return 0;
    }
    int far = neighbours - 1;
    return 1.5 * length(nearEast[far] - nearEast[0], nearNorth[far] - nearNorth[0]);
  }

  /** Collects the cells of one side from the nearest on; returns whether there is one. */
  private boolean side(int cell, int way) {
    neighbours = 0;
    for (int d = 1; d <= REACH; d++) {
      take(way * d, cell);
    }
    return neighbours > 0;
  }

  /**
   * Measures the departure of a usable cell into {@link #departureEast()} and {@link
   * #departureNorth()}, NaN when it has too few neighbours or cannot be compared in this way.
   *
   * @param toMiddle whether relative to the middle of its ensemble, else over the ground
   */
  void measure(int cell, boolean toMiddle) {
    rows.relative(toMiddle);
    collect(cell);
    if (neighbours < FEWEST_NEIGHBOURS || !compares(toMiddle)) {
      departureEast = Double.NaN;
      departureNorth = Double.NaN;
    } else {
      compare(cell);
    }
  }

  double departureEast() {
    return departureEast;
  }

  double departureNorth() {
    return departureNorth;
  }

  private void collect(int cell) {
    neighbours = 0;
    for (int d = 1; d <= REACH; d++) {
      take(-d, cell);
      take(d, cell);
    }
    if (neighbours < FEWEST_NEIGHBOURS && rows.has(0, cell - 1) && rows.has(0, cell + 1)) {
      for (int d = -1; d <= 1; d++) {
        take(d, cell - 1);
        take(d, cell + 1);
      }
    }
  }

  private void take(int d, int cell) {
    if (rows.has(d, cell)) {
      nearEast[neighbours] = rows.east(d, cell);
      nearNorth[neighbours] = rows.north(d, cell);
      neighbours++;
    }
  }

  /**
   * Whether the medians of the neighbours must be near, since in each component most of them are.
   */
  private boolean agrees(int cell, double near) {
    double e = rows.east(0, cell);
    double n = rows.north(0, cell);
    int nearInEast = 0;
    int nearInNorth = 0;
    for (int j = 0; j < neighbours; j++) {
      nearInEast += Math.abs(nearEast[j] - e) <= near ? 1 : 0;
      nearInNorth += Math.abs(nearNorth[j] - n) <= near ? 1 : 0;
    }
    return 2 * Math.min(nearInEast, nearInNorth) > neighbours;
  }

  private void compare(int cell) {
    departureEast = rows.east(0, cell) - Median.of(nearEast, neighbours);
    departureNorth = rows.north(0, cell) - Median.of(nearNorth, neighbours);
  }

  private static double length(double x, double y) {
    return Math.sqrt(x * x + y * y);
  }
}
