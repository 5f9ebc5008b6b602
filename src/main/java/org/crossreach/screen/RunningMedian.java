package org.crossreach.screen;

/**
 * The running median of a column: each value's median with its neighbours on both sides.
 *
 * <p>The same number of neighbours is taken on either side, so that a column that only rises or
 * only falls comes back unchanged, and a step stays a step. Missing values are passed over; the
 * first and the last value have no neighbour on one side and come back unchanged.
 */
final class RunningMedian {

  private RunningMedian() {}

  /**
   * The running median of a column.
   *
   * @param values the column, NaN where missing
   * @param reach most neighbours taken on either side, at least 1
   * @return as many values, NaN where the column has none
   */
  static double[] of(double[] values, int reach) {
    double[] present = new double[values.length];
    int size = 0;
    for (double value : values) {
      if (!Double.isNaN(value)) {
        present[size++] = value;
      }
    }
    double[] window = new double[2 * reach + 1];
    double[] result = new double[values.length];
    int at = 0;
    for (int i = 0; i < values.length; i++) {
      if (Double.isNaN(values[i])) {
        result[i] = Double.NaN;
        continue;
      }
      int side = Math.min(reach, Math.min(at, size - 1 - at));
      System.arraycopy(present, at - side, window, 0, 2 * side + 1);
      result[i] = Median.of(window, 2 * side + 1);
      at++;
    }
    return result;
  }

  /**
   * The median of the values on one side of each value.
   *
   * @param values the column, NaN where missing
   * @param count most values taken, at least 1
   * @param way -1 for those before, 1 for those after
   * @return as many values, NaN where the column has none on that side
   */
  static double[] beside(double[] values, int count, int way) {
    double[] window = new double[count];
    double[] last = new double[count];
    double[] result = new double[values.length];
    int seen = 0;
    int first = way < 0 ? 0 : values.length - 1;
    for (int i = first; i >= 0 && i < values.length; i -= way) {
      int size = Math.min(seen, count);
      System.arraycopy(last, 0, window, 0, size);
      result[i] = Median.of(window, size);
      if (!Double.isNaN(values[i])) {
        last[seen % count] = values[i];
        seen++;
      }
    }
    return result;
  }
}
