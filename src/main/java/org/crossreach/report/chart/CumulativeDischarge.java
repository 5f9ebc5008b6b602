package org.crossreach.report.chart;

/**
 * The discharge that flows between the left bank and a place.
 *
 * @param panels what flows between the edges
 * @param widthM width from bank to bank (m)
 * @param leftEdgeM3s discharge of the left edge (m³/s)
 * @param rightEdgeM3s discharge of the right edge (m³/s)
 */
record CumulativeDischarge(
    DischargePanels panels, double widthM, double leftEdgeM3s, double rightEdgeM3s) {

  /**
   * The place up to which a share of the whole discharge flows (m from the left bank); NaN where
   * some water flows back, since then there may be several.
   *
   * @param share more than 0 and less than 1 (a half → 0.5)
   */
  double stationM(double share) {
    int n = panels.count() + 2;
    double total = 0;
    for (int k = 0; k < n; k++) {
      total += part(k);
    }
    double sum = 0;
    double station = Double.NaN;
    for (int k = 0; k < n; k++) {
      double part = part(k) / total;
      if (!(part >= 0)) {
        return Double.NaN;
      }
      if (Double.isNaN(station) && part > 0 && sum + part >= share) {
        station = from(k) + (share - sum) / part * (from(k + 1) - from(k));
      }
      sum += part;
    }
    return station;
  }

  /** Discharge of the left edge, the panels and the right edge in turn (m³/s). */
  private double part(int k) {
    if (k == 0) {
      return leftEdgeM3s;
    }
    return k > panels.count() ? rightEdgeM3s : panels.dischargeM3s(k - 1);
  }

  private double from(int k) {
    if (k == 0) {
      return 0;
    }
    return k > panels.count() + 1 ? widthM : panels.fromM(k - 1);
  }
}
