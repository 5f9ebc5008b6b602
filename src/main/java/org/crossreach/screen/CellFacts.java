package org.crossreach.screen;

import org.crossreach.settings.Screening;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;

/**
 * What the cells of a pass are judged by. Arrays have one value for each ensemble.
 *
 * @param ensembles what was recorded
 * @param water velocities relative to the boat
 * @param sound what distances along the beams are multiplied by
 * @param firstCellM depth of the first cell's centre below the face (m)
 * @param cellSizeM height of a cell (m)
 * @param draftM depth of the face below the surface (m)
 * @param lowestM depth below the face above which a cell must end (m)
 * @param boatEastMps eastward velocity of the boat (m/s), gaps filled; all NaN when unknown
 * @param boatNorthMps northward velocity of the boat (m/s), as the eastward one
 * @param boatUpMps vertical velocity of the boat (m/s), gaps filled; all NaN when unknown
 * @param excluded whether the ensemble was left out by hand
 * @param screening the choices
 */
record CellFacts(
    Ensembles ensembles,
    WaterVelocities water,
    SoundRatio sound,
    double[] firstCellM,
    double[] cellSizeM,
    double draftM,
    double[] lowestM,
    double[] boatEastMps,
    double[] boatNorthMps,
    double[] boatUpMps,
    boolean[] excluded,
    Screening screening) {

  int size() {
    return ensembles.size();
  }

  int cells() {
    return ensembles.maxCells();
  }

  /** Whether the boat's horizontal velocity is known. */
  boolean boatKnown() {
    return boatEastMps.length > 0 && !Double.isNaN(boatEastMps[0]);
  }

  /**
   * Whether the record has error velocities, so that a cell without one rests on three beams. A
   * column without any value is no column.
   */
  boolean errors() {
    if (ensembles.frame() == Frame.BEAM) {
      return true;
    }
    return ensembles.find(CellQuantity.WATER_4).map(CellFacts::anyPresent).orElse(false);
  }

  private static boolean anyPresent(CellGrid grid) {
    for (int i = 0; i < grid.rows(); i++) {
      for (int k = 0; k < grid.cells(); k++) {
        if (!Double.isNaN(grid.get(i, k))) {
          return true;
        }
      }
    }
    return false;
  }
}
