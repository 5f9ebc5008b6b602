package org.crossreach.screen;

/** A published formula for the speed of sound in water at the surface, named for its source. */
interface SoundSpeedLaw {

  /**
   * Speed of sound at atmospheric pressure (m/s).
   *
   * @param temperatureDegC temperature of the water (deg C, ITS-90)
   * @param salinityPpt salinity (parts per thousand, 0 for fresh water)
   */
  double metresPerSecond(double temperatureDegC, double salinityPpt);

  /** Whether the source gives the formula for such water. */
  boolean covers(double temperatureDegC, double salinityPpt);
}
