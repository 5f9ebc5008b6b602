package org.crossreach.screen;

import java.util.List;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Note;

/**
 * The samples of one pass on true east and north, each with the reason why it is not used, if any.
 *
 * <p>Velocities, depths, first cell and cell size stand on the true speed of sound; recorded values
 * stay as they are in {@link #ensembles()}. Immutable; safe to share between threads.
 */
public final class ScreenedPass {

  private final CellFacts facts;
  private final double[] depthBelowFaceM;
  private final BottomTrack bottom;
  private final byte[] depthReasons;
  private final byte[] reasons;
  private final Accounting accounting;
  private final List<Note> notes;

  ScreenedPass(
      CellFacts facts,
      double[] depthBelowFaceM,
      BottomTrack bottom,
      byte[] depthReasons,
      byte[] reasons,
      Accounting accounting,
      List<Note> notes) {
    this.facts = facts;
    this.depthBelowFaceM = depthBelowFaceM;
    this.bottom = bottom;
    this.depthReasons = depthReasons;
    this.reasons = reasons;
    this.accounting = accounting;
    this.notes = List.copyOf(notes);
  }

  /** What was recorded. */
  public Ensembles ensembles() {
    return facts.ensembles();
  }

  /** Number of ensembles. */
  public int size() {
    return facts.size();
  }

  /** Largest number of cells of an ensemble. */
  public int maxCells() {
    return facts.cells();
  }

  /** Depth of the transducer face below the water surface (m). */
  public double draftM() {
    return facts.draftM();
  }

  /** Depth of the bed below the transducer face (m), NaN when no beam has a usable one. */
  public double depthBelowFaceM(int ensemble) {
    return depthBelowFaceM[ensemble];
  }

  /** Why an ensemble has no depth, {@link Reason#NONE} when it has one. */
  public Reason depthReason(int ensemble) {
    return Reason.of(depthReasons[ensemble]);
  }

  /** Eastward velocity of the boat over the bed (m/s, true north), NaN when not usable. */
  public double boatEastMps(int ensemble) {
    return bottom.eastMps[ensemble];
  }

  /** Northward velocity of the boat over the bed (m/s, true north), NaN when not usable. */
  public double boatNorthMps(int ensemble) {
    return bottom.northMps[ensemble];
  }

  /** Why an ensemble's bottom-track velocity is not used, {@link Reason#NONE} when it is. */
  public Reason bottomTrackReason(int ensemble) {
    return Reason.of(bottom.reasons[ensemble]);
  }

  /** True over used speed of sound in an ensemble (1.01 → the sound was 1 % faster). */
  public double soundRatio(int ensemble) {
    return facts.sound().at(ensemble);
  }

  /** Depth of the upper edge of cell 0 below the water surface (m). */
  public double topOfCellsM(int ensemble) {
    return draftM() + facts.firstCellM()[ensemble] - 0.5 * facts.cellSizeM()[ensemble];
  }

  /** Height of a cell (m). */
  public double cellSizeM(int ensemble) {
    return facts.cellSizeM()[ensemble];
  }

  /**
   * Depth below the water surface to which a cell may reach before side lobes return from the bed
   * (m), filled in where no beam has a depth.
   */
  public double sideLobeLimitM(int ensemble) {
    return draftM() + facts.lowestM()[ensemble];
  }

  /** Whether a cell may be used. */
  public boolean usable(int ensemble, int cell) {
    return reasons[ensemble * maxCells() + cell] == 0;
  }

  /** Why a cell is not used, {@link Reason#NONE} when it is. */
  public Reason reason(int ensemble, int cell) {
    return Reason.of(reasons[ensemble * maxCells() + cell]);
  }

  /** Number of cells of an ensemble that carry a reason. */
  public int cells(int ensemble, Reason reason) {
    int count = 0;
    for (int at = ensemble * maxCells(); at < (ensemble + 1) * maxCells(); at++) {
      count += reasons[at] == reason.code() ? 1 : 0;
    }
    return count;
  }

  /**
   * Reads the water velocities of an ensemble, and which of them are usable.
   *
   * @param ensemble from 0
   * @param row receives them
   */
  public void read(int ensemble, VelocityRow row) {
    facts.water().read(ensemble, row, false);
    System.arraycopy(reasons, ensemble * maxCells(), row.reasons, 0, maxCells());
  }

  /** Number of ensembles with at least one usable cell. */
  public int usableEnsembles() {
    int count = 0;
    for (int i = 0; i < size(); i++) {
      count += anyUsable(reasons, i, maxCells()) ? 1 : 0;
    }
    return count;
  }

  static boolean anyUsable(byte[] reasons, int ensemble, int cells) {
    for (int at = ensemble * cells; at < (ensemble + 1) * cells; at++) {
      if (reasons[at] == 0) {
        return true;
      }
    }
    return false;
  }

  /** Usable cells as a share of the recorded cells above the side-lobe limit (%), 0 when none. */
  public double usableCellsPct() {
    Tally cells = accounting.cells();
    long within = cells.recorded() - cells.of(Reason.SIDE_LOBE);
    return within == 0 ? 0 : 100.0 * cells.used() / within;
  }

  /** What became of the samples. */
  public Accounting accounting() {
    return accounting;
  }

  /** What is to be said about the samples. */
  public List<Note> notes() {
    return notes;
  }
}
