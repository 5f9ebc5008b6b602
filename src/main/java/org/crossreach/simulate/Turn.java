package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * The turn between instrument axes (x starboard, y forward, z up) and east, north, up, for a
 * heading clockwise from north, a pitch positive bow up and a roll positive port side up: {@code
 * Rz(H) Rx(P) Ry(R)}.
 */
final class Turn {

  private final double[][] m;

  Turn(double headingDeg, double pitchDeg, double rollDeg) {
    double sh = FastMath.sin(FastMath.toRadians(headingDeg));
    double ch = FastMath.cos(FastMath.toRadians(headingDeg));
    double sp = FastMath.sin(FastMath.toRadians(pitchDeg));
    double cp = FastMath.cos(FastMath.toRadians(pitchDeg));
    double sr = FastMath.sin(FastMath.toRadians(rollDeg));
    double cr = FastMath.cos(FastMath.toRadians(rollDeg));
    m =
        new double[][] {
          {ch * cr + sh * sp * sr, sh * cp, ch * sr - sh * sp * cr},
          {-sh * cr + ch * sp * sr, ch * cp, -sh * sr - ch * sp * cr},
          {-cp * sr, sp, cp * cr}
        };
  }

  /** A vector of instrument axes on east, north, up. */
  double[] toEarth(double[] v) {
    double[] turned = new double[3];
    for (int i = 0; i < 3; i++) {
      turned[i] = m[i][0] * v[0] + m[i][1] * v[1] + m[i][2] * v[2];
    }
    return turned;
  }

  /** A vector on east, north, up in instrument axes. */
  double[] fromEarth(double[] v) {
    double[] turned = new double[3];
    for (int i = 0; i < 3; i++) {
      turned[i] = m[0][i] * v[0] + m[1][i] * v[1] + m[2][i] * v[2];
    }
    return turned;
  }
}
