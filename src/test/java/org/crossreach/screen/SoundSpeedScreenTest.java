package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.settings.Settings;
import org.crossreach.settings.SoundSpeed;
import org.crossreach.settings.SoundSpeedFormula;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Note;
import org.crossreach.survey.Water;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Velocities and distances below the face follow the ratio of the speeds of sound, the draft does
 * not, and the temperature comes from where it should.
 *
 * <p>Validation: ratios for a record made with 1500 m/s in fresh water, printed to six decimals
 * (derived from Marczak 1997).
 */
class SoundSpeedScreenTest {

  @ParameterizedTest
  @CsvSource({"10,0.964859", "15,0.977307", "20,0.988253"})
  void scalesVelocitiesAndDistancesButNotTheDraft(double degC, double ratio) {
    Recording recording = recordedWith(1500);
    recording.put(EnsembleQuantity.TEMPERATURE_DEGC, i -> degC);
    ScreenedPass pass = recording.screen();
    assertEquals(ratio, pass.soundRatio(5), 0.5e-6);
    VelocityRow row = new VelocityRow(pass.maxCells());
    pass.read(5, row);
    double r = pass.soundRatio(5);
    assertEquals(-r, row.eastMps(3), 1e-12);
    assertEquals(r, row.northMps(3), 1e-12);
    assertEquals(r, pass.boatEastMps(5), 1e-12);
    assertEquals(4.5 * r, pass.depthBelowFaceM(5), 1e-12);
    assertEquals(0.25 * r, pass.cellSizeM(5), 1e-12);
    assertEquals(Recording.DRAFT_M + 0.25 * r, pass.topOfCellsM(5), 1e-12);
    assertEquals(Recording.DRAFT_M, pass.draftM());
    assertTrue(has(pass, "sound-speed-corrected"));
    // Side lobes scale with everything else below the face: as many cells lie above them.
    assertEquals(Recording.CELLS_ABOVE_SIDE_LOBES * 40L, pass.accounting().cells().used());
  }

  @Test
  void recordThatStatesNoSpeedIsNotCorrected() {
    Recording recording = Recording.earth(40);
    recording.put(EnsembleQuantity.TEMPERATURE_DEGC, i -> 5);
    ScreenedPass pass = recording.screen();
    assertEquals(1, pass.soundRatio(7));
    assertTrue(pass.accounting().soundSpeed().isEmpty());
    assertFalse(has(pass, "sound-speed-corrected"));
  }

  @Test
  void sensorIsFollowedInTimeAndItsGapsAreBridged() {
    Recording recording = recordedWith(1500);
    recording.put(EnsembleQuantity.TEMPERATURE_DEGC, i -> i == 5 ? Double.NaN : 10 + i);
    ScreenedPass pass = recording.screen();
    Marczak1997 law = new Marczak1997();
    assertEquals(law.metresPerSecond(15, 0) / 1500, pass.soundRatio(5), 1e-12);
    assertEquals(law.metresPerSecond(16, 0) / 1500, pass.soundRatio(6), 1e-12);
    assertEquals("sensor", pass.accounting().soundSpeed().orElseThrow().temperatureSource());
  }

  @Test
  void givenTemperatureComesBeforeTheSensorAndTheCheckAfterIt() {
    Recording recording = recordedWith(1500);
    recording.water = new Water(12, 0);
    assertEquals(
        "check", recording.screen().accounting().soundSpeed().orElseThrow().temperatureSource());
    assertTrue(has(recording.screen(), "temperature-by-check"));
    recording.put(EnsembleQuantity.TEMPERATURE_DEGC, i -> 11);
    assertEquals(
        "sensor", recording.screen().accounting().soundSpeed().orElseThrow().temperatureSource());
    ScreenedPass given =
        recording.screen(
            Settings.defaults().withSoundSpeed(new SoundSpeed(SoundSpeedFormula.AUTO, 13)));
    SoundSpeedCorrection correction = given.accounting().soundSpeed().orElseThrow();
    assertEquals("given", correction.temperatureSource());
    assertEquals(13, correction.temperatureDegC());
    assertEquals(correction.trueMps() / 1500, correction.ratio());
  }

  @Test
  void withoutAnyTemperatureNothingIsCorrectedButSaid() {
    ScreenedPass pass = recordedWith(1500).screen();
    assertEquals(1, pass.soundRatio(0));
    assertTrue(has(pass, "sound-speed-uncorrected"));
  }

  @ParameterizedTest
  @CsvSource({"13.9, false", "14.1, true", "9.9, true"})
  void saysWhenTheSensorDepartsFromTheCheckByMoreThanTwoDegrees(double sensor, boolean said) {
    Recording recording = Recording.earth(40);
    recording.water = new Water(12, 0);
    recording.put(EnsembleQuantity.TEMPERATURE_DEGC, i -> sensor);
    assertEquals(said, has(recording.screen(), "temperature-departs"));
  }

  @Test
  void saysWhenTheFormulaIsNotForSuchWater() {
    Recording recording = recordedWith(1500);
    recording.water = new Water(12, 20);
    ScreenedPass pass =
        recording.screen(
            Settings.defaults()
                .withSoundSpeed(new SoundSpeed(SoundSpeedFormula.MARCZAK_1997, Double.NaN)));
    assertTrue(has(pass, "sound-speed-range"));
    assertFalse(has(recording.screen(), "sound-speed-range"));
  }

  private static Recording recordedWith(double soundSpeedMps) {
    Recording recording = Recording.earth(40);
    Instrument i = recording.instrument;
    recording.instrument =
        new Instrument(
            i.serial(),
            i.frequencyKhz(),
            i.beamAngleDeg(),
            i.beamAzimuthsDeg(),
            i.draftM(),
            soundSpeedMps,
            i.declinationDeg(),
            i.headingOffsetDeg());
    return recording;
  }

  private static boolean has(ScreenedPass pass, String code) {
    return pass.notes().stream().map(Note::code).anyMatch(code::equals);
  }
}
