package org.crossreach.screen;

/**
 * Fresh to sea water: {@code c = Cw + A S + B S^1.5 + D S^2}, each a polynomial in temperature and
 * pressure.
 *
 * <p>Range: 0 to 40 deg C, 0 to 40 parts per thousand, 0 to 1000 bar. Source: Chen and Millero
 * 1977, Journal of the Acoustical Society of America 62, 1129, with the coefficients of Fofonoff
 * and Millard 1983, UNESCO Technical Papers in Marine Science 44, which stand on the temperature
 * scale of 1968.
 */
final class ChenMillero1977 implements SoundSpeedLaw {

  /** Temperature on the scale of 1968 over that on ITS-90. Source: Saunders 1990 (from memory). */
  private static final double T68_PER_T90 = 1.00024;

  @Override
  public double metresPerSecond(double temperatureDegC, double salinityPpt) {
    return metresPerSecond(T68_PER_T90 * temperatureDegC, salinityPpt, /* pressureBar= */ 0);
  }

  /**
   * Speed of sound (m/s) at a temperature on the scale of 1968 (deg C), a salinity (parts per
   * thousand) and a pressure above that of the atmosphere (bar).
   */
  static double metresPerSecond(double t68, double salinity, double pressureBar) {
    double root = Math.sqrt(salinity);
    return pureWater(t68, pressureBar)
        + salinity * (a(t68, pressureBar) + b(t68, pressureBar) * root + d(pressureBar) * salinity);
  }

  private static double pureWater(double t, double p) {
    double c0 =
        1402.388
            + t
                * (5.03711
                    + t * (-5.80852e-2 + t * (3.3420e-4 + t * (-1.47800e-6 + t * 3.1464e-9))));
    double c1 = 0.153563 + t * (6.8982e-4 + t * (-8.1788e-6 + t * (1.3621e-7 + t * -6.1185e-10)));
    double c2 = 3.1260e-5 + t * (-1.7107e-6 + t * (2.5974e-8 + t * (-2.5335e-10 + t * 1.0405e-12)));
    double c3 = -9.7729e-9 + t * (3.8504e-10 + t * -2.3643e-12);
    return c0 + p * (c1 + p * (c2 + p * c3));
  }

  private static double a(double t, double p) {
    double a0 = 1.389 + t * (-1.262e-2 + t * (7.164e-5 + t * (2.006e-6 + t * -3.21e-8)));
    double a1 = 9.4742e-5 + t * (-1.2580e-5 + t * (-6.4885e-8 + t * (1.0507e-8 + t * -2.0122e-10)));
    double a2 = -3.9064e-7 + t * (9.1041e-9 + t * (-1.6002e-10 + t * 7.988e-12));
    double a3 = 1.100e-10 + t * (6.649e-12 + t * -3.389e-13);
    return a0 + p * (a1 + p * (a2 + p * a3));
  }

  private static double b(double t, double p) {
    return -1.922e-2 - 4.42e-5 * t + p * (7.3637e-5 + 1.7945e-7 * t);
  }

  private static double d(double p) {
    return 1.727e-3 - 7.9836e-6 * p;
  }

  @Override
  public boolean covers(double temperatureDegC, double salinityPpt) {
    return temperatureDegC >= 0 && temperatureDegC <= 40 && salinityPpt <= 40;
  }
}
