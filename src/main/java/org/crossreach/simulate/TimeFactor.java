package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * Factor of all velocities over time: {@code start + perHour t + amplitude sin(2 pi t / period +
 * phase)}, t from the start of the first pass.
 *
 * @param start constant part
 * @param perHour change in an hour
 * @param amplitude amplitude of the wave
 * @param periodS period of the wave (s), above 0
 * @param phaseDeg phase of the wave at the start (deg)
 */
public record TimeFactor(
    double start, double perHour, double amplitude, double periodS, double phaseDeg) {

  /** Steady flow. */
  public static final TimeFactor STEADY = new TimeFactor(1, 0, 0, 3600, 0);

  /** The factor at a time after the start of the first pass (s). */
  double at(double timeS) {
    return start
        + perHour * timeS / 3600
        + amplitude
            * FastMath.sin(2 * FastMath.PI * timeS / periodS + FastMath.toRadians(phaseDeg));
  }

  /** Mean of the factor between two times (s). */
  double mean(double fromS, double toS) {
    if (!(toS > fromS)) {
      return at(fromS);
    }
    double w = 2 * FastMath.PI / periodS;
    double phase = FastMath.toRadians(phaseDeg);
    double wave = (FastMath.cos(w * fromS + phase) - FastMath.cos(w * toS + phase)) / w;
    return start + perHour * (fromS + toS) / 7200 + amplitude * wave / (toS - fromS);
  }
}
