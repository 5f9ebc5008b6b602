package org.crossreach.survey;

import java.util.List;

/**
 * The profiler and how it was mounted.
 *
 * @param serial serial number, may be empty
 * @param frequencyKhz acoustic frequency (kHz), NaN when not recorded
 * @param beamAngleDeg angle of the slant beams from the vertical (deg), for example 20
 * @param beamAzimuthsDeg azimuth of each slant beam clockwise from the instrument's forward axis,
 *     seen from above (deg); empty when not recorded
 * @param draftM depth of the transducer face below the water surface (m)
 * @param soundSpeedUsedMps speed of sound with which the record was made (m/s), NaN when the record
 *     is already corrected
 * @param declinationDeg magnetic declination, positive east (deg)
 * @param headingOffsetDeg what else turns the compass's north onto true north, clockwise positive
 *     (deg)
 */
public record Instrument(
    String serial,
    double frequencyKhz,
    double beamAngleDeg,
    List<Double> beamAzimuthsDeg,
    double draftM,
    double soundSpeedUsedMps,
    double declinationDeg,
    double headingOffsetDeg) {

  public Instrument {
    beamAzimuthsDeg = List.copyOf(beamAzimuthsDeg);
  }

  /**
   * Clockwise turn from the compass's north onto true north: declination plus heading offset (deg).
   */
  public double northTurnDeg() {
    return declinationDeg + headingOffsetDeg;
  }
}
