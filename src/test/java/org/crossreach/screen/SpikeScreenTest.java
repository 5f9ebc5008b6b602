package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.junit.jupiter.api.Test;

/** Spikes are told from the river: banks, changing cells, weed, and boats without bottom track. */
class SpikeScreenTest {

  private static final int SIZE = 60;

  /** Cells of the same depth are compared when their size changes on the way. */
  @Test
  void comparesCellsOfTheSameDepthWhenTheirSizeChanges() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.CELL_SIZE_M, i -> i < 30 ? 0.25 : 0.5);
    recording.put(EnsembleQuantity.FIRST_CELL_M, i -> i < 30 ? 0.375 : 0.5);
    recording.put(
        CellQuantity.WATER_2, (i, k) -> 2 - 0.4 * (i < 30 ? 0.375 + 0.25 * k : 0.5 + 0.5 * k));
    ScreenedPass pass = recording.screen();
    assertEquals(0, pass.accounting().cells().of(Reason.SPIKE));
    recording.add(CellQuantity.WATER_2, (i, k) -> (i == 29 || i == 31) && k == 3 ? 0.9 : 0);
    assertEquals(Reason.SPIKE, recording.screen().reason(29, 3));
    assertEquals(Reason.SPIKE, recording.screen().reason(31, 3));
    assertEquals(2, recording.screen().accounting().cells().of(Reason.SPIKE));
  }

  @Test
  void findsWeedInHalfOfAColumn() {
    Recording recording = Recording.noisy(SIZE, 0.05, 1);
    recording.put(EnsembleQuantity.BOTTOM_1, i -> 1).put(EnsembleQuantity.BOTTOM_2, i -> 0);
    recording.add(CellQuantity.WATER_2, (i, k) -> i == 30 && k < 8 ? -0.7 : 0);
    ScreenedPass pass = recording.screen();
    assertEquals(8, pass.cells(30, Reason.SPIKE));
  }

  @Test
  void findsSpikesInShallowWater() {
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"), i -> 0.8);
    }
    recording.add(CellQuantity.WATER_2, (i, k) -> i == 30 && k == 1 ? 0.6 : 0);
    ScreenedPass pass = recording.screen();
    // 0.8 cos 20 leaves the cells that end at 0.5 and 0.75 m.
    assertEquals(1, pass.accounting().cells().of(Reason.SPIKE));
    assertEquals(Reason.SPIKE, pass.reason(30, 1));
  }

  @Test
  void doesWithoutTheBoatsVelocity() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_1, i -> Double.NaN);
    // The boat starts and stops, and the water seems to do so.
    recording.put(CellQuantity.WATER_1, (i, k) -> i % 20 < 10 ? -1.5 : 0);
    recording.add(CellQuantity.WATER_2, (i, k) -> i == 30 && k == 5 ? 0.6 : 0);
    ScreenedPass pass = recording.screen();
    assertEquals(1, pass.accounting().cells().of(Reason.SPIKE));
    assertEquals(Reason.SPIKE, pass.reason(30, 5));
    Screening given = Recording.with(Screening.defaults(), Criterion.SPIKES, Limit.of(0.5));
    assertEquals(1, recording.screen(given).accounting().cells().of(Reason.SPIKE));
  }

  @Test
  void takesTheBoatsVelocityFromGnssWhereThereIsNoBottomTrack() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_1, i -> Double.NaN);
    recording.put(EnsembleQuantity.GNSS_EAST_MPS, i -> i % 20 < 10 ? 1.5 : 0);
    recording.put(EnsembleQuantity.GNSS_NORTH_MPS, i -> 0);
    recording.put(CellQuantity.WATER_1, (i, k) -> i % 20 < 10 ? -1.5 : 0);
    recording.add(CellQuantity.WATER_2, (i, k) -> i == 30 ? 0.6 : 0);
    assertEquals(15, recording.screen().accounting().cells().of(Reason.SPIKE));
  }

  /** A bank on which velocity rises by 0.2 m/s with every ensemble, from the first one on. */
  @Test
  void allowsWhatASteepBankExplains() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_2, (i, k) -> 0.2 * Math.min(5, Math.min(i, SIZE - 1 - i)));
    assertEquals(0, recording.screen().accounting().cells().of(Reason.SPIKE));
  }
}
