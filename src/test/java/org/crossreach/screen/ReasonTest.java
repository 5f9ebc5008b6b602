package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.junit.jupiter.api.Test;

/**
 * Each reason is given to the samples that earn it and to no others, and a screen that is switched
 * off brings its samples back.
 */
class ReasonTest {

  private static final int SIZE = 40;
  private static final int I = 20;
  private static final int K = 7;
  private static final long USED = SIZE * (long) Recording.CELLS_ABOVE_SIDE_LOBES;

  @Test
  void nothingSpeaksAgainstACalmRecord() {
    ScreenedPass pass = Recording.earth(SIZE).screen();
    assertTally(pass.accounting().cells(), USED, Reason.SIDE_LOBE, SIZE);
    assertTally(pass.accounting().bottomTrack(), SIZE, Reason.MISSING, 0);
    assertTally(pass.accounting().depths(), SIZE, Reason.MISSING, 0);
  }

  @Test
  void noCell() {
    Recording recording = Recording.earth(SIZE);
    recording.cellsOf[I] = 15;
    ScreenedPass pass = recording.screen();
    assertEquals(Reason.NO_CELL, pass.reason(I, 15));
    assertTally(pass.accounting().cells(), USED, Reason.SIDE_LOBE, SIZE - 1);
  }

  @Test
  void excluded() {
    Screening screening =
        Screening.defaults()
            .withExclusions(
                List.of(
                    new Exclusion("pass-01", 121, 123, "a barge passed"),
                    new Exclusion("pass-02", 101, 140, "another pass")));
    ScreenedPass pass = Recording.earth(SIZE).screen(screening);
    assertTally(pass.accounting().cells(), USED - 45, Reason.EXCLUDED, 48);
    assertEquals(Reason.EXCLUDED, pass.reason(20, 0));
    assertEquals(Reason.NONE, pass.reason(19, 0));
    assertEquals(Reason.NONE, pass.reason(23, 0));
  }

  @Test
  void sideLobe() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.DEPTH_BEAM_3_M, i -> i == I ? 4.2 : 4.5);
    ScreenedPass pass = recording.screen(off(Criterion.DEPTH_BEAMS));
    // 4.2 cos 20 = 3.947 lies above the lower edges of cells 14 (4.00) and 15.
    assertTally(pass.accounting().cells(), USED - 1, Reason.SIDE_LOBE, SIZE + 1);
    assertEquals(Reason.SIDE_LOBE, pass.reason(I, 14));
  }

  @Test
  void nearSurface() {
    Screening screening = Screening.defaults().withLeaveOutTopM(0.75);
    // Cell 0 reaches from 0.5 to 0.75 m below the surface, cell 1 begins at 0.75 m.
    ScreenedPass pass = Recording.earth(SIZE).screen(screening);
    assertEquals(Reason.NEAR_SURFACE, pass.reason(I, 0));
    assertEquals(Reason.NONE, pass.reason(I, 1));
    assertEquals(SIZE, pass.accounting().cells().of(Reason.NEAR_SURFACE));
  }

  @Test
  void missing() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_2, (i, k) -> i == I && k == K ? Double.NaN : 1);
    assertOneCell(recording, Screening.defaults(), Reason.MISSING);
  }

  @Test
  void threeBeam() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_4, (i, k) -> i == I && k == K ? Double.NaN : 0);
    assertOneCell(recording, withoutThreeBeam(), Reason.THREE_BEAM);
    ScreenedPass accepted = recording.screen();
    assertEquals(USED, accepted.accounting().cells().used());
    assertEquals(1, accepted.accounting().threeBeamCells());
  }

  @Test
  void recordWithoutErrorVelocityIsNotCalledThreeBeam() {
    Recording recording = Recording.earth(SIZE);
    recording.grids.remove(CellQuantity.WATER_4);
    recording.columns.remove(EnsembleQuantity.BOTTOM_4);
    ScreenedPass pass = recording.screen(withoutThreeBeam());
    assertEquals(USED, pass.accounting().cells().used());
    assertEquals(0, pass.accounting().threeBeamCells());
    assertEquals(SIZE, pass.accounting().bottomTrack().used());
  }

  @Test
  void goodPct() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.GOOD_PCT, (i, k) -> i == I && k == K ? 20 : 100);
    assertOneCell(recording, Criterion.GOOD_PCT, Limit.of(50), Reason.GOOD_PCT);
    assertOneCell(recording, Criterion.GOOD_PCT, Limit.AUTO, Reason.GOOD_PCT);
  }

  @Test
  void correlation() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.CORRELATION, (i, k) -> i == I && k == K ? 0.4 : 0.95);
    assertOneCell(recording, Criterion.CORRELATION, Limit.of(0.5), Reason.CORRELATION);
    assertOneCell(recording, Criterion.CORRELATION, Limit.AUTO, Reason.CORRELATION);
  }

  @Test
  void intensity() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.INTENSITY_DB, (i, k) -> i == I && k == K ? 40 : 80);
    assertOneCell(recording, Criterion.INTENSITY, Limit.of(50), Reason.INTENSITY);
    assertOneCell(recording, Criterion.INTENSITY, Limit.AUTO, Reason.INTENSITY);
  }

  @Test
  void errorVelocity() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_4, (i, k) -> i == I && k == K ? 0.3 : 0);
    assertOneCell(recording, Criterion.ERROR_VELOCITY, Limit.AUTO, Reason.ERROR_VELOCITY);
    assertOneCell(recording, Criterion.ERROR_VELOCITY, Limit.of(0.2), Reason.ERROR_VELOCITY);
    assertNoCell(recording, Criterion.ERROR_VELOCITY, Limit.of(0.31));
  }

  @Test
  void verticalVelocity() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_3, (i, k) -> i == I && k == K ? -0.3 : 0);
    assertOneCell(recording, Criterion.VERTICAL_VELOCITY, Limit.AUTO, Reason.VERTICAL_VELOCITY);
    assertOneCell(recording, Criterion.VERTICAL_VELOCITY, Limit.of(0.2), Reason.VERTICAL_VELOCITY);
    assertNoCell(recording, Criterion.VERTICAL_VELOCITY, Limit.of(0.31));
  }

  @Test
  void spikeInEitherComponent() {
    for (CellQuantity component : List.of(CellQuantity.WATER_1, CellQuantity.WATER_2)) {
      Recording recording = Recording.earth(SIZE);
      recording.add(component, (i, k) -> i == I && k == K ? 0.5 : 0);
      assertOneCell(recording, Criterion.SPIKES, Limit.AUTO, Reason.SPIKE);
      assertOneCell(recording, Criterion.SPIKES, Limit.of(0.4), Reason.SPIKE);
      assertNoCell(recording, Criterion.SPIKES, Limit.of(0.6));
    }
  }

  @Test
  void spikeOfAWholeEnsemble() {
    Recording recording = Recording.earth(SIZE);
    recording.add(CellQuantity.WATER_2, (i, k) -> i == I ? 1 : 0);
    ScreenedPass pass = recording.screen();
    assertTally(pass.accounting().cells(), USED - 15, Reason.SPIKE, 15);
    assertEquals(USED, recording.screen(off(Criterion.SPIKES)).accounting().cells().used());
  }

  @Test
  void fewCells() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_1, (i, k) -> i == I && k > 3 ? Double.NaN : -1);
    Screening five = withMinimumCells(5);
    ScreenedPass pass = recording.screen(five);
    assertEquals(4, pass.accounting().cells().of(Reason.FEW_CELLS));
    assertEquals(Reason.FEW_CELLS, pass.reason(I, 0));
    assertEquals(Reason.NONE, recording.screen(withMinimumCells(4)).reason(I, 0));
  }

  @Test
  void missingBottomTrack() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_2, i -> i == I ? Double.NaN : 0);
    assertOneBoat(recording, Screening.defaults(), Reason.MISSING);
  }

  @Test
  void bottomTrackOfThreeBeams() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_4, i -> i == I ? Double.NaN : 0);
    assertOneBoat(recording, withoutThreeBeam(), Reason.THREE_BEAM);
    assertEquals(1, recording.screen().accounting().threeBeamBottomTrack());
  }

  @Test
  void errorVelocityOfBottomTrack() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_4, i -> i == I ? 0.3 : 0);
    assertOneBoat(recording, Screening.defaults(), Reason.ERROR_VELOCITY);
    assertNoBoat(recording, off(Criterion.BOTTOM_ERROR_VELOCITY));
  }

  @Test
  void verticalVelocityOfBottomTrack() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_3, i -> i == I ? -0.3 : 0);
    // The water is seen to move against the boat: its vertical velocity is right again with it.
    recording.put(CellQuantity.WATER_3, (i, k) -> i == I ? 0 : 0);
    assertOneBoat(recording, Screening.defaults(), Reason.VERTICAL_VELOCITY);
    assertNoBoat(recording, off(Criterion.BOTTOM_VERTICAL_VELOCITY));
  }

  @Test
  void boatSpeed() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.BOTTOM_2, i -> i == I || i == I + 1 ? 0.8 : 0);
    ScreenedPass pass = recording.screen();
    assertTally(pass.accounting().bottomTrack(), SIZE - 2, Reason.BOAT_SPEED, 2);
    assertTrue(Double.isNaN(pass.boatEastMps(I)));
    assertEquals(USED, pass.accounting().cells().used());
    assertNoBoat(recording, Recording.with(off(Criterion.SPIKES), Criterion.BOAT_SPEED, Limit.OFF));
  }

  @Test
  void missingDepth() {
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(
          EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"), i -> i == I ? Double.NaN : 4.5);
    }
    ScreenedPass pass = recording.screen();
    assertTally(pass.accounting().depths(), SIZE - 1, Reason.MISSING, 1);
    assertEquals(Reason.MISSING, pass.depthReason(I));
    assertTrue(Double.isNaN(pass.depthBelowFaceM(I)));
    assertEquals(USED, pass.accounting().cells().used());
  }

  @Test
  void depthBeams() {
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"), i -> i == I ? 9 : 4.5);
    }
    ScreenedPass pass = recording.screen();
    assertTally(pass.accounting().depths(), SIZE - 1, Reason.DEPTH_BEAMS, 1);
    assertEquals(4, pass.accounting().depthBeamsLeftOut());
    assertEquals(USED, pass.accounting().cells().used());
    ScreenedPass off = recording.screen(off(Criterion.DEPTH_BEAMS));
    assertEquals(9, off.depthBelowFaceM(I));
    assertEquals(SIZE, off.accounting().depths().used());
  }

  @Test
  void keysAreDistinctLowerCaseWords() {
    Set<String> keys = new HashSet<>();
    for (Reason reason : EnumSet.allOf(Reason.class)) {
      assertTrue(reason.key().matches("[a-z]+(-[a-z]+)*"), reason.key());
      assertTrue(keys.add(reason.key()), reason.key());
      assertEquals(reason, Reason.of(reason.code()));
    }
  }

  private static void assertOneCell(
      Recording recording, Criterion criterion, Limit limit, Reason reason) {
    assertOneCell(recording, Recording.with(Screening.defaults(), criterion, limit), reason);
    assertNoCell(recording, criterion, Limit.OFF);
  }

  private static void assertOneCell(Recording recording, Screening screening, Reason reason) {
    ScreenedPass pass = recording.screen(screening);
    assertEquals(reason, pass.reason(I, K));
    assertTally(pass.accounting().cells(), USED - 1, reason, 1);
    assertEquals(1, pass.cells(I, reason));
    assertEquals(SIZE, pass.accounting().bottomTrack().used());
    assertEquals(SIZE, pass.accounting().depths().used());
  }

  private static void assertNoCell(Recording recording, Criterion criterion, Limit limit) {
    ScreenedPass pass = recording.screen(Recording.with(Screening.defaults(), criterion, limit));
    assertEquals(USED, pass.accounting().cells().used());
  }

  private static void assertOneBoat(Recording recording, Screening screening, Reason reason) {
    ScreenedPass pass = recording.screen(screening);
    assertEquals(reason, pass.bottomTrackReason(I));
    assertTally(pass.accounting().bottomTrack(), SIZE - 1, reason, 1);
    assertTrue(Double.isNaN(pass.boatEastMps(I)) && Double.isNaN(pass.boatNorthMps(I)));
    assertEquals(USED, pass.accounting().cells().used());
  }

  private static void assertNoBoat(Recording recording, Screening screening) {
    assertEquals(SIZE, recording.screen(screening).accounting().bottomTrack().used());
  }

  /** What is used, what carries one reason, and nothing else but side lobes. */
  private static void assertTally(Tally tally, long used, Reason reason, long count) {
    assertEquals(used, tally.used(), "used");
    assertEquals(count, tally.of(reason), reason.key());
    for (Reason other : Reason.values()) {
      if (other != Reason.NONE && other != reason && other != Reason.SIDE_LOBE) {
        assertEquals(0, tally.of(other), other.key());
      }
    }
  }

  private static Screening off(Criterion criterion) {
    return Recording.with(Screening.defaults(), criterion, Limit.OFF);
  }

  private static Screening withoutThreeBeam() {
    return Screening.defaults().withThreeBeam(false);
  }

  private static Screening withMinimumCells(int cells) {
    return Screening.defaults().withMinimumCells(cells);
  }
}
