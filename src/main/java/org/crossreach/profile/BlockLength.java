package org.crossreach.profile;

/**
 * How many neighbours belong in a block so that blocks hardly depend on each other: four times the
 * spacing of independent values, {@code (1 + r) / (1 - r)} for a series whose correlation of
 * neighbours is r and falls off geometrically, but at most a fifteenth of the series.
 */
public final class BlockLength {

  private static final double SPACINGS = 4;
  private static final double MOST_CORRELATION = 0.95;
  private static final int FEWEST_BLOCKS = 15;

  private BlockLength() {}

  /** Length of a block for a series of values, at least 1. */
  public static int of(double[] series) {
    int n = series.length;
    double mean = 0;
    for (double value : series) {
      mean += value / n;
    }
    double own = 0;
    double next = 0;
    for (int i = 0; i < n; i++) {
      own += (series[i] - mean) * (series[i] - mean);
      next += i + 1 < n ? (series[i] - mean) * (series[i + 1] - mean) : 0;
    }
    double correlation = own > 0 ? Math.max(0, Math.min(MOST_CORRELATION, next / own)) : 0;
    int wanted = (int) Math.ceil(SPACINGS * (1 + correlation) / (1 - correlation));
    return Math.max(1, Math.min(wanted, n / FEWEST_BLOCKS));
  }
}
