package org.crossreach.screen;

/**
 * Pure water, a polynomial in temperature.
 *
 * <p>Range: 0 to 95 deg C (ITS-90), no salt; in water of 0.5 parts per thousand it is 0.6 m/s, or
 * 0.04 %, too low. Source: Marczak 1997, Journal of the Acoustical Society of America 102, 2776.
 */
final class Marczak1997 implements SoundSpeedLaw {

  /** Highest salinity at which water is taken as fresh (parts per thousand). */
  private static final double FRESH_PPT = 0.5;

  @Override
  public double metresPerSecond(double temperatureDegC, double salinityPpt) {
    double t = temperatureDegC;
    return 1402.385
        + t
            * (5.038813
                + t * (-5.799136e-2 + t * (3.287156e-4 + t * (-1.398845e-6 + t * 2.787860e-9))));
  }

  @Override
  public boolean covers(double temperatureDegC, double salinityPpt) {
    return temperatureDegC >= 0 && temperatureDegC <= 95 && salinityPpt <= FRESH_PPT;
  }
}
