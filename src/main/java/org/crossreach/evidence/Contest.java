package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Which of several contestants has the smallest error, so far as resampled errors can tell.
 *
 * @param order every contestant from the best to the worst: those that cannot be told from the one
 *     with the smallest error by the given order of preference, then the others by their error
 * @param equals how many of the order's first cannot be told apart
 */
record Contest(List<Integer> order, int equals) {

  /** A contestant is worse when its error is larger in more than this share of the resamples. */
  private static final double CERTAIN = 0.95;

  /**
   * Holds a contest.
   *
   * @param error size of each contestant's error, at least 0
   * @param drawn the same in each resample: {@code drawn[resample][contestant]}
   * @param negligible how much larger an error may be and still count as equal, in its unit
   * @param preference which of two equals is taken: the one with the smaller number
   */
  static Contest of(double[] error, double[][] drawn, double negligible, double[] preference) {
    int n = error.length;
    int first = 0;
    for (int k = 1; k < n; k++) {
      first = error[k] < error[first] ? k : first;
    }
    List<Integer> equals = new ArrayList<>();
    List<Integer> worse = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      int larger = 0;
      for (double[] each : drawn) {
        larger += each[k] > each[first] ? 1 : 0;
      }
      boolean isWorse = larger > CERTAIN * drawn.length && error[k] > error[first] + negligible;
      (isWorse ? worse : equals).add(k);
    }
    equals.sort((a, b) -> Double.compare(preference[a], preference[b]));
    worse.sort((a, b) -> Double.compare(error[a], error[b]));
    List<Integer> order = new ArrayList<>(equals);
    order.addAll(worse);
    return new Contest(List.copyOf(order), equals.size());
  }

  /** The contestant in the first place. */
  int first() {
    return order.get(0);
  }

  /** Those that cannot be told from the best. */
  List<Integer> equal() {
    return order.subList(0, equals);
  }

  /** The value below which 95 % of some values lie; they are sorted by the call. */
  static double most(double[] values) {
    Arrays.sort(values);
    return values[(int) Math.ceil(CERTAIN * values.length) - 1];
  }
}
