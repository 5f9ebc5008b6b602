package org.crossreach.screen;

/** A screen that has a limit. */
public enum Criterion {
  /** Largest departure of the water's error velocity from its median. */
  ERROR_VELOCITY("error_velocity_mps", "m/s"),
  /**
   * Largest departure of the water's vertical velocity from its median: over the bed or relative to
   * the boat, whichever scatters less.
   */
  VERTICAL_VELOCITY("vertical_velocity_mps", "m/s"),
  /** Lowest correlation. */
  CORRELATION("correlation", ""),
  /** Lowest intensity. */
  INTENSITY("intensity_db", "dB"),
  /** Lowest share of pings used. */
  GOOD_PCT("good_pct", "%"),
  /** Largest departure of a cell's velocity from its neighbours in time and depth. */
  SPIKES("spikes_mps", "m/s"),
  /** Largest departure of bottom tracking's error velocity from its median. */
  BOTTOM_ERROR_VELOCITY("bottom_error_velocity_mps", "m/s"),
  /** Largest departure of bottom tracking's vertical velocity from its median. */
  BOTTOM_VERTICAL_VELOCITY("bottom_vertical_velocity_mps", "m/s"),
  /** Largest departure of the boat's velocity from its neighbours in time. */
  BOAT_SPEED("boat_speed_mps", "m/s"),
  /** Largest departure of a beam's depth from its neighbours and the other beams. */
  DEPTH_BEAMS("depth_beams", "");

  private final String key;
  private final String unit;

  Criterion(String key, String unit) {
    this.key = key;
    this.unit = unit;
  }

  /** Name of the screen in settings and results, for example {@code spikes_mps}. */
  public String key() {
    return key;
  }

  /** Unit of the limit, empty for a share. */
  public String unit() {
    return unit;
  }
}
