package org.crossreach.simulate;

import java.util.TreeSet;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.util.FastMath;

/**
 * A straight reach: everything depends on the station alone, counted from the left end of the
 * section looking downstream.
 *
 * @param sectionAzimuthDeg azimuth of the section from left to right (deg from true north)
 * @param bed depth by station (m); its ends are the edges of the water
 * @param velocity depth-mean velocity normal to the section by station (m/s), before the banks'
 *     laws
 * @param leftBank fall-off of velocity at the left bank
 * @param rightBank fall-off of velocity at the right bank
 * @param vertical distribution over the vertical
 * @param skewDeg angle of the flow to the normal of the section (deg), positive when it flows
 *     towards the right bank
 * @param time factor of all velocities over time
 */
public record River(
    double sectionAzimuthDeg,
    Polyline bed,
    Polyline velocity,
    BankLaw leftBank,
    BankLaw rightBank,
    VerticalLaw vertical,
    double skewDeg,
    TimeFactor time) {

  private static final int MOST_EVALUATIONS = 10_000_000;
  private static final int ROOT = 8;

  private static final int POINTS = 16;
  private static final double RELATIVE_ACCURACY = 1e-11;
  private static final double ABSOLUTE_ACCURACY = 1e-12;

  /** Width of the water surface (m). */
  public double widthM() {
    return bed.lastM() - bed.firstM();
  }

  /** Depth at a station (m). */
  public double depthM(double stationM) {
    return bed.at(stationM);
  }

  /** Depth-mean velocity normal to the section at a station (m/s), for a time factor of 1. */
  public double meanVelocityMps(double stationM) {
    return velocity.at(stationM)
        * leftBank.factor(stationM - bed.firstM())
        * rightBank.factor(bed.lastM() - stationM);
  }

  /** Velocity along the section over velocity normal to it, positive to the right bank. */
  double alongOverNormal() {
    return FastMath.tan(FastMath.toRadians(skewDeg));
  }

  /** Discharge between two stations (m³/s), for a time factor of 1, by quadrature. */
  public double dischargeM3s(double fromM, double toM) {
    return integral(x -> meanVelocityMps(x) * depthM(x), fromM, toM);
  }

  /** Area between two stations (m²), by quadrature. */
  public double areaM2(double fromM, double toM) {
    return integral(this::depthM, fromM, toM);
  }

  private double integral(UnivariateFunction function, double fromM, double toM) {
    TreeSet<Double> ends = new TreeSet<>();
    for (double[] stations :
        new double[][] {
          bed.stationsM(),
          velocity.stationsM(),
          {bed.firstM() + leftBank.widthM(), bed.lastM() - rightBank.widthM(), fromM, toM}
        }) {
      for (double station : stations) {
        if (station >= fromM && station <= toM) {
          ends.add(station);
        }
      }
    }
    double sum = 0;
    double before = fromM;
    for (double end : ends) {
      if (end > before) {
        sum += piece(function, before, end);
        before = end;
      }
    }
    return sum;
  }

  /**
   * Integral over a piece without corners. Within a bank's width the variable is the {@value
   * #ROOT}th root of the distance from the bank, in which even a steep fall-off is smooth.
   */
  private double piece(UnivariateFunction function, double from, double to) {
    double left = bed.firstM();
    double right = bed.lastM();
    if (to <= left + leftBank.widthM()) {
      return quadrature(v -> jacobian(v) * function.value(left + power(v)), from - left, to - left);
    }
    if (from >= right - rightBank.widthM()) {
      return quadrature(
          v -> jacobian(v) * function.value(right - power(v)), right - to, right - from);
    }
    return integrator().integrate(MOST_EVALUATIONS, function, from, to);
  }

  private static IterativeLegendreGaussIntegrator integrator() {
    return new IterativeLegendreGaussIntegrator(POINTS, RELATIVE_ACCURACY, ABSOLUTE_ACCURACY);
  }

  private static double quadrature(UnivariateFunction function, double near, double far) {
    return integrator()
        .integrate(
            MOST_EVALUATIONS,
            function,
            FastMath.pow(FastMath.max(0, near), 1.0 / ROOT),
            FastMath.pow(far, 1.0 / ROOT));
  }

  private static double power(double v) {
    return FastMath.pow(v, ROOT);
  }

  private static double jacobian(double v) {
    return ROOT * FastMath.pow(v, ROOT - 1);
  }
}
