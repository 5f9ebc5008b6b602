package org.crossreach.screen;

import java.util.List;
import org.crossreach.settings.Settings;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Gaps;
import org.crossreach.survey.Instrument;

/** Screens the samples of one pass. */
public final class Screen {

  private Screen() {}

  /**
   * Turns the velocities onto true east and north and judges every sample.
   *
   * @param ensembles what was recorded
   * @param instrument the profiler and its mounting
   * @param settings which screens are on, and which beams give the depth
   */
  public static ScreenedPass apply(Ensembles ensembles, Instrument instrument, Settings settings) {
    double[] shallowest = Gaps.fillLinear(BeamDepths.shallowest(ensembles), elapsed(ensembles));
    double[] boatEast = new double[ensembles.size()];
    double[] boatNorth = new double[ensembles.size()];
    NorthTurn turn = new NorthTurn(instrument.northTurnDeg());
    for (int i = 0; i < boatEast.length; i++) {
      double east = ensembles.value(EnsembleQuantity.BOTTOM_1, i);
      double north = ensembles.value(EnsembleQuantity.BOTTOM_2, i);
      boatEast[i] = turn.east(east, north);
      boatNorth[i] = turn.north(east, north);
    }
    return new ScreenedPass(
        ensembles,
        instrument.draftM(),
        turn,
        BeamDepths.chosen(ensembles, settings.depth()),
        boatEast,
        boatNorth,
        reasons(ensembles, shallowest, Math.cos(Math.toRadians(instrument.beamAngleDeg()))),
        List.of());
  }

  private static double[] elapsed(Ensembles ensembles) {
    double[] elapsed = new double[ensembles.size()];
    for (int i = 0; i < elapsed.length; i++) {
      elapsed[i] = ensembles.elapsedS(i);
    }
    return elapsed;
  }

  private static byte[] reasons(Ensembles ensembles, double[] shallowest, double cosBeamAngle) {
    int cells = ensembles.maxCells();
    byte[] reasons = new byte[ensembles.size() * cells];
    CellGrid first = ensembles.grid(CellQuantity.WATER_1);
    CellGrid second = ensembles.grid(CellQuantity.WATER_2);
    for (int i = 0; i < ensembles.size(); i++) {
      double firstCell = ensembles.value(EnsembleQuantity.FIRST_CELL_M, i);
      double size = ensembles.value(EnsembleQuantity.CELL_SIZE_M, i);
      // Both sides are measured from the transducer face: the draft cancels.
      double limit = shallowest[i] * cosBeamAngle;
      for (int k = 0; k < cells; k++) {
        Reason reason = Reason.NONE;
        if (k >= ensembles.cells(i)) {
          reason = Reason.NO_CELL;
        } else if (!(firstCell + (k + 0.5) * size <= limit)) {
          reason = Reason.SIDE_LOBE;
        } else if (Double.isNaN(first.get(i, k)) || Double.isNaN(second.get(i, k))) {
          reason = Reason.MISSING;
        }
        reasons[i * cells + k] = (byte) reason.ordinal();
      }
    }
    return reasons;
  }
}
