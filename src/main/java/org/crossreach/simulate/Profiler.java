package org.crossreach.simulate;

import org.crossreach.survey.Frame;
import org.crossreach.survey.Instrument;

/**
 * What the virtual instrument records.
 *
 * @param instrument the facts of {@code measurement.json}
 * @param frame axes of the recorded velocities
 * @param blankM transducer face to the upper edge of the first cell, as recorded (m)
 * @param cellM height of a cell, as recorded (m)
 * @param cells number of cells
 * @param soundSpeedMps true speed of sound in the water (m/s), NaN when it is as recorded
 * @param temperatureDegC temperature that the sensor records (deg C), NaN when it has none
 * @param verticalBeam whether there is a vertical beam
 * @param qualityColumns whether vertical and error velocity, correlation, intensity and good
 *     percent are recorded
 */
public record Profiler(
    Instrument instrument,
    Frame frame,
    double blankM,
    double cellM,
    int cells,
    double soundSpeedMps,
    double temperatureDegC,
    boolean verticalBeam,
    boolean qualityColumns) {

  /** Recorded over true velocity and range: the sound speed used over the true one. */
  double recordedOverTrue() {
    double used = instrument.soundSpeedUsedMps();
    return Double.isNaN(used) || Double.isNaN(soundSpeedMps) ? 1 : used / soundSpeedMps;
  }
}
