package org.crossreach.screen;

import java.util.List;

/**
 * Four slant beams as an instrument for velocity: the components in the instrument's axes (x to
 * starboard, y forward, z up) that fit the radial velocities of the beams best.
 *
 * <p>A beam at azimuth a, clockwise from forward seen from above, and at angle t from the vertical
 * points along {@code (sin t sin a, sin t cos a, -cos t)} away from the face; its radial velocity,
 * positive towards the face, is the negative of the velocity's component along it. Four radial
 * velocities leave three components and one combination that every velocity leaves at 0: the null
 * vector of the layout. Multiplied with the beams, and scaled so that its noise is that of a
 * horizontal component (the root mean square of the two, where the layout makes them differ), it is
 * the error velocity. For beams at right angles it is {@code (b1 + b2 - b3 - b4) / (2 sqrt(2) sin
 * t)}, 1 and 2 being opposite.
 *
 * <p>When one beam is missing, it takes the value that leaves the error velocity at 0, and no error
 * velocity is left: a three-beam solution.
 *
 * <p>Source: geometry derived from {@code formats/}; the scaling of the error velocity as in Lu and
 * Lueck 1999, Journal of Atmospheric and Oceanic Technology 16, 1556 (from memory). Immutable.
 */
final class BeamLayout {

  static final int BEAMS = 4;

  /** Determinant of the normal equations below which beams lie in one plane, for unit vectors. */
  private static final double SINGULAR = 1e-9;

  /** Size of a beam's part of the null vector below which the other beams lie in one plane. */
  private static final double PLANE = 1e-6;

  private final double[] x = new double[BEAMS];
  private final double[] y = new double[BEAMS];
  private final double[] z = new double[BEAMS];
  private final double[] nil = new double[BEAMS];
  private final double errorScale;

  /**
   * Lays out the beams.
   *
   * @param beamAngleDeg angle of the beams from the vertical (deg), for example 20
   * @param azimuthsDeg azimuth of each beam clockwise from the forward axis (deg)
   * @throws IllegalArgumentException when there are not four azimuths, or the beams do not span the
   *     three axes
   */
  BeamLayout(double beamAngleDeg, List<Double> azimuthsDeg) {
    if (azimuthsDeg.size() != BEAMS) {
      throw new IllegalArgumentException(
          "azimuthsDeg must hold " + BEAMS + " azimuths, not " + azimuthsDeg.size());
    }
    double[][] towards = new double[BEAMS][];
    double angle = Math.toRadians(beamAngleDeg);
    for (int b = 0; b < BEAMS; b++) {
      double azimuth = Math.toRadians(azimuthsDeg.get(b));
      towards[b] =
          new double[] {
            -StrictMath.sin(angle) * StrictMath.sin(azimuth),
            -StrictMath.sin(angle) * StrictMath.cos(azimuth),
            StrictMath.cos(angle)
          };
    }
    double[][] inverse = inverseOfNormalEquations(towards);
    for (int b = 0; b < BEAMS; b++) {
      x[b] = dot(inverse[0], towards[b]);
      y[b] = dot(inverse[1], towards[b]);
      z[b] = dot(inverse[2], towards[b]);
      nil[b] = (b % 2 == 0 ? 1 : -1) * determinantWithout(towards, b);
    }
    double length = 0;
    for (double each : nil) {
      length += each * each;
    }
    length = (nil[0] < 0 ? -1 : 1) * Math.sqrt(length);
    for (int b = 0; b < BEAMS; b++) {
      nil[b] /= length;
    }
    errorScale = Math.sqrt((inverse[0][0] + inverse[1][1]) / 2);
  }

  private static double[][] inverseOfNormalEquations(double[][] rows) {
    double[][] m = new double[3][3];
    for (double[] row : rows) {
      for (int i = 0; i < 3; i++) {
        for (int j = 0; j < 3; j++) {
          m[i][j] += row[i] * row[j];
        }
      }
    }
    double determinant = determinant(m[0], m[1], m[2]);
    if (!(determinant > SINGULAR)) {
      throw new IllegalArgumentException(
          "azimuthsDeg and beamAngleDeg must let the beams span all three axes");
    }
    double[][] inverse = new double[3][3];
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        int r = (j + 1) % 3;
        int s = (j + 2) % 3;
        int c = (i + 1) % 3;
        int d = (i + 2) % 3;
        inverse[i][j] = (m[r][c] * m[s][d] - m[r][d] * m[s][c]) / determinant;
      }
    }
    return inverse;
  }

  private static double determinantWithout(double[][] rows, int left) {
    double[][] kept = new double[3][];
    int j = 0;
    for (int b = 0; b < BEAMS; b++) {
      if (b != left) {
        kept[j++] = rows[b];
      }
    }
    return determinant(kept[0], kept[1], kept[2]);
  }

  private static double determinant(double[] a, double[] b, double[] c) {
    return a[0] * (b[1] * c[2] - b[2] * c[1])
        - a[1] * (b[0] * c[2] - b[2] * c[0])
        + a[2] * (b[0] * c[1] - b[1] * c[0]);
  }

  private static double dot(double[] a, double[] b) {
    return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
  }

  /** Error velocity per radial velocity of a beam: its share in the error velocity. */
  double errorPerBeam(int beam) {
    return errorScale * nil[beam];
  }

  /**
   * Turns radial velocities into components, in place and in the unit given.
   *
   * <p>With one beam missing the error velocity comes out NaN; with more, everything.
   *
   * @param c1 beam 1 on entry, x on return
   * @param c2 beam 2 on entry, y on return
   * @param c3 beam 3 on entry, z on return
   * @param c4 beam 4 on entry, error velocity on return
   * @param size how many of each
   * @param left index of a beam that is not to be used, -1 for none
   */
  void solve(double[] c1, double[] c2, double[] c3, double[] c4, int size, int left) {
    for (int k = 0; k < size; k++) {
      double b1 = left == 0 ? Double.NaN : c1[k];
      double b2 = left == 1 ? Double.NaN : c2[k];
      double b3 = left == 2 ? Double.NaN : c3[k];
      double b4 = left == 3 ? Double.NaN : c4[k];
      double error = errorScale * (nil[0] * b1 + nil[1] * b2 + nil[2] * b3 + nil[3] * b4);
      if (Double.isNaN(error)) {
        double rest = present(nil[0], b1) + present(nil[1], b2);
        rest += present(nil[2], b3) + present(nil[3], b4);
        // With more than one beam missing, those that remain so make everything NaN.
        if (Double.isNaN(b1)) {
          b1 = other(rest, nil[0]);
        } else if (Double.isNaN(b2)) {
          b2 = other(rest, nil[1]);
        } else if (Double.isNaN(b3)) {
          b3 = other(rest, nil[2]);
        } else {
          b4 = other(rest, nil[3]);
        }
      }
      c1[k] = x[0] * b1 + x[1] * b2 + x[2] * b3 + x[3] * b4;
      c2[k] = y[0] * b1 + y[1] * b2 + y[2] * b3 + y[3] * b4;
      c3[k] = z[0] * b1 + z[1] * b2 + z[2] * b3 + z[3] * b4;
      c4[k] = error;
    }
  }

  /** The missing beam's value; NaN when the other three lie in one plane and cannot tell it. */
  private static double other(double rest, double weight) {
    return Math.abs(weight) > PLANE ? -rest / weight : Double.NaN;
  }

  private static double present(double weight, double beam) {
    return Double.isNaN(beam) ? 0 : weight * beam;
  }
}
