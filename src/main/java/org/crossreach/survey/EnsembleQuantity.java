package org.crossreach.survey;

/**
 * A quantity recorded once per ensemble.
 *
 * <p>The components of the boat's velocity over the bed by bottom tracking, {@code BOTTOM_1} to
 * {@code BOTTOM_4}, stand in the {@linkplain Frame frame} of the record: earth east, north, up,
 * error; ship starboard, forward, up, error; instrument x, y, z, error; beam 1 to 4.
 */
public enum EnsembleQuantity {
  /** First component of the bottom-track velocity (m/s). */
  BOTTOM_1,
  /** Second component of the bottom-track velocity (m/s). */
  BOTTOM_2,
  /** Third component of the bottom-track velocity (m/s). */
  BOTTOM_3,
  /** Fourth component of the bottom-track velocity (m/s). */
  BOTTOM_4,
  /** Antenna latitude (deg, WGS 84, north positive). */
  GNSS_LATITUDE_DEG,
  /** Antenna longitude (deg, WGS 84, east positive). */
  GNSS_LONGITUDE_DEG,
  /** Antenna altitude (m). */
  GNSS_ALTITUDE_M,
  /** Fix quality indicator, 0 to 8. */
  GNSS_QUALITY,
  /** Horizontal dilution of precision. */
  GNSS_HDOP,
  /** Number of satellites. */
  GNSS_SATELLITES,
  /** Eastward boat velocity from GNSS course and speed over ground (m/s, true north). */
  GNSS_EAST_MPS,
  /** Northward boat velocity from GNSS course and speed over ground (m/s, true north). */
  GNSS_NORTH_MPS,
  /** Heading of the forward axis clockwise from the compass's north (deg). */
  HEADING_DEG,
  /** Pitch, positive bow up (deg). */
  PITCH_DEG,
  /** Roll, positive port side up (deg). */
  ROLL_DEG,
  /** Water temperature at the transducer (deg C). */
  TEMPERATURE_DEGC,
  /** Vertical depth below the transducer face, slant beam 1 (m). */
  DEPTH_BEAM_1_M,
  /** Vertical depth below the transducer face, slant beam 2 (m). */
  DEPTH_BEAM_2_M,
  /** Vertical depth below the transducer face, slant beam 3 (m). */
  DEPTH_BEAM_3_M,
  /** Vertical depth below the transducer face, slant beam 4 (m). */
  DEPTH_BEAM_4_M,
  /** Depth below the transducer face from a vertical beam (m). */
  DEPTH_VERTICAL_M,
  /** Transducer face to the centre of cell 1, vertically (m). */
  FIRST_CELL_M,
  /** Height of a cell (m). */
  CELL_SIZE_M
}
