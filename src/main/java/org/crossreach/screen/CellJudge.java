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
    double size = facts.cellSizeM(ensemble);
    // All depths are measured from the transducer face: the draft cancels.
    double top = facts.firstCellM(ensemble) - 0.5 * size;
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
    double boatUp = limits.verticalOverBed() ? facts.boatUpMps()[ensemble] : 0;
    for (int k = below; k < above; k++) {
      reasons[k] = bySamples(ensemble, row, k, boatUp).code();
    }
  }

  private Reason bySamples(int ensemble, VelocityRow row, int k, double boatUp) {
    if (Double.isNaN(row.east[k]) || Double.isNaN(row.north[k])) {
      return Reason.MISSING;
    }
    if (rejectThreeBeam && Double.isNaN(row.error[k])) {
      return Reason.THREE_BEAM;
    }
    if (goodPct != null && goodPct.get(ensemble, k) < limits.goodPct()) {
      return Reason.GOOD_PCT;
    }
    if (correlation != null && correlation.get(ensemble, k) < limits.correlation()) {
      return Reason.CORRELATION;
    }
    if (intensity != null && intensity.get(ensemble, k) < limits.intensity()) {
      return Reason.INTENSITY;
    }
    if (Math.abs(row.error[k] - limits.errorCentre()) > limits.error()) {
      return Reason.ERROR_VELOCITY;
    }
    if (Math.abs(row.up[k] + boatUp - limits.verticalCentre()) > limits.vertical()) {
      return Reason.VERTICAL_VELOCITY;
    }
    return Reason.NONE;
  }
}
