package org.crossreach.screen;

import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Water velocities relative to the boat on true east, north and up, made from the recorded
 * components row by row as they are asked for.
 *
 * <p>Immutable; safe to share between threads.
 */
final class WaterVelocities {

  private final EarthTurn turn;
  private final CellGrid first;
  private final CellGrid second;
  private final CellGrid third;
  private final CellGrid fourth;

  WaterVelocities(Ensembles ensembles, EarthTurn turn) {
    this.turn = turn;
    first = ensembles.grid(CellQuantity.WATER_1);
    second = ensembles.grid(CellQuantity.WATER_2);
    third = ensembles.find(CellQuantity.WATER_3).orElse(null);
    fourth = ensembles.find(CellQuantity.WATER_4).orElse(null);
  }

  /**
   * Reads one ensemble (m/s).
   *
   * @param all whether up and error are wanted; NaN where not recorded
   */
  void read(int ensemble, VelocityRow row, boolean all) {
    first.copyRow(ensemble, row.east);
    second.copyRow(ensemble, row.north);
    // A level record without them leaves the row's own NaN.
    boolean more = turn.needsAll() || all && (third != null || fourth != null);
    if (more) {
      copy(third, ensemble, row.up);
      copy(fourth, ensemble, row.error);
    }
    turn.turn(ensemble, row, first.cells(), more);
  }

  private static void copy(CellGrid grid, int ensemble, double[] target) {
    if (grid == null) {
      EarthTurn.missing(target);
    } else {
      grid.copyRow(ensemble, target);
    }
  }
}
