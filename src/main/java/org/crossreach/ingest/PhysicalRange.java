package org.crossreach.ingest;

import org.crossreach.survey.EnsembleQuantity;

/**
 * The range in which a recorded number can be at all: wide limits that no river and no instrument
 * passes, so that a number outside is a filler for a missing value, a wrong unit or a slip.
 *
 * <p>Both ends belong to the range. The limits are the project's own choice, except where a
 * definition sets them (latitude, longitude, shares, quality indicator).
 *
 * @param lowest smallest possible number
 * @param highest largest possible number
 * @param unit unit for messages, empty when the number has none
 */
record PhysicalRange(double lowest, double highest, String unit) {

  /** Any component of a velocity: of water, boat or beam. */
  static final PhysicalRange VELOCITY = new PhysicalRange(-20, 20, "m/s");

  /** Depth below the transducer; the deepest rivers have some 200 m. */
  static final PhysicalRange DEPTH = new PhysicalRange(0.001, 500, "m");

  /** Distance from the transducer to the first cell. */
  static final PhysicalRange FIRST_CELL = new PhysicalRange(0.001, 100, "m");

  static final PhysicalRange CELL_SIZE = new PhysicalRange(0.001, 50, "m");
  static final PhysicalRange LATITUDE = new PhysicalRange(-90, 90, "deg");
  static final PhysicalRange LONGITUDE = new PhysicalRange(-180, 180, "deg");
  static final PhysicalRange ALTITUDE = new PhysicalRange(-1000, 9000, "m");
  static final PhysicalRange GNSS_QUALITY = new PhysicalRange(0, 8, "");
  static final PhysicalRange GNSS_HDOP = new PhysicalRange(0, 100, "");
  static final PhysicalRange GNSS_SATELLITES = new PhysicalRange(0, 200, "");

  /** A direction, counted from 0 to 360 or from -180 to 180. */
  static final PhysicalRange DIRECTION = new PhysicalRange(-360, 360, "deg");

  static final PhysicalRange PITCH = new PhysicalRange(-90, 90, "deg");
  static final PhysicalRange ROLL = new PhysicalRange(-180, 180, "deg");
  static final PhysicalRange TEMPERATURE = new PhysicalRange(-5, 60, "deg C");
  static final PhysicalRange CORRELATION = new PhysicalRange(0, 1, "");
  static final PhysicalRange INTENSITY = new PhysicalRange(-200, 300, "dB");
  static final PhysicalRange PERCENTAGE = new PhysicalRange(0, 100, "%");

  static final PhysicalRange CELLS = new PhysicalRange(0, EnsembleColumn.MOST_CELLS, "");

  /** An ensemble's number. */
  static final PhysicalRange NUMBER = new PhysicalRange(0, 999_999_999_999.0, "");

  static final PhysicalRange FREQUENCY = new PhysicalRange(10, 10_000, "kHz");
  static final PhysicalRange BEAM_ANGLE = new PhysicalRange(1, 45, "deg");
  static final PhysicalRange DRAFT = new PhysicalRange(0, 20, "m");
  static final PhysicalRange SOUND_SPEED = new PhysicalRange(1300, 1700, "m/s");
  static final PhysicalRange SALINITY = new PhysicalRange(0, 350, "ppt");
  static final PhysicalRange STAGE = new PhysicalRange(-1000, 9000, "m");
  static final PhysicalRange EDGE_DISTANCE = new PhysicalRange(0, 5000, "m");

  /** Coefficient of an edge; a rectangle has 1. */
  static final PhysicalRange EDGE_COEFFICIENT = new PhysicalRange(0, 2, "");

  static final PhysicalRange EDGE_DISCHARGE = new PhysicalRange(-100_000, 100_000, "m³/s");

  PhysicalRange {
    if (!(lowest <= highest)) {
      throw new IllegalArgumentException("lowest " + lowest + " is above highest " + highest);
    }
  }

  /** Whether a number lies in the range; NaN does not. */
  boolean holds(double value) {
    return value >= lowest && value <= highest;
  }

  /** The range as a phrase, for example {@code a number from -20 to 20 m/s}. */
  String phrase() {
    return "a number from "
        + Quoted.number(lowest)
        + " to "
        + Quoted.number(highest)
        + (unit.isEmpty() ? "" : " " + unit);
  }

  /** The range of a quantity that is recorded once per ensemble. */
  static PhysicalRange of(EnsembleQuantity quantity) {
    return switch (quantity) {
      case BOTTOM_1, BOTTOM_2, BOTTOM_3, BOTTOM_4, GNSS_EAST_MPS, GNSS_NORTH_MPS -> VELOCITY;
      case GNSS_LATITUDE_DEG -> LATITUDE;
      case GNSS_LONGITUDE_DEG -> LONGITUDE;
      case GNSS_ALTITUDE_M -> ALTITUDE;
      case GNSS_QUALITY -> GNSS_QUALITY;
      case GNSS_HDOP -> GNSS_HDOP;
      case GNSS_SATELLITES -> GNSS_SATELLITES;
      case HEADING_DEG -> DIRECTION;
      case PITCH_DEG -> PITCH;
      case ROLL_DEG -> ROLL;
      case TEMPERATURE_DEGC -> TEMPERATURE;
      case DEPTH_BEAM_1_M, DEPTH_BEAM_2_M, DEPTH_BEAM_3_M, DEPTH_BEAM_4_M, DEPTH_VERTICAL_M ->
          DEPTH;
      case FIRST_CELL_M -> FIRST_CELL;
      case CELL_SIZE_M -> CELL_SIZE;
    };
  }
}
