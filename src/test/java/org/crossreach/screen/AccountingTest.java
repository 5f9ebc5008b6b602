package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Note;
import org.junit.jupiter.api.Test;

/** Every sample is counted once, the longest runs are told with their place, and notes say so. */
class AccountingTest {

  private static final int SIZE = 200;

  @Test
  void countsEverySampleOnce() {
    Recording recording = Recording.noisy(SIZE, 0.05, 1);
    recording.put(CellQuantity.WATER_1, (i, k) -> (i + k) % 7 == 0 ? Double.NaN : -1);
    recording.put(EnsembleQuantity.BOTTOM_1, i -> i % 9 == 0 ? Double.NaN : 1);
    recording.cellsOf[3] = 10;
    Accounting accounting = recording.screen().accounting();
    assertEquals(SIZE, accounting.ensembles());
    assertEquals(SIZE * 16L - 6, accounting.cells().recorded());
    assertEquals(SIZE, accounting.bottomTrack().recorded());
    assertEquals(SIZE, accounting.depths().recorded());
    long sum = 0;
    for (Reason reason : Reason.values()) {
      sum += accounting.cells().of(reason);
    }
    assertEquals(accounting.cells().recorded(), sum);
    assertEquals(sum, accounting.cells().used() + accounting.cells().rejected());
  }

  @Test
  void tellsTheLongestRunsAndWhereTheyAre() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_1, (i, k) -> i >= 20 && i < 25 ? Double.NaN : -1);
    recording.put(EnsembleQuantity.BOTTOM_1, i -> i < 3 || i == 50 ? Double.NaN : 1);
    Accounting accounting = recording.screen().accounting();
    assertEquals(new Run(5, 121, 125, 5), accounting.longestWithoutWater().orElseThrow());
    // From the end of the first ensemble, since what was before is not known.
    assertEquals(new Run(3, 101, 103, 2), accounting.longestWithoutBottomTrack().orElseThrow());
    assertTrue(Recording.earth(9).screen().accounting().longestWithoutWater().isEmpty());
  }

  @Test
  void cautionsFromTenPercentOrTenSecondsWithoutBottomTrack() {
    assertFalse(has(withoutBottomTrack(1, 10), "lost-bottom-track"));
    assertTrue(has(withoutBottomTrack(1, 11), "lost-bottom-track"));
    assertFalse(has(withoutBottomTrack(10, 1), "lost-bottom-track"));
    assertTrue(has(withoutBottomTrack(11, 2), "lost-bottom-track"));
    Note note = withoutBottomTrack(1, 11).notes().get(0);
    assertEquals(Note.Level.CAUTION, note.level());
    assertEquals(
        "5.5 % of the ensembles have no usable bottom track; the longest run takes 11.0 s,"
            + " ensembles 111 to 121",
        note.text());
  }

  /** So many runs, each of so many ensembles. */
  private static ScreenedPass withoutBottomTrack(int runs, int length) {
    Recording recording = Recording.earth(SIZE);
    recording.put(
        EnsembleQuantity.BOTTOM_1,
        i ->
            i >= 10 && i % 10 < length && i / 10 <= runs && length <= 10
                    || length > 10 && i >= 10 && i < 10 + length
                ? Double.NaN
                : 1);
    return recording.screen();
  }

  @Test
  void cautionsWhenWaterOrDepthIsLost() {
    Recording recording = Recording.earth(SIZE);
    recording.put(CellQuantity.WATER_1, (i, k) -> i % 8 == 0 ? Double.NaN : -1);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(
          EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"),
          i -> i % 8 == 0 ? Double.NaN : 4.5);
    }
    ScreenedPass pass = recording.screen();
    assertTrue(has(pass, "lost-water"));
    assertTrue(has(pass, "lost-depth"));
    assertEquals(25, pass.accounting().depthsFilled());
    assertEquals(175, pass.accounting().depthsMeasured());
    assertFalse(has(Recording.earth(SIZE).screen(), "lost-water"));
    assertFalse(has(Recording.earth(SIZE).screen(), "lost-depth"));
  }

  @Test
  void countsDepthsThatOtherBeamsGave() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.DEPTH_VERTICAL_M, i -> i < 20 ? Double.NaN : 4.4);
    ScreenedPass pass = recording.screen(Settings.defaults().withDepth(DepthSource.VERTICAL));
    assertEquals(20, pass.accounting().depthsReplaced());
    assertEquals(180, pass.accounting().depthsMeasured());
    assertEquals(4.5, pass.depthBelowFaceM(19));
    assertEquals(4.4, pass.depthBelowFaceM(20));
  }

  @Test
  void namesTheLimitOfEveryScreenThatIsOn() {
    Accounting all = Recording.noisy(SIZE, 0.05, 2).screen().accounting();
    for (Criterion criterion : Criterion.values()) {
      boolean on =
          criterion != Criterion.CORRELATION
              && criterion != Criterion.INTENSITY
              && criterion != Criterion.GOOD_PCT;
      assertEquals(on, all.limit(criterion).isPresent(), criterion.key());
    }
    assertTrue(Recording.earth(SIZE).screen(Screening.off()).accounting().limits().isEmpty());
    Accounting given =
        Recording.earth(SIZE)
            .screen(Recording.with(Screening.off(), Criterion.SPIKES, Limit.of(0.4)))
            .accounting();
    assertEquals(
        new FoundLimit(Criterion.SPIKES, Limit.Kind.GIVEN, Double.NaN, 0.4),
        given.limit(Criterion.SPIKES).orElseThrow());
  }

  @Test
  void notesWhatWasLeftOutByHand() {
    Screening screening =
        Screening.defaults()
            .withExclusions(List.of(new Exclusion("pass-01", 120, 130, "a ship's wake")));
    Note note = Recording.earth(SIZE).screen(screening).notes().get(0);
    assertEquals("excluded", note.code());
    assertEquals("ensembles 120 to 130 left out: a ship's wake", note.text());
    Screening nothing =
        Screening.defaults()
            .withExclusions(List.of(new Exclusion("pass-01", 1, 100, "before the start")));
    assertTrue(has(Recording.earth(SIZE).screen(nothing), "excluded-nothing"));
  }

  @Test
  void notesTiltFromFiveDegreesOn() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.PITCH_DEG, i -> 4.9).put(EnsembleQuantity.ROLL_DEG, i -> 0);
    assertFalse(has(recording.screen(), "tilt"));
    recording.put(EnsembleQuantity.ROLL_DEG, i -> i % 10 == 0 ? -2 : 0);
    assertTrue(has(recording.screen(), "tilt"));
    recording.put(EnsembleQuantity.ROLL_DEG, i -> i % 50 == 0 ? -2 : 0);
    assertFalse(has(recording.screen(), "tilt"), "2 % of the ensembles are few");
  }

  @Test
  void notesWhatTheFrameMisses() {
    Recording recording = new Recording(Frame.INSTRUMENT, SIZE, 16);
    recording.put(EnsembleQuantity.HEADING_DEG, i -> i == 3 ? Double.NaN : 10);
    ScreenedPass pass = recording.screen();
    assertTrue(has(pass, "tilt-unknown"));
    assertTrue(has(pass, "heading-filled"));
    assertEquals(SIZE * 15L, pass.accounting().cells().used());
  }

  @Test
  void notesAnOffsetOfTheErrorVelocity() {
    Recording recording = Recording.noisy(SIZE, 0.05, 3);
    recording.add(CellQuantity.WATER_4, (i, k) -> 0.2);
    assertTrue(has(recording.screen(), "error-velocity-offset"));
    assertEquals(SIZE * 15L, recording.screen().accounting().cells().used());
  }

  private static boolean has(ScreenedPass pass, String code) {
    return pass.notes().stream().map(Note::code).anyMatch(code::equals);
  }
}
