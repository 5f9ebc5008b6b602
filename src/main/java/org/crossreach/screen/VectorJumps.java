package org.crossreach.screen;

import java.util.Arrays;

/**
 * Horizontal vectors in time, of which some jump out of line.
 *
 * <p>A vector jumps when it departs by more than a limit from the running median, by component, and
 * by more than a share of the limit both from the mean of its two neighbours and from the cubic
 * through its four neighbours: a step or a steady change departs from none of them, a turn or a
 * wave not from the cubic. The search is made twice, so that of two jumps in a row the one that hid
 * behind the other is found. Missing vectors are passed over. The first and the last vector are not
 * judged.
 */
final class VectorJumps {

  /** Neighbours on either side that the running median takes. */
  private static final int REACH = 3;

  /**
   * Departure from what the neighbours lead to expect, as a share of the limit. Of two equal jumps
   * in a row each departs by half of its size from the mean and by a third from the cubic.
   */
  private static final double BESIDE_SHARE = 0.3;

  private final double[] east;
  private final double[] north;

  /**
   * Takes the vectors (m/s); both components are NaN where one is missing.
   *
   * @param east eastward components
   * @param north northward components
   */
  VectorJumps(double[] east, double[] north) {
    this.east = east;
    this.north = north;
  }

  /**
   * The limit that the vectors' own distribution gives: their departures from the mean of two
   * neighbours scatter by the square root of 1.5 more than they do themselves (m/s), NaN of no
   * vectors.
   *
   * @param least smallest limit (m/s)
   */
  double automatic(double least) {
    return AutomaticLimit.vector(scatter(east), scatter(north), least);
  }

  /** Median length of the vectors (m/s), NaN of none. */
  double medianLength() {
    Sample lengths = new Sample();
    for (int i = 0; i < east.length; i++) {
      lengths.add(length(east[i], north[i]));
    }
    return lengths.median();
  }

  private static RobustScale scatter(double[] values) {
    Sample sample = new Sample();
    sample.addScatter(values, false);
    return sample.scale();
  }

  /**
   * Which vectors jump.
   *
   * @param limit largest departure (m/s)
   * @param least limit (m/s) on top of which change across is allowed
   */
  boolean[] beyond(double limit, double least) {
    boolean[] first = search(limit, least);
    double[] restEast = east.clone();
    double[] restNorth = north.clone();
    for (int i = 0; i < first.length; i++) {
      if (first[i]) {
        restEast[i] = Double.NaN;
        restNorth[i] = Double.NaN;
      }
    }
    boolean[] second = new VectorJumps(restEast, restNorth).search(limit, least);
    for (int i = 0; i < first.length; i++) {
      first[i] |= second[i];
    }
    return first;
  }

  private boolean[] search(double limit, double least) {
    int[] present = present();
    boolean[] jumps = new boolean[east.length];
    double beside = BESIDE_SHARE * limit;
    for (int p = 1; p + 1 < present.length; p++) {
      jumps[present[p]] =
          fromMean(present, p) > beside
              && (p < 2 || p + 2 >= present.length || fromCubic(present, p) > beside)
              && departs(present[p], limit, least);
    }
    return jumps;
  }

  private boolean departs(int i, double limit, double least) {
    double change =
        length(
            RunningMedian.beside(east, i, REACH, 1) - RunningMedian.beside(east, i, REACH, -1),
            RunningMedian.beside(north, i, REACH, 1) - RunningMedian.beside(north, i, REACH, -1));
    double departure =
        length(
            east[i] - RunningMedian.at(east, i, REACH),
            north[i] - RunningMedian.at(north, i, REACH));
    return departure > Math.max(limit, least + 0.5 * change);
  }

  private int[] present() {
    int[] present = new int[east.length];
    int size = 0;
    for (int i = 0; i < east.length; i++) {
      if (!Double.isNaN(east[i])) {
        present[size++] = i;
      }
    }
    return Arrays.copyOf(present, size);
  }

  private double fromMean(int[] present, int p) {
    int here = present[p];
    int before = present[p - 1];
    int after = present[p + 1];
    return length(
        east[here] - 0.5 * (east[before] + east[after]),
        north[here] - 0.5 * (north[before] + north[after]));
  }

  private double fromCubic(int[] present, int p) {
    return length(fromCubic(east, present, p), fromCubic(north, present, p));
  }

  private static double fromCubic(double[] values, int[] present, int p) {
    double near = values[present[p - 1]] + values[present[p + 1]];
    double far = values[present[p - 2]] + values[present[p + 2]];
    return values[present[p]] - (4 * near - far) / 6;
  }

  private static double length(double x, double y) {
    return Math.sqrt(x * x + y * y);
  }
}
