package org.crossreach.screen;

import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Finds a beam that does not measure velocity at all.
 *
 * <p>A beam is unsound when its radial velocity jumps from cell to cell, or from ensemble to
 * ensemble, more than three times as much as the median of the others, and when these jumps are
 * there in the error velocity, too. The second condition is what tells noise from the river and the
 * boat: whatever really moves the water past the beams leaves the error velocity at rest. A beam
 * that is steadily off cannot be told from its opposite one; it shows as an offset of the error
 * velocity.
 */
final class BeamHealth {

  static final int NONE = -1;

  /** How much more than the others an unsound beam jumps. */
  private static final double TIMES_OTHERS = 3;

  /** Part of a beam's jumps that has to be found in the error velocity, where all is expected. */
  private static final double SHARE_IN_ERROR = 0.5;

  /** Jumps of less (m/s) do no harm. */
  private static final double HARMLESS_MPS = 0.05;

  private static final CellQuantity[] WATER = {
    CellQuantity.WATER_1, CellQuantity.WATER_2, CellQuantity.WATER_3, CellQuantity.WATER_4
  };
  private static final EnsembleQuantity[] BOTTOM = {
    EnsembleQuantity.BOTTOM_1,
    EnsembleQuantity.BOTTOM_2,
    EnsembleQuantity.BOTTOM_3,
    EnsembleQuantity.BOTTOM_4
  };

  private BeamHealth() {}

  /**
   * Index of the unsound beam of a record's water velocities in the beam frame, {@link #NONE} when
   * there is none.
   *
   * @param lowestM depth below the face above which a cell must end (m), by ensemble
   */
  static int ofWater(Ensembles ensembles, BeamLayout layout, double[] lowestM) {
    CellGrid[] beams = new CellGrid[BeamLayout.BEAMS];
    for (int b = 0; b < beams.length; b++) {
      if (ensembles.find(WATER[b]).isEmpty()) {
        return NONE;
      }
      beams[b] = ensembles.grid(WATER[b]);
    }
    Jumps inDepth = new Jumps(layout);
    Jumps inTime = new Jumps(layout);
    double[] here = new double[beams.length];
    double[] below = new double[beams.length];
    double[] after = new double[beams.length];
    int stride = Sample.stride(ensembles.size(), ensembles.maxCells());
    for (int i = 0; i + 1 < ensembles.size(); i += stride) {
      int cells = cellsAbove(ensembles, lowestM, i);
      int cellsAfter = cellsAbove(ensembles, lowestM, i + 1);
      for (int k = 0; k < cells; k++) {
        for (int b = 0; b < beams.length; b++) {
          here[b] = beams[b].get(i, k);
          below[b] = k + 1 < cells ? beams[b].get(i, k + 1) : Double.NaN;
          after[b] = k < cellsAfter ? beams[b].get(i + 1, k) : Double.NaN;
        }
        inDepth.add(here, below);
        inTime.add(here, after);
      }
    }
    int unsound = inDepth.unsound();
    return unsound == NONE ? inTime.unsound() : unsound;
  }

  private static int cellsAbove(Ensembles ensembles, double[] lowestM, int i) {
    double size = ensembles.value(EnsembleQuantity.CELL_SIZE_M, i);
    double top = ensembles.value(EnsembleQuantity.FIRST_CELL_M, i) - 0.5 * size;
    double cells = Math.floor((lowestM[i] - top) / size);
    return cells > 0 ? (int) Math.min(ensembles.cells(i), cells) : 0;
  }

  /**
   * Index of the unsound beam of a record's bottom tracking in the beam frame, {@link #NONE} when
   * there is none.
   */
  static int ofBottom(Ensembles ensembles, BeamLayout layout) {
    Jumps inTime = new Jumps(layout);
    double[] here = new double[BeamLayout.BEAMS];
    double[] after = new double[BeamLayout.BEAMS];
    for (int i = 0; i + 1 < ensembles.size(); i++) {
      for (int b = 0; b < here.length; b++) {
        here[b] = ensembles.value(BOTTOM[b], i);
        after[b] = ensembles.value(BOTTOM[b], i + 1);
      }
      inTime.add(here, after);
    }
    return inTime.unsound();
  }

  /** Differences between neighbouring samples, beam by beam and in the error velocity. */
  private static final class Jumps {
    private static final int FEWEST = 30;

    private final BeamLayout layout;
    private final Sample[] beams = new Sample[BeamLayout.BEAMS];
    private final Sample error = new Sample();

    Jumps(BeamLayout layout) {
      this.layout = layout;
      for (int b = 0; b < beams.length; b++) {
        beams[b] = new Sample();
      }
    }

    void add(double[] one, double[] other) {
      double inError = 0;
      for (int b = 0; b < beams.length; b++) {
        double jump = other[b] - one[b];
        beams[b].add(jump);
        inError += layout.errorPerBeam(b) * jump;
      }
      error.add(inError);
    }

    int unsound() {
      if (error.size() < FEWEST) {
        return NONE;
      }
      double inError = error.scale().sigma();
      double[] sigma = new double[beams.length];
      int worst = 0;
      for (int b = 0; b < beams.length; b++) {
        sigma[b] = beams[b].scale().sigma();
        worst = sigma[b] > sigma[worst] ? b : worst;
      }
      double own = sigma[worst];
      sigma[worst] = sigma[beams.length - 1];
      boolean apart = own > HARMLESS_MPS && own > TIMES_OTHERS * Median.of(sigma, beams.length - 1);
      boolean inErrorToo = inError > SHARE_IN_ERROR * Math.abs(layout.errorPerBeam(worst)) * own;
      return apart && inErrorToo ? worst : NONE;
    }
  }
}
