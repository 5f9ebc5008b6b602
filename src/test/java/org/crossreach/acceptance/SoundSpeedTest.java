package org.crossreach.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.screen.SoundSpeedCorrection;
import org.crossreach.settings.Settings;
import org.crossreach.settings.SoundSpeed;
import org.crossreach.settings.SoundSpeedFormula;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.Simulation;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Water;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * A record made with the speed of sound of water 5 degrees colder or warmer is off by the cube of
 * the ratio of the speeds, and right again when corrected.
 *
 * <p>Validation: speeds of sound of fresh water by Marczak 1997, printed to four decimals; 10
 * instead of 15 degrees is a ratio of 1.012901, cubed 1.039203. The cube law (velocity of the
 * water, velocity of the boat, depth) is exact for a draft of 0 and without edges, whose distances
 * are not measured by sound.
 */
class SoundSpeedTest {

  @ParameterizedTest
  @CsvSource({
    // used, true, true temperature
    "1447.2890, 1465.9599, 15",
    "1465.9599, 1447.2890, 10",
    "1426.1695, 1447.2890, 10",
    "1482.3795, 1465.9599, 15"
  })
  void movesDischargeByTheCubeAndIsCorrected(double used, double real, double degC)
      throws Exception {
    Recipe right = new Rivers().wobble(2).draft(0).recipe();
    Recipe wrong = new Rivers().wobble(2).draft(0).soundSpeed(used, real, degC).recipe();
    double exact = betweenEdges(Simulation.run(right).measurement(), Settings.defaults());
    Measurement recorded = Simulation.run(wrong).measurement();

    double uncorrected = betweenEdges(asIfCorrected(recorded), Settings.defaults());
    double ratio = real / used;
    // The recorded cells differ a little in where they lie, which the power law makes up for.
    assertEquals(exact, uncorrected * ratio * ratio * ratio, 1e-4 * exact);
    assertTrue(Math.abs(uncorrected / exact - 1) > 0.03, "5 degrees must be worth 3 % and more");

    assertEquals(exact, betweenEdges(recorded, Settings.defaults()), 0.0002 * exact);
  }

  @ParameterizedTest
  @CsvSource({
    "AUTO, 0, NaN, marczak-1997, sensor",
    "AUTO, 3, NaN, chen-millero-1977, sensor",
    "MEDWIN_1975, 0, 14, medwin-1975, given"
  })
  void namesWhatItCorrectedBy(
      SoundSpeedFormula formula, double salinity, double given, String name, String source)
      throws Exception {
    Measurement fresh =
        Simulation.run(new Rivers().soundSpeed(1500, 1465.9599, 15).recipe()).measurement();
    Measurement water = with(fresh, fresh.instrument(), new Water(Double.NaN, salinity));
    PassDischarge pass =
        new Reducer(1)
            .reduce(water, Settings.defaults().withSoundSpeed(new SoundSpeed(formula, given)))
            .passes()
            .get(0);
    SoundSpeedCorrection correction = pass.section().pass().accounting().soundSpeed().orElseThrow();
    assertEquals(name, correction.formula());
    assertEquals(source, correction.temperatureSource());
    assertEquals(1500, correction.usedMps());
  }

  private static Measurement asIfCorrected(Measurement measurement) {
    Instrument i = measurement.instrument();
    return with(
        measurement,
        new Instrument(
            i.serial(),
            i.frequencyKhz(),
            i.beamAngleDeg(),
            i.beamAzimuthsDeg(),
            i.draftM(),
            Double.NaN,
            i.declinationDeg(),
            i.headingOffsetDeg()),
        measurement.water());
  }

  private static Measurement with(Measurement measurement, Instrument instrument, Water water) {
    return new Measurement(
        measurement.id(),
        measurement.site(),
        measurement.party(),
        measurement.remarks(),
        measurement.stage(),
        measurement.rating(),
        water,
        instrument,
        measurement.passes(),
        measurement.movingBedTests(),
        measurement.inputs());
  }

  private static double betweenEdges(Measurement measurement, Settings settings) throws Exception {
    PassDischarge pass = new Reducer(1).reduce(measurement, settings).passes().get(0);
    return pass.zones().top() + pass.zones().measured() + pass.zones().bottom();
  }
}
