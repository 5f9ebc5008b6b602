package org.crossreach.screen;

/**
 * The judged water velocities of an ensemble and its neighbours in time, kept while they are
 * needed.
 *
 * <p>Velocities are over the ground where the boat's is known, else relative to the boat. With each
 * ensemble stands its middle, the component-wise median over at most nine of its used cells, spread
 * evenly: more would cost much and tell little.
 */
final class RowWindow {

  /** Neighbours kept on either side. */
  static final int REACH = 3;

  private static final int ENOUGH_FOR_MIDDLE = 9;
  private static final int SLOTS = 2 * REACH + 1;

  private final CellFacts facts;
  private final CellJudge judge;
  private final boolean middles;
  private final boolean errors;
  private final VelocityRow row;
  private final double[] scratch;
  private final int[] usedCells;
  private final int[] owner = new int[SLOTS];
  private final double[][] east = new double[SLOTS][];
  private final double[][] north = new double[SLOTS][];
  private final byte[][] reasons = new byte[SLOTS][];
  private final boolean[][] threeBeam = new boolean[SLOTS][];
  private final double[] middleEast = new double[SLOTS];
  private final double[] middleNorth = new double[SLOTS];
  private final int[] used = new int[SLOTS];

  /**
   * Opens the window.
   *
   * @param middles whether the middles of ensembles are wanted
   */
  RowWindow(CellFacts facts, CellJudge judge, boolean middles) {
    this.middles = middles;
    this.errors = facts.errors();
    this.facts = facts;
    this.judge = judge;
    int cells = facts.cells();
    row = new VelocityRow(cells);
    scratch = new double[cells];
    usedCells = new int[cells];
    for (int s = 0; s < SLOTS; s++) {
      owner[s] = -1;
      east[s] = new double[cells];
      north[s] = new double[cells];
      reasons[s] = new byte[cells];
      threeBeam[s] = new boolean[cells];
    }
  }

  /** Whether the middles of ensembles are measured. */
  boolean hasMiddles() {
    return middles;
  }

  /** Loads an ensemble and its neighbours, those that are not there already. */
  void centreOn(int ensemble) {
    int last = Math.min(facts.size() - 1, ensemble + REACH);
    for (int i = Math.max(0, ensemble - REACH); i <= last; i++) {
      if (owner[i % SLOTS] != i) {
        load(i);
      }
    }
  }

  private void load(int ensemble) {
    int slot = ensemble % SLOTS;
    owner[slot] = ensemble;
    judge.judge(ensemble, row, reasons[slot]);
    boolean boatKnown = facts.boatKnown();
    double boatEast = boatKnown ? facts.boatEastMps()[ensemble] : 0;
    double boatNorth = boatKnown ? facts.boatNorthMps()[ensemble] : 0;
    byte[] why = reasons[slot];
    double[] rowEast = row.east;
    double[] rowNorth = row.north;
    double[] slotEast = east[slot];
    double[] slotNorth = north[slot];
    int count = 0;
    for (int k = 0; k < why.length; k++) {
      if (why[k] == 0) {
        slotEast[k] = rowEast[k] + boatEast;
        slotNorth[k] = rowNorth[k] + boatNorth;
        usedCells[count++] = k;
      } else {
        slotEast[k] = Double.NaN;
        slotNorth[k] = Double.NaN;
      }
    }
    if (errors) {
      noteThreeBeam(why, threeBeam[slot]);
    }
    used[slot] = count;
    if (middles) {
      middleEast[slot] = median(east[slot], count);
      middleNorth[slot] = median(north[slot], count);
    }
  }

  private void noteThreeBeam(byte[] why, boolean[] withoutError) {
    for (int k = 0; k < why.length; k++) {
      withoutError[k] = why[k] == 0 && Double.isNaN(row.error[k]);
    }
  }

  private double median(double[] values, int count) {
    int stride = Math.max(1, (count + ENOUGH_FOR_MIDDLE - 1) / ENOUGH_FOR_MIDDLE);
    int size = 0;
    for (int j = 0; j < count; j += stride) {
      scratch[size++] = values[usedCells[j]];
    }
    return Median.of(scratch, size);
  }

  /** Eastward velocities (m/s) of a loaded ensemble, NaN where a cell is not used. */
  double[] east(int ensemble) {
    return east[ensemble % SLOTS];
  }

  /** Northward velocities (m/s) of a loaded ensemble, NaN where a cell is not used. */
  double[] north(int ensemble) {
    return north[ensemble % SLOTS];
  }

  /** Reasons of a loaded ensemble. */
  byte[] reasons(int ensemble) {
    return reasons[ensemble % SLOTS];
  }

  /** Which used cells of a loaded ensemble have no error velocity, where the record has any. */
  boolean[] withoutError(int ensemble) {
    return threeBeam[ensemble % SLOTS];
  }

  /** Number of used cells of a loaded ensemble. */
  int used(int ensemble) {
    return used[ensemble % SLOTS];
  }

  /** Eastward component of a loaded ensemble's middle (m/s), NaN when it has no used cell. */
  double middleEast(int ensemble) {
    return middleEast[ensemble % SLOTS];
  }

  /** Northward component of a loaded ensemble's middle (m/s), NaN when it has no used cell. */
  double middleNorth(int ensemble) {
    return middleNorth[ensemble % SLOTS];
  }
}
