package org.crossreach.survey;

import java.time.OffsetDateTime;
import java.util.List;

/**
 * Gauge readings during the measurement.
 *
 * @param datum what the readings refer to, may be empty
 * @param readings the readings in the order of the record
 */
public record Stage(String datum, List<Reading> readings) {

  public Stage {
    readings = List.copyOf(readings);
  }

  /**
   * One gauge reading.
   *
   * @param time when it was read
   * @param stageM the water level above the gauge's datum (m)
   */
  public record Reading(OffsetDateTime time, double stageM) {}
}
