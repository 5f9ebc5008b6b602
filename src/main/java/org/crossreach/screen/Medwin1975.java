package org.crossreach.screen;

/**
 * Fresh to sea water, a short polynomial.
 *
 * <p>Range: 0 to 35 deg C, 0 to 45 parts per thousand, depth 0 to 1000 m; in fresh water up to 0.8
 * m/s below Marczak 1997. Source: Medwin 1975, Journal of the Acoustical Society of America 58,
 * 1318 (coefficients and range from memory).
 */
final class Medwin1975 implements SoundSpeedLaw {

  @Override
  public double metresPerSecond(double temperatureDegC, double salinityPpt) {
    return metresPerSecond(temperatureDegC, salinityPpt, 0);
  }

  /** Speed of sound at a depth below the surface (m/s; m). */
  static double metresPerSecond(double temperatureDegC, double salinityPpt, double depthM) {
    double t = temperatureDegC;
    return 1449.2
        + 4.6 * t
        - 0.055 * t * t
        + 0.00029 * t * t * t
        + (1.34 - 0.010 * t) * (salinityPpt - 35)
        + 0.016 * depthM;
  }

  @Override
  public boolean covers(double temperatureDegC, double salinityPpt) {
    return temperatureDegC >= 0 && temperatureDegC <= 35 && salinityPpt <= 45;
  }
}
