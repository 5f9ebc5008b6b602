package org.crossreach.report.chart;

import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/** The horizontal axis that all pictures over the river's width share. */
final class SectionAxes {

  private static final double BANKS = 0.02;

  private SectionAxes() {}

  /** Distance from the left bank, a little beyond both banks. */
  static AxisScale distance(SectionShape shape, Units units) {
    double left = Math.min(0, shape.leftEndM());
    double right = Math.max(shape.widthM(), shape.rightEndM());
    double beyond = BANKS * (right - left);
    return AxisScale.of(
        "Distance from the left bank", Quantity.LENGTH, units, left - beyond, right + beyond, 9);
  }
}
