package org.crossreach.screen;

/**
 * Horizontal vectors in time, of which some jump out of line.
 *
 * <p>A vector jumps when it departs by more than a limit from the running median, by component, and
 * by more than two fifths of it from the mean of its two neighbours: a step or a steady change
 * departs from neither, a sharp turn only from the first; of two jumps in a row each is half of
 * what the other departs by. Missing vectors are passed over. The first and the last vector are not
 * judged.
 */
final class VectorJumps {

  /** Neighbours on either side that the running median takes. */
  private static final int REACH = 3;

  /**
   * Departure from the mean of the neighbours that counts, as a share of the limit. Of two equal
   * jumps in a row each departs by half.
   */
  private static final double BESIDE_SHARE = 0.4;

  private final double[] east;
  private final double[] north;
  private final double[] middleEast;
  private final double[] middleNorth;

  /**
   * Takes the vectors (m/s); both components are NaN where one is missing.
   *
   * @param east eastward components
   * @param north northward components
   */
  VectorJumps(double[] east, double[] north) {
    this.east = east;
    this.north = north;
    middleEast = RunningMedian.of(east, REACH);
    middleNorth = RunningMedian.of(north, REACH);
  }

  /**
   * The limit that the vectors' own distribution gives: their departures from the mean of two
   * neighbours scatter by the square root of 1.5 more than they do themselves (m/s), NaN of no
   * vectors.
   *
   * @param least smallest limit (m/s)
   * @param leastShare smallest limit as a share of the median length
   */
  double automatic(double least, double leastShare) {
    Sample lengths = new Sample();
    for (int i = 0; i < east.length; i++) {
      lengths.add(length(east[i], north[i]));
    }
    if (lengths.size() == 0) {
      return Double.NaN;
    }
    double floor = Math.max(least, leastShare * lengths.median());
    return AutomaticLimit.vector(scatter(east), scatter(north), floor);
  }

  private static RobustScale scatter(double[] values) {
    Sample sample = new Sample();
    sample.addScatter(values, false);
    return sample.scale();
  }

  /** Which vectors jump by more than a limit (m/s). */
  boolean[] beyond(double limit) {
    boolean[] jumps = new boolean[east.length];
    int before = -1;
    int here = -1;
    for (int after = 0; after < east.length; after++) {
      if (Double.isNaN(east[after])) {
        continue;
      }
      if (before >= 0) {
        double beside = departureFromMean(before, here, after);
        double running = length(east[here] - middleEast[here], north[here] - middleNorth[here]);
        jumps[here] = running > limit && beside > BESIDE_SHARE * limit;
      }
      before = here;
      here = after;
    }
    return jumps;
  }

  private double departureFromMean(int before, int here, int after) {
    return length(
        east[here] - 0.5 * (east[before] + east[after]),
        north[here] - 0.5 * (north[before] + north[after]));
  }

  private static double length(double x, double y) {
    return Math.sqrt(x * x + y * y);
  }
}
