package org.crossreach.screen;

/**
 * Medians of the values beside one value of a column. Missing values are passed over.
 *
 * <p>Found where they are asked for, since nearly every value is settled without.
 */
final class RunningMedian {

  private RunningMedian() {}

  /**
   * The median of a value with its neighbours on both sides, the same number on either side, so
   * that a column that only rises or only falls comes back unchanged, and a step stays a step. The
   * first and the last value have no neighbour on one side and come back unchanged.
   *
   * @param values the column, NaN where missing
   * @param i which value, not missing
   * @param reach most neighbours taken on either side, at least 1
   */
  static double at(double[] values, int i, int reach) {
    double[] window = new double[2 * reach + 1];
    int size = 0;
    int before = i;
    int after = i;
    window[size++] = values[i];
    for (int n = 0; n < reach; n++) {
      before = next(values, before, -1);
      after = next(values, after, 1);
      if (before < 0 || after >= values.length) {
        break;
      }
      window[size++] = values[before];
      window[size++] = values[after];
    }
    return Median.of(window, size);
  }

  /**
   * The median of the values on one side of a value.
   *
   * @param values the column, NaN where missing
   * @param i which value
   * @param count most values taken, at least 1
   * @param way -1 for those before, 1 for those after
   * @return NaN when there is none on that side
   */
  static double beside(double[] values, int i, int count, int way) {
    double[] window = new double[count];
    int size = 0;
    for (int j = next(values, i, way); size < count && j >= 0 && j < values.length; ) {
      window[size++] = values[j];
      j = next(values, j, way);
    }
    return Median.of(window, size);
  }

  /** Index of the next value that is not missing, beyond the column's end when there is none. */
  static int next(double[] values, int i, int way) {
    int j = i + way;
    while (j >= 0 && j < values.length && Double.isNaN(values[j])) {
      j += way;
    }
    return j;
  }
}
