package org.crossreach.agreement;

import org.apache.commons.math3.distribution.TDistribution;

/**
 * Mean and spread of one quantity over passes, in the quantity's unit.
 *
 * <ul>
 *   <li>No value: everything is NaN.
 *   <li>One value: the mean is it, everything else is NaN.
 *   <li>Mean of 0: what is given in percent of the mean is NaN.
 * </ul>
 *
 * @param count number of values
 * @param mean arithmetic mean
 * @param sd standard deviation with n - 1
 * @param covPct coefficient of variation: sd in percent of the mean's size
 * @param rangePct largest minus smallest value in percent of the mean's size
 * @param ci95Half half-width of the 95 % interval of the mean: {@code t(0.975, n - 1) sd / sqrt(n)}
 */
public record Spread(
    int count, double mean, double sd, double covPct, double rangePct, double ci95Half) {

  /** Mean and spread of some values. */
  public static Spread of(double... values) {
    int n = values.length;
    double mean = mean(values);
    double sd = standardDeviation(values, mean);
    return new Spread(
        n, mean, sd, percent(sd, mean), percent(range(values), mean), halfWidth(sd, n));
  }

  /** Departure of a value from the mean in percent of the mean's size, NaN when the mean is 0. */
  public double deviationPct(double value) {
    return percent(value - mean, mean);
  }

  /** A part in percent of the size of a whole, NaN when the whole is 0. */
  static double percent(double part, double whole) {
    return whole == 0 ? Double.NaN : 100 * part / Math.abs(whole);
  }

  /** Arithmetic mean, corrected for the rounding of its first pass; NaN of nothing. */
  private static double mean(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += value;
    }
    double first = sum / values.length;
    double rest = 0;
    for (double value : values) {
      rest += value - first;
    }
    return first + rest / values.length;
  }

  private static double standardDeviation(double[] values, double mean) {
    if (values.length < 2) {
      return Double.NaN;
    }
    double squares = 0;
    for (double value : values) {
      squares += (value - mean) * (value - mean);
    }
    return Math.sqrt(squares / (values.length - 1));
  }

  private static double range(double[] values) {
    if (values.length < 2) {
      return Double.NaN;
    }
    double least = values[0];
    double most = values[0];
    for (double value : values) {
      least = Math.min(least, value);
      most = Math.max(most, value);
    }
    return most - least;
  }

  private static double halfWidth(double sd, int n) {
    if (n < 2) {
      return Double.NaN;
    }
    double t = new TDistribution(null, n - 1).inverseCumulativeProbability(0.975);
    return t * sd / Math.sqrt(n);
  }
}
