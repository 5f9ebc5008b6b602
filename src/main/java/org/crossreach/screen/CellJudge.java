package org.crossreach.screen;

import java.util.Arrays;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;

/**
 * Judges the cells of an ensemble, each by itself.
 *
 * <p>A cell without a value of a quantity is not judged by that quantity. Immutable; safe to share
 * between threads.
 */
final class CellJudge {

  private final CellFacts facts;
  private final CellLimits limits;
  private final boolean rejectThreeBeam;
  private final CellGrid goodPct;
  private final CellGrid correlation;
  private final CellGrid intensity;

  CellJudge(CellFacts facts, CellLimits limits) {
    this.facts = facts;
    this.limits = limits;
    this.rejectThreeBeam = !facts.screening().threeBeam() && facts.errors();
    this.goodPct = gridIf(limits.goodPct(), CellQuantity.GOOD_PCT);
    this.correlation = gridIf(limits.correlation(), CellQuantity.CORRELATION);
    this.intensity = gridIf(limits.intensity(), CellQuantity.INTENSITY_DB);
  }

  private CellGrid gridIf(double limit, CellQuantity quantity) {
    return Double.isNaN(limit) ? null : facts.ensembles().find(quantity).orElse(null);
  }

  /**
   * Reads and judges one ensemble.
   *
   * @param row receives the velocities relative to the boat
   * @param reasons receives one {@linkplain Reason#code() code} for each cell
   */
  void judge(int ensemble, VelocityRow row, byte[] reasons) {
    facts.water().read(ensemble, row, true);
    int own = facts.ensembles().cells(ensemble);
    Arrays.fill(reasons, own, reasons.length, Reason.NO_CELL.code());
    if (facts.excluded()[ensemble]) {
      Arrays.fill(reasons, 0, own, Reason.EXCLUDED.code());
      return;
    }
    double size = facts.cellSizeM()[ensemble];
    // All depths are measured from the transducer face: the draft cancels.
    double top = facts.firstCellM()[ensemble] - 0.5 * size;
    double lowest = facts.lowestM()[ensemble];
    double highest = facts.screening().leaveOutTopM() - facts.draftM();
    int above = 0;
    while (above < own && top + (above + 1) * size <= lowest) {
      above++;
    }
    Arrays.fill(reasons, above, own, Reason.SIDE_LOBE.code());
    int below = 0;
    while (below < above && top + below * size < highest) {
      below++;
    }
    Arrays.fill(reasons, 0, below, Reason.NEAR_SURFACE.code());
    markMissing(row, below, above, reasons);
    if (rejectThreeBeam) {
      markWithoutError(row.error, below, above, reasons);
    }
    markBelow(goodPct, limits.goodPct(), Reason.GOOD_PCT, ensemble, row, reasons);
    markBelow(correlation, limits.correlation(), Reason.CORRELATION, ensemble, row, reasons);
    markBelow(intensity, limits.intensity(), Reason.INTENSITY, ensemble, row, reasons);
    markBeyond(row.error, 0, limits.errorCentre(), limits.error(), Reason.ERROR_VELOCITY, reasons);
    double boatUp = limits.verticalOverBed() ? facts.boatUpMps()[ensemble] : 0;
    markBeyond(
        row.up,
        boatUp,
        limits.verticalCentre(),
        limits.vertical(),
        Reason.VERTICAL_VELOCITY,
        reasons);
  }

  private static void markMissing(VelocityRow row, int from, int to, byte[] reasons) {
    double[] east = row.east;
    double[] north = row.north;
    byte missing = Reason.MISSING.code();
    for (int k = from; k < to; k++) {
      reasons[k] = Double.isNaN(east[k]) || Double.isNaN(north[k]) ? missing : 0;
    }
  }

  private static void markWithoutError(double[] error, int from, int to, byte[] reasons) {
    for (int k = from; k < to; k++) {
      if (reasons[k] == 0 && Double.isNaN(error[k])) {
        reasons[k] = Reason.THREE_BEAM.code();
      }
    }
  }

  /** Marks the cells that are good so far and have less of a quantity than they should. */
  private static void markBelow(
      CellGrid grid, double lowest, Reason reason, int ensemble, VelocityRow row, byte[] reasons) {
    if (grid == null) {
      return;
    }
    double[] values = row.other;
    grid.copyRow(ensemble, values);
    for (int k = 0; k < reasons.length; k++) {
      if (values[k] < lowest && reasons[k] == 0) {
        reasons[k] = reason.code();
      }
    }
  }

  /** Marks the cells that are good so far and whose velocity departs too far from a centre. */
  private static void markBeyond(
      double[] values, double shift, double centre, double limit, Reason reason, byte[] reasons) {
    if (Double.isNaN(limit)) {
      return;
    }
    for (int k = 0; k < reasons.length; k++) {
      if (Math.abs(values[k] + shift - centre) > limit && reasons[k] == 0) {
        reasons[k] = reason.code();
      }
    }
  }
}
