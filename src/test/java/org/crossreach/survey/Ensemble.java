package org.crossreach.survey;

import java.time.OffsetDateTime;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * One ensemble of a hand-made record in the earth frame; every slant beam sees the same depth.
 *
 * @param elapsedS time after the first ensemble (s)
 * @param boatEast boat over bed (m/s)
 * @param boatNorth boat over bed (m/s)
 * @param depthBelowFaceM depth below the transducer face (m)
 * @param firstCellM face to centre of the first cell (m)
 * @param cellSizeM height of a cell (m)
 * @param waterEast water OVER GROUND, by cell (m/s)
 * @param waterNorth water OVER GROUND, by cell (m/s)
 */
public record Ensemble(
    double elapsedS,
    double boatEast,
    double boatNorth,
    double depthBelowFaceM,
    double firstCellM,
    double cellSizeM,
    double[] waterEast,
    double[] waterNorth) {

  /** The same ensemble with the same water velocity in every cell. */
  public static Ensemble uniform(
      double elapsedS,
      double boatEast,
      double boatNorth,
      double depthBelowFaceM,
      double waterEast,
      double waterNorth) {
    double[] east = new double[40];
    double[] north = new double[40];
    Arrays.fill(east, waterEast);
    Arrays.fill(north, waterNorth);
    return new Ensemble(
        elapsedS, boatEast, boatNorth, depthBelowFaceM, /* firstCellM= */ 0.375, 0.25, east, north);
  }

  /** The record of some ensembles. */
  public static Ensembles record(List<Ensemble> all) {
    int n = all.size();
    int cells = all.get(0).waterEast.length;
    long[] number = new long[n];
    double[] elapsed = new double[n];
    int[] count = new int[n];
    Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
    for (EnsembleQuantity quantity :
        List.of(
            EnsembleQuantity.BOTTOM_1,
            EnsembleQuantity.BOTTOM_2,
            EnsembleQuantity.DEPTH_BEAM_1_M,
            EnsembleQuantity.DEPTH_BEAM_2_M,
            EnsembleQuantity.DEPTH_BEAM_3_M,
            EnsembleQuantity.DEPTH_BEAM_4_M,
            EnsembleQuantity.FIRST_CELL_M,
            EnsembleQuantity.CELL_SIZE_M)) {
      columns.put(quantity, new double[n]);
    }
    CellGrid.Builder east = new CellGrid.Builder(cells);
    CellGrid.Builder north = new CellGrid.Builder(cells);
    for (int i = 0; i < n; i++) {
      Ensemble each = all.get(i);
      number[i] = i + 1;
      elapsed[i] = each.elapsedS;
      count[i] = cells;
      columns.get(EnsembleQuantity.BOTTOM_1)[i] = each.boatEast;
      columns.get(EnsembleQuantity.BOTTOM_2)[i] = each.boatNorth;
      for (int beam = 0; beam < 4; beam++) {
        columns.get(EnsembleQuantity.valueOf("DEPTH_BEAM_" + (beam + 1) + "_M"))[i] =
            each.depthBelowFaceM;
      }
      columns.get(EnsembleQuantity.FIRST_CELL_M)[i] = each.firstCellM;
      columns.get(EnsembleQuantity.CELL_SIZE_M)[i] = each.cellSizeM;
      double[] relativeEast = new double[cells];
      double[] relativeNorth = new double[cells];
      for (int k = 0; k < cells; k++) {
        relativeEast[k] = each.waterEast[k] - zeroIfMissing(each.boatEast);
        relativeNorth[k] = each.waterNorth[k] - zeroIfMissing(each.boatNorth);
      }
      east.addRow(relativeEast);
      north.addRow(relativeNorth);
    }
    return new Ensembles(
        Frame.EARTH,
        OffsetDateTime.parse("2026-04-18T10:00:00Z"),
        number,
        elapsed,
        count,
        columns,
        Map.of(CellQuantity.WATER_1, east.build(), CellQuantity.WATER_2, north.build()));
  }

  private static double zeroIfMissing(double value) {
    return Double.isNaN(value) ? 0 : value;
  }
}
