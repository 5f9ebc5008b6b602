package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * How the instrument stands in the water: pitch and roll as waves a quarter of a period apart, the
 * heading as a slower one.
 *
 * @param headingDeg mean heading by the compass (deg)
 * @param headingSwingDeg amplitude of the heading (deg)
 * @param pitchDeg amplitude of the pitch (deg)
 * @param rollDeg amplitude of the roll (deg)
 * @param periodS period of pitch and roll (s), above 0; the heading takes five of them
 */
public record Attitude(
    double headingDeg, double headingSwingDeg, double pitchDeg, double rollDeg, double periodS) {

  /** Level, forward axis to the compass's north. */
  public static final Attitude LEVEL = new Attitude(0, 0, 0, 0, 6);

  double headingAt(double timeS) {
    return headingDeg + headingSwingDeg * FastMath.sin(2 * FastMath.PI * timeS / (5 * periodS));
  }

  double pitchAt(double timeS) {
    return pitchDeg * FastMath.sin(2 * FastMath.PI * timeS / periodS);
  }

  double rollAt(double timeS) {
    return rollDeg * FastMath.cos(2 * FastMath.PI * timeS / periodS);
  }
}
