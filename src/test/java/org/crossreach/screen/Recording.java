package org.crossreach.screen;

import java.time.OffsetDateTime;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Water;

/**
 * A hand-made record of a boat that goes east at 1 m/s over a flat bed 4.5 m below the transducer
 * face, in water that flows north at 1 m/s, one ensemble a second with cells of 0.25 m, 15 of which
 * lie above the side lobes (20 degree beams); everything can be changed before it is screened.
 */
final class Recording {

  static final double DRAFT_M = 0.25;
  static final int CELLS_ABOVE_SIDE_LOBES = 15;

  final int size;
  final int cells;
  final Frame frame;
  final Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
  final Map<CellQuantity, double[][]> grids = new EnumMap<>(CellQuantity.class);
  Instrument instrument =
      new Instrument("", 1200, 20, List.of(45.0, 135.0, 225.0, 315.0), DRAFT_M, Double.NaN, 0, 0);
  int[] cellsOf;
  Water water = new Water(Double.NaN, 0);

  /** A value by ensemble and cell. */
  interface ByCell {
    double at(int ensemble, int cell);
  }

  /** A value by ensemble. */
  interface ByEnsemble {
    double at(int ensemble);
  }

  Recording(Frame frame, int size, int cells) {
    this.frame = frame;
    this.size = size;
    this.cells = cells;
    cellsOf = new int[size];
    Arrays.fill(cellsOf, cells);
    put(EnsembleQuantity.BOTTOM_1, i -> 1);
    put(EnsembleQuantity.BOTTOM_2, i -> 0);
    put(EnsembleQuantity.HEADING_DEG, i -> 0);
    put(EnsembleQuantity.FIRST_CELL_M, i -> 0.375);
    put(EnsembleQuantity.CELL_SIZE_M, i -> 0.25);
    for (int beam = 1; beam <= 4; beam++) {
      put(EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"), i -> 4.5);
    }
    put(CellQuantity.WATER_1, (i, k) -> -1);
    put(CellQuantity.WATER_2, (i, k) -> 1);
  }

  /** The record in the earth frame, with vertical and error velocity, all 0. */
  static Recording earth(int size) {
    return new Recording(Frame.EARTH, size, 16).withErrors();
  }

  /** The record in the earth frame with noise of the same size on every component. */
  static Recording noisy(int size, double sigmaMps, long seed) {
    Recording recording = earth(size);
    Random random = new Random(seed);
    for (CellQuantity quantity :
        List.of(
            CellQuantity.WATER_1,
            CellQuantity.WATER_2,
            CellQuantity.WATER_3,
            CellQuantity.WATER_4)) {
      recording.add(quantity, (i, k) -> sigmaMps * random.nextGaussian());
    }
    for (EnsembleQuantity quantity :
        List.of(
            EnsembleQuantity.BOTTOM_1,
            EnsembleQuantity.BOTTOM_2,
            EnsembleQuantity.BOTTOM_3,
            EnsembleQuantity.BOTTOM_4)) {
      recording.add(quantity, i -> sigmaMps * random.nextGaussian());
    }
    return recording;
  }

  Recording withErrors() {
    put(CellQuantity.WATER_3, (i, k) -> 0);
    put(CellQuantity.WATER_4, (i, k) -> 0);
    put(EnsembleQuantity.BOTTOM_3, i -> 0);
    put(EnsembleQuantity.BOTTOM_4, i -> 0);
    return this;
  }

  Recording put(EnsembleQuantity quantity, ByEnsemble value) {
    double[] column = new double[size];
    for (int i = 0; i < size; i++) {
      column[i] = value.at(i);
    }
    columns.put(quantity, column);
    return this;
  }

  Recording add(EnsembleQuantity quantity, ByEnsemble value) {
    double[] column = columns.get(quantity).clone();
    return put(quantity, i -> column[i] + value.at(i));
  }

  Recording put(CellQuantity quantity, ByCell value) {
    double[][] grid = new double[size][cells];
    for (int i = 0; i < size; i++) {
      for (int k = 0; k < cells; k++) {
        grid[i][k] = value.at(i, k);
      }
    }
    grids.put(quantity, grid);
    return this;
  }

  Recording add(CellQuantity quantity, ByCell value) {
    double[][] grid = grids.get(quantity);
    return put(quantity, (i, k) -> grid[i][k] + value.at(i, k));
  }

  Ensembles ensembles() {
    long[] number = new long[size];
    double[] elapsed = new double[size];
    for (int i = 0; i < size; i++) {
      number[i] = 101 + i;
      elapsed[i] = i;
    }
    Map<CellQuantity, CellGrid> built = new EnumMap<>(CellQuantity.class);
    grids.forEach(
        (quantity, grid) -> {
          CellGrid.Builder builder = new CellGrid.Builder(cells);
          for (double[] row : grid) {
            builder.addRow(row);
          }
          built.put(quantity, builder.build());
        });
    return new Ensembles(
        frame,
        OffsetDateTime.parse("2026-04-18T10:00:00Z"),
        number,
        elapsed,
        cellsOf,
        columns,
        built);
  }

  ScreenedPass screen(Settings settings) {
    return new Screen(instrument, water, settings).apply("pass-01", ensembles());
  }

  ScreenedPass screen(Screening screening) {
    return screen(Settings.defaults().withScreening(screening));
  }

  ScreenedPass screen() {
    return screen(Screening.defaults());
  }

  /** Choices of screening with one screen changed. */
  static Screening with(Screening base, Criterion criterion, Limit limit) {
    return new Screening(
        criterion == Criterion.ERROR_VELOCITY ? limit : base.errorVelocity(),
        criterion == Criterion.VERTICAL_VELOCITY ? limit : base.verticalVelocity(),
        criterion == Criterion.CORRELATION ? limit : base.correlation(),
        criterion == Criterion.INTENSITY ? limit : base.intensity(),
        criterion == Criterion.GOOD_PCT ? limit : base.goodPct(),
        base.threeBeam(),
        criterion == Criterion.SPIKES ? limit : base.spikes(),
        criterion == Criterion.BOTTOM_ERROR_VELOCITY ? limit : base.bottomErrorVelocity(),
        criterion == Criterion.BOTTOM_VERTICAL_VELOCITY ? limit : base.bottomVerticalVelocity(),
        criterion == Criterion.BOAT_SPEED ? limit : base.boatSpeed(),
        criterion == Criterion.DEPTH_BEAMS ? limit : base.depthBeams(),
        base.minimumCells(),
        base.leaveOutTopM(),
        base.exclusions());
  }
}
