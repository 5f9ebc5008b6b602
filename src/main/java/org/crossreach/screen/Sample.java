package org.crossreach.screen;

import java.util.Arrays;

/** Numbers collected for a statistic. */
final class Sample {

  /** How many numbers are enough: the spread of so many is known to 1.2 %. */
  static final int ENOUGH = 10_000;

  private static final double SCATTER_OF_DEPARTURE = Math.sqrt(1.5);

  private double[] values = new double[1024];
  private int size;

  /**
   * Every how manieth ensemble has to be looked at to come to {@link #ENOUGH} numbers, at least 1.
   *
   * @param ensembles number of ensembles
   * @param perEnsemble numbers that an ensemble gives
   */
  static int stride(int ensembles, int perEnsemble) {
    return (int) Math.max(1, (long) ensembles * perEnsemble / ENOUGH);
  }

  /** Adds a number, unless it is NaN. */
  void add(double value) {
    if (Double.isNaN(value)) {
      return;
    }
    if (size == values.length) {
      values = Arrays.copyOf(values, 2 * size);
    }
    values[size++] = value;
  }

  /**
   * Adds how a column scatters about its own course: its values' departures from the mean of their
   * two neighbours, divided by the square root of 1.5, by which these scatter more than independent
   * values do. Missing values are passed over; of a long column every few are enough.
   *
   * @param values the column, NaN where missing
   * @param asShare whether departures are taken as a share of that mean
   */
  void addScatter(double[] values, boolean asShare) {
    int stride = stride(values.length, 1);
    int seen = 0;
    double before = Double.NaN;
    double here = Double.NaN;
    for (double after : values) {
      if (Double.isNaN(after)) {
        continue;
      }
      if (seen++ % stride == 0) {
        double mean = 0.5 * (before + after);
        add((here - mean) / (asShare ? mean : 1) / SCATTER_OF_DEPARTURE);
      }
      before = here;
      here = after;
    }
  }

  int size() {
    return size;
  }

  /** The numbers, of which the first {@link #size()} count; not to be kept. */
  double[] values() {
    return values;
  }

  /** Median and spread; the sample is spent by the call. */
  RobustScale scale() {
    RobustScale scale = RobustScale.of(values, size);
    size = 0;
    return scale;
  }

  /** Median; the sample is spent by the call. */
  double median() {
    double median = Median.of(values, size);
    size = 0;
    return median;
  }
}
