package org.crossreach.simulate;

import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import org.apache.commons.math3.util.FastMath;

/**
 * Four slant beams: their radial velocities, positive towards the transducer, and what instrument
 * axes (x starboard, y forward, z up) make of errors of the beams.
 *
 * <p>With the beam angle t and the azimuth a of a beam, the unit vector away from the face is
 * {@code (sin t sin a, sin t cos a, -cos t)}.
 */
final class BeamAxes {

  private static final int BEAMS = 4;

  private final double[][] away = new double[BEAMS][];
  private final RealMatrix fromBeams;
  private final double[] error = new double[BEAMS];
  private final double beamOverHorizontal;

  BeamAxes(double beamAngleDeg, List<Double> azimuthsDeg) {
    double sin = FastMath.sin(FastMath.toRadians(beamAngleDeg));
    double cos = FastMath.cos(FastMath.toRadians(beamAngleDeg));
    double[][] towards = new double[BEAMS][3];
    for (int beam = 0; beam < BEAMS; beam++) {
      double a = FastMath.toRadians(azimuthsDeg.get(beam));
      away[beam] = new double[] {sin * FastMath.sin(a), sin * FastMath.cos(a), -cos};
      for (int axis = 0; axis < 3; axis++) {
        towards[beam][axis] = -away[beam][axis];
      }
    }
    RealMatrix matrix = new Array2DRowRealMatrix(towards);
    fromBeams = new SingularValueDecomposition(matrix).getSolver().getInverse();
    beamOverHorizontal = FastMath.sqrt(2) * sin;
    RealMatrix residual = matrix.multiply(fromBeams).scalarMultiply(-1);
    for (int beam = 0; beam < BEAMS; beam++) {
      residual.addToEntry(beam, beam, 1);
    }
    // The residual matrix is n n' for the unit null vector n: its first row is n[0] n.
    double first = FastMath.sqrt(residual.getEntry(0, 0));
    for (int beam = 0; beam < BEAMS; beam++) {
      error[beam] = residual.getEntry(0, beam) / first / beamOverHorizontal;
    }
  }

  /** Standard deviation of a beam over that of a horizontal component, for crossed beam pairs. */
  double beamOverHorizontal() {
    return beamOverHorizontal;
  }

  /** Radial velocity of a beam, positive towards the transducer, of something that moves with v. */
  double towards(int beam, double[] v) {
    return -(away[beam][0] * v[0] + away[beam][1] * v[1] + away[beam][2] * v[2]);
  }

  /** What the beams' velocities make in instrument axes: x, y, z and error velocity. */
  double[] fromBeams(double[] beams) {
    double[] axes = new double[4];
    for (int beam = 0; beam < BEAMS; beam++) {
      for (int axis = 0; axis < 3; axis++) {
        axes[axis] += fromBeams.getEntry(axis, beam) * beams[beam];
      }
      axes[3] += error[beam] * beams[beam];
    }
    return axes;
  }
}
