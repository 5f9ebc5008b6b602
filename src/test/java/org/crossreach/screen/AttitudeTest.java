package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Instrument;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Axes lie in the world as heading, pitch and roll say, and gaps in them are bridged.
 *
 * <p>Validation: rotation matrix and vectors worked out independently in double precision and
 * printed to nine decimals, heading clockwise from true north, pitch positive bow up, roll positive
 * port side up.
 */
class AttitudeTest {

  private static final double NINE_DECIMALS = 1.5e-9;

  @Test
  void rotatesByHeadingPitchAndRoll() {
    double[] r = rotation(Frame.INSTRUMENT, 30, 5, -3, 0);
    double[] printed = {
      0.862557856, 0.498097349, -0.088842417,
      -0.503265038, 0.862729916, -0.049207668,
      0.052136802, 0.087155743, 0.994829448
    };
    for (int j = 0; j < 9; j++) {
      assertEquals(printed[j], r[j], 0.5e-9, "element " + j);
    }
  }

  @ParameterizedTest
  @CsvSource({
    "1.2, 0.3, 0.02, 30, 0, 0, 0.889230485, 0.859807621, 0.02",
    "1.2, 0.3, 0.02, 30, 5, -3, 0.885132653, 0.858278908, -0.101476612",
    "-0.8, 1.5, -0.01, 217.5, -2, 4, 1.546463012, -0.702243611, 0.073525929",
    "0.5, 0, 0, 0, 10, 0, 0.5, 0, 0",
    "0.5, 0, 0, 90, 0, 10, 0, 0.5, 0"
  })
  void turnsInstrumentVectorsIntoEarthVectors(
      double east,
      double north,
      double up,
      double heading,
      double pitch,
      double roll,
      double x,
      double y,
      double z) {
    double[] r = rotation(Frame.INSTRUMENT, heading, pitch, roll, 0);
    assertEquals(east, r[0] * x + r[1] * y + r[2] * z, NINE_DECIMALS);
    assertEquals(north, r[3] * x + r[4] * y + r[5] * z, NINE_DECIMALS);
    assertEquals(up, r[6] * x + r[7] * y + r[8] * z, NINE_DECIMALS);
  }

  @Test
  void ignoresTiltInTheShipFrameAndHeadingInTheEarthFrame() {
    double[] ship = rotation(Frame.SHIP, 90, 10, 10, 0);
    // Forward points east, starboard points south.
    assertEquals(1, ship[1], 1e-15);
    assertEquals(-1, ship[3], 1e-15);
    assertEquals(1, ship[8], 1e-15);
    double[] earth = rotation(Frame.EARTH, 90, 10, 10, 0);
    assertEquals(1, earth[0], 1e-15);
    assertEquals(1, earth[4], 1e-15);
  }

  @Test
  void turnsClockwiseByDeclinationAndOffset() {
    for (Frame frame : Frame.values()) {
      double heading = frame == Frame.EARTH ? 0 : 80;
      // What points to the compass's north, seen from an instrument heading 80, now points to 10.
      double[] r = rotation(frame, heading, 0, 0, 10);
      double compassEast = Math.sin(Math.toRadians(-heading));
      double compassNorth = Math.cos(Math.toRadians(-heading));
      assertEquals(
          Math.sin(Math.toRadians(10)),
          r[0] * compassEast + r[1] * compassNorth,
          1e-15,
          "" + frame);
    }
  }

  @Test
  void bridgesAMissingHeadingTheShortWayRound() {
    Recording recording = new Recording(Frame.SHIP, 3, 4);
    double[] headings = {350, Double.NaN, 20};
    recording.put(EnsembleQuantity.HEADING_DEG, i -> headings[i]);
    Attitude attitude =
        new Attitude(recording.ensembles(), recording.instrument, new double[] {0, 1, 2});
    double[] r = new double[9];
    attitude.rotation(1, r);
    assertEquals(5, Math.toDegrees(Math.atan2(r[1], r[4])), 1e-12);
    assertEquals(1, attitude.headingsFilled());
  }

  @Test
  void takesARecordWithoutTiltAsLevel() {
    Recording recording = new Recording(Frame.INSTRUMENT, 2, 4);
    Attitude attitude =
        new Attitude(recording.ensembles(), recording.instrument, new double[] {0, 1});
    double[] r = new double[9];
    attitude.rotation(0, r);
    assertEquals(1, r[8]);
    assertFalse(attitude.tiltKnown());
  }

  @Test
  void measuresTheTiltFromTheVertical() {
    Recording recording = new Recording(Frame.INSTRUMENT, 1, 4);
    recording.put(EnsembleQuantity.PITCH_DEG, i -> 5).put(EnsembleQuantity.ROLL_DEG, i -> -3);
    Attitude attitude = new Attitude(recording.ensembles(), recording.instrument, new double[] {0});
    assertTrue(attitude.tiltKnown());
    // The last element of the printed matrix is the cosine of the tilt.
    assertEquals(0.994829448, Math.cos(Math.toRadians(attitude.tiltDeg(0))), 0.5e-9);
  }

  private static double[] rotation(
      Frame frame, double heading, double pitch, double roll, double declination) {
    Recording recording = new Recording(frame, 1, 4);
    recording
        .put(EnsembleQuantity.HEADING_DEG, i -> heading)
        .put(EnsembleQuantity.PITCH_DEG, i -> pitch)
        .put(EnsembleQuantity.ROLL_DEG, i -> roll);
    Instrument instrument =
        new Instrument("", 1200, 20, List.of(), 0.25, Double.NaN, declination - 2, 2);
    double[] nine = new double[9];
    new Attitude(recording.ensembles(), instrument, new double[] {0}).rotation(0, nine);
    return nine;
  }
}
