package org.crossreach.discharge;

import java.util.List;

/**
 * Discharge by zone (m³/s), positive downstream.
 *
 * @param top between the highest usable cells and the surface
 * @param measured between the highest and the lowest usable cells
 * @param bottom between the lowest usable cells and the bed
 * @param leftEdge between the boat and the left bank
 * @param rightEdge between the boat and the right bank
 */
public record ZoneDischarge(
    double top, double measured, double bottom, double leftEdge, double rightEdge) {

  /** Sum of all zones (m³/s). */
  public double total() {
    return top + measured + bottom + leftEdge + rightEdge;
  }

  /** Mean of several, zone by zone; all NaN when there is none. */
  public static ZoneDischarge mean(List<ZoneDischarge> all) {
    double[] sum = new double[5];
    for (ZoneDischarge each : all) {
      sum[0] += each.top;
      sum[1] += each.measured;
      sum[2] += each.bottom;
      sum[3] += each.leftEdge;
      sum[4] += each.rightEdge;
    }
    int n = all.size();
    return new ZoneDischarge(sum[0] / n, sum[1] / n, sum[2] / n, sum[3] / n, sum[4] / n);
  }
}
