package org.crossreach.report.chart;

import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The velocities that the colours have to cover (m/s): from the smallest to the largest that
 * matter, and always 0.
 *
 * @param lowest the 0.5th percentile of the usable cells, at most 0
 * @param highest the 99.5th percentile, more than {@code lowest}
 */
record VelocityRange(double lowest, double highest) {

  private static final int BINS = 2000;
  private static final double LEFT_OUT = 0.005;

  /** From the lowest to the highest (m/s). */
  double span() {
    return highest - lowest;
  }

  static VelocityRange of(Section section) {
    double least = 0;
    double most = 0;
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < section.size(); i++) {
      section.read(i, row, column);
      for (int j = 0; j < column.size(); j++) {
        double velocity = column.velocityMps(Component.NORMAL, j);
        least = Math.min(least, velocity);
        most = Math.max(most, velocity);
      }
    }
    if (!(most > least)) {
      return new VelocityRange(0, 1);
    }
    int[] bins = new int[BINS];
    int count = 0;
    for (int i = 0; i < section.size(); i++) {
      section.read(i, row, column);
      for (int j = 0; j < column.size(); j++) {
        double share = (column.velocityMps(Component.NORMAL, j) - least) / (most - least);
        bins[Math.min(BINS - 1, (int) (share * BINS))]++;
        count++;
      }
    }
    double width = (most - least) / BINS;
    return new VelocityRange(
        Math.min(0, least + width * bin(bins, LEFT_OUT * count)),
        Math.max(0, least + width * (1 + bin(bins, (1 - LEFT_OUT) * count))));
  }

  /** The first bin up to which a number of values lie. */
  private static int bin(int[] bins, double values) {
    int sum = 0;
    for (int b = 0; b < bins.length; b++) {
      sum += bins[b];
      if (sum > values) {
        return b;
      }
    }
    return bins.length - 1;
  }
}
