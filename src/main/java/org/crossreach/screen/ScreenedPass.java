package org.crossreach.screen;

import java.util.List;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Note;

/**
 * The samples of one pass on true east and north, each with the reason why it is not used, if any.
 *
 * <p>Immutable; safe to share between threads.
 */
public final class ScreenedPass {

  private final Ensembles ensembles;
  private final double draftM;
  private final NorthTurn turn;
  private final double[] depthBelowFaceM;
  private final double[] boatEastMps;
  private final double[] boatNorthMps;
  private final byte[] reasons;
  private final List<Note> notes;
  private final CellGrid first;
  private final CellGrid second;

  ScreenedPass(
      Ensembles ensembles,
      double draftM,
      NorthTurn turn,
      double[] depthBelowFaceM,
      double[] boatEastMps,
      double[] boatNorthMps,
      byte[] reasons,
      List<Note> notes) {
    this.ensembles = ensembles;
    this.draftM = draftM;
    this.turn = turn;
    this.depthBelowFaceM = depthBelowFaceM;
    this.boatEastMps = boatEastMps;
    this.boatNorthMps = boatNorthMps;
    this.reasons = reasons;
    this.notes = List.copyOf(notes);
    this.first = ensembles.grid(CellQuantity.WATER_1);
    this.second = ensembles.grid(CellQuantity.WATER_2);
  }

  /** What was recorded. */
  public Ensembles ensembles() {
    return ensembles;
  }

  /** Number of ensembles. */
  public int size() {
    return ensembles.size();
  }

  /** Largest number of cells of an ensemble. */
  public int maxCells() {
    return ensembles.maxCells();
  }

  /** Depth of the transducer face below the water surface (m). */
  public double draftM() {
    return draftM;
  }

  /** Depth of the bed below the transducer face (m), NaN when no beam has a usable one. */
  public double depthBelowFaceM(int ensemble) {
    return depthBelowFaceM[ensemble];
  }

  /** Eastward velocity of the boat over the bed (m/s, true north), NaN when not usable. */
  public double boatEastMps(int ensemble) {
    return boatEastMps[ensemble];
  }

  /** Northward velocity of the boat over the bed (m/s, true north), NaN when not usable. */
  public double boatNorthMps(int ensemble) {
    return boatNorthMps[ensemble];
  }

  /** Depth of the upper edge of cell 0 below the water surface (m). */
  public double topOfCellsM(int ensemble) {
    return draftM
        + ensembles.value(EnsembleQuantity.FIRST_CELL_M, ensemble)
        - 0.5 * cellSizeM(ensemble);
  }

  /** Height of a cell (m). */
  public double cellSizeM(int ensemble) {
    return ensembles.value(EnsembleQuantity.CELL_SIZE_M, ensemble);
  }

  /** Whether a cell may be used. */
  public boolean usable(int ensemble, int cell) {
    return reasons[ensemble * maxCells() + cell] == 0;
  }

  /** Why a cell is not used, {@link Reason#NONE} when it is. */
  public Reason reason(int ensemble, int cell) {
    return Reason.of(reasons[ensemble * maxCells() + cell]);
  }

  /**
   * Reads the water velocities of an ensemble, usable or not.
   *
   * @param ensemble from 0
   * @param row receives them
   */
  public void read(int ensemble, VelocityRow row) {
    first.copyRow(ensemble, row.east);
    second.copyRow(ensemble, row.north);
    for (int k = 0; k < row.east.length; k++) {
      double east = row.east[k];
      double north = row.north[k];
      row.east[k] = turn.east(east, north);
      row.north[k] = turn.north(east, north);
    }
  }

  /** Number of ensembles with at least one usable cell. */
  public int usableEnsembles() {
    int count = 0;
    for (int i = 0; i < size(); i++) {
      boolean any = false;
      for (int k = 0; k < maxCells() && !any; k++) {
        any = usable(i, k);
      }
      count += any ? 1 : 0;
    }
    return count;
  }

  /** Usable cells as a share of the recorded cells above the side-lobe limit (%), 0 when none. */
  public double usableCellsPct() {
    long usable = 0;
    long within = 0;
    for (byte reason : reasons) {
      usable += reason == 0 ? 1 : 0;
      within += reason == Reason.NO_CELL.ordinal() || reason == Reason.SIDE_LOBE.ordinal() ? 0 : 1;
    }
    return within == 0 ? 0 : 100.0 * usable / within;
  }

  /** What is to be said about the samples. */
  public List<Note> notes() {
    return notes;
  }
}
