package org.crossreach.survey;

/** Fills the gaps of a column of numbers. */
public final class Gaps {

  private Gaps() {}

  /**
   * A copy in which every NaN is replaced: linearly in {@code position} between the nearest
   * neighbours that have a value, by the nearest one before the first and after the last.
   *
   * @param values the column, NaN where missing
   * @param position where each value stands, not decreasing; where both neighbours stand at one
   *     place the gap takes their mean
   * @return the filled copy; all NaN when the column has no value at all
   */
  public static double[] fillLinear(double[] values, double[] position) {
    double[] filled = values.clone();
    int previous = -1;
    for (int i = 0; i < filled.length; i++) {
      if (Double.isNaN(values[i])) {
        continue;
      }
      for (int gap = previous + 1; gap < i; gap++) {
        filled[gap] = previous < 0 ? values[i] : between(values, position, previous, i, gap);
      }
      previous = i;
    }
    for (int gap = previous + 1; gap < filled.length && previous >= 0; gap++) {
      filled[gap] = values[previous];
    }
    return filled;
  }

  private static double between(double[] values, double[] position, int a, int b, int i) {
    double span = position[b] - position[a];
    double weight = span > 0 ? (position[i] - position[a]) / span : 0.5;
    return values[a] + weight * (values[b] - values[a]);
  }
}
