package org.crossreach.simulate;

/**
 * Random errors.
 *
 * @param waterMps standard deviation of a horizontal component of a cell's velocity (m/s)
 * @param boatMps standard deviation of a horizontal component of the bottom-track velocity (m/s)
 * @param depthShare standard deviation of a beam's depth as a share of it (0.01 = 1 %)
 * @param turbulenceShare standard deviation of the slow fluctuation of all velocities of a column,
 *     as a share of them (0.05 = 5 %)
 * @param turbulenceS time over which that fluctuation stays correlated (s), above 0
 */
public record Noise(
    double waterMps,
    double boatMps,
    double depthShare,
    double turbulenceShare,
    double turbulenceS) {

  /** No errors at all. */
  public static final Noise NONE = new Noise(0, 0, 0, 0, 10);
}
