package org.crossreach.screen;

import org.crossreach.settings.Limit;

/**
 * Limits found in a pass's own distribution: a multiple of its robust spread, and never less than a
 * floor below which a departure is no fault but the river.
 *
 * <p>A Gaussian sample departs by more than {@value #SIGMAS} standard deviations once in 1.7
 * million, and by more than {@value #SIGMAS_OF_VECTOR} of the standard deviations of both
 * components together at most once in 16,000, when all of the scatter is along one axis (once in 9
 * million when it is the same on both). With 5 % outliers, which widen the spread by 7 %, outliers
 * of 10 standard deviations still lie 3 or more beyond the limit. Five is common practice.
 */
final class AutomaticLimit {

  /** Standard deviations allowed to a single component. */
  static final double SIGMAS = 5;

  /** Root sums of squares of both components' standard deviations allowed to a vector. */
  static final double SIGMAS_OF_VECTOR = 4;

  private AutomaticLimit() {}

  /** The limit of a departure on both sides of the median. */
  static double departure(RobustScale scale, double floor) {
    return Math.max(floor, SIGMAS * scale.sigma());
  }

  /** The limit of the length of a departure in two components. */
  static double vector(RobustScale first, RobustScale second, double floor) {
    double sigma = Math.sqrt(first.sigma() * first.sigma() + second.sigma() * second.sigma());
    return Math.max(floor, SIGMAS_OF_VECTOR * sigma);
  }

  /**
   * The lowest accepted value of a quantity that is bounded above: the spread is taken from the
   * values up to the median alone. NaN of no values.
   */
  static double lowest(Sample sample, double floor) {
    double[] values = sample.values();
    double median = Median.of(values, sample.size());
    Sample below = new Sample();
    for (int i = 0; i < sample.size(); i++) {
      if (values[i] <= median) {
        below.add(median - values[i]);
      }
    }
    double spread = RobustScale.SIGMA_PER_MAD * below.median();
    return median - Math.max(floor, SIGMAS * spread);
  }

  /** Whether a screen is on. */
  static boolean on(Limit limit) {
    return limit.kind() != Limit.Kind.OFF;
  }
}
