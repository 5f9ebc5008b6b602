package org.crossreach.screen;

/**
 * Limits by which a cell is judged by itself; NaN where a screen is off or has nothing to judge by.
 *
 * @param goodPct lowest share of pings (%)
 * @param correlation lowest correlation (0 to 1)
 * @param intensity lowest intensity (dB)
 * @param errorCentre median of the error velocity (m/s)
 * @param error largest departure from it (m/s)
 * @param verticalCentre median of the vertical velocity (m/s)
 * @param vertical largest departure from it (m/s)
 * @param verticalOverBed whether the vertical velocity is counted over the bed instead of relative
 *     to the boat
 */
record CellLimits(
    double goodPct,
    double correlation,
    double intensity,
    double errorCentre,
    double error,
    double verticalCentre,
    double vertical,
    boolean verticalOverBed) {

  static final CellLimits NONE =
      new CellLimits(
          Double.NaN,
          Double.NaN,
          Double.NaN,
          Double.NaN,
          Double.NaN,
          Double.NaN,
          Double.NaN,
          false);

  CellLimits withLowest(double goodPct, double correlation, double intensity) {
    return new CellLimits(
        goodPct,
        correlation,
        intensity,
        errorCentre,
        error,
        verticalCentre,
        vertical,
        verticalOverBed);
  }

  CellLimits withError(double errorCentre, double error) {
    return new CellLimits(
        goodPct,
        correlation,
        intensity,
        errorCentre,
        error,
        verticalCentre,
        vertical,
        verticalOverBed);
  }

  CellLimits withVertical(double verticalCentre, double vertical, boolean verticalOverBed) {
    return new CellLimits(
        goodPct,
        correlation,
        intensity,
        errorCentre,
        error,
        verticalCentre,
        vertical,
        verticalOverBed);
  }
}
