package org.crossreach.screen;

import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_1_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_2_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_3_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_4_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_VERTICAL_M;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.Map;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Limit;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Beam depths are averaged as their formulas say, and the other beams stand in for lost ones.
 *
 * <p>Validation: arithmetic and harmonic (inverse-distance, p = 1) means, printed to six decimals.
 */
class BeamDepthsTest {

  @ParameterizedTest
  @CsvSource({
    "4,5,6,5,5.000000,4.897959",
    "4.0,4.2,,4.4,4.200000,4.193646",
    // plane bed, D = 5, slope 0.1 and 0.3 along beams 1 and 2, 20 degree beams
    "5.188859,4.824406,5,5,5.003316,5.000000",
    "5.612876,4.507790,5,5,5.030166,5.000000",
    // flat bed, D = 5, pitch 5, roll -3
    "5.123721,4.931912,5.191529,4.870676,5.029460,5.025987"
  })
  void averagesTheSlantBeams(
      Double beam1, Double beam2, Double beam3, Double beam4, double mean, double harmonic) {
    Ensembles one = record(beam1, beam2, beam3, beam4, null);
    assertEquals(mean, depth(one, DepthSource.SLANT_MEAN), 0.6e-6);
    assertEquals(harmonic, depth(one, DepthSource.SLANT_INVERSE_DISTANCE), 0.6e-6);
  }

  @Test
  void verticalBeamStandsInForLostSlantBeamsAndTheOtherWayRound() {
    Ensembles noSlant = record(null, null, null, null, 3.0);
    Ensembles noVertical = record(4.0, null, 6.0, null, null);
    assertEquals(3.0, depth(noSlant, DepthSource.SLANT_MEAN));
    assertEquals(5.0, depth(noVertical, DepthSource.VERTICAL));
    assertEquals(Double.NaN, depth(record(null, null, null, null, null), DepthSource.VERTICAL));
  }

  @Test
  void shallowestBeamCountsForSideLobes() {
    assertEquals(3.9, beams(record(4.0, 5.0, 3.9, null, 4.2)).shallowest()[0]);
    assertEquals(3.5, beams(record(4.0, 5.0, 3.9, null, 3.5)).shallowest()[0]);
    assertEquals(4.0, beams(record(null, 5.0, null, 4.0, null)).shallowest()[0]);
  }

  private static BeamDepths beams(Ensembles ensembles) {
    return new BeamDepths(ensembles, SoundRatio.NONE, Limit.OFF, new ArrayList<>());
  }

  private static double depth(Ensembles ensembles, DepthSource source) {
    double chosen = beams(ensembles).by(source, 0);
    return Double.isNaN(chosen) ? beams(ensembles).instead(source, 0) : chosen;
  }

  private static Ensembles record(
      Double beam1, Double beam2, Double beam3, Double beam4, Double vertical) {
    Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
    put(columns, DEPTH_BEAM_1_M, beam1);
    put(columns, DEPTH_BEAM_2_M, beam2);
    put(columns, DEPTH_BEAM_3_M, beam3);
    put(columns, DEPTH_BEAM_4_M, beam4);
    put(columns, DEPTH_VERTICAL_M, vertical);
    CellGrid.Builder grid = new CellGrid.Builder(1);
    grid.addRow(new double[] {1});
    CellGrid one = grid.build();
    return new Ensembles(
        Frame.EARTH,
        OffsetDateTime.parse("2026-04-18T10:00:00Z"),
        new long[] {1},
        new double[] {0},
        new int[] {1},
        columns,
        Map.of(CellQuantity.WATER_1, one, CellQuantity.WATER_2, one));
  }

  private static void put(
      Map<EnsembleQuantity, double[]> columns, EnsembleQuantity quantity, Double value) {
    columns.put(quantity, new double[] {value == null ? Double.NaN : value});
  }
}
