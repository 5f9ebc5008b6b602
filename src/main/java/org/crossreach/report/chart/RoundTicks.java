package org.crossreach.report.chart;

import org.crossreach.report.Decimals;
import org.jfree.chart.axis.NumberTickUnit;

/** The numbers of an axis, written the same in every locale. */
final class RoundTicks extends NumberTickUnit {

  private static final long serialVersionUID = 1L;

  private final int decimals;

  RoundTicks(AxisScale scale) {
    super(scale.step());
    this.decimals = scale.decimals().count();
  }

  @Override
  public String valueToString(double value) {
    return new Decimals(decimals).of(value);
  }

  @Override
  public boolean equals(Object other) {
    return super.equals(other) && decimals == ((RoundTicks) other).decimals;
  }

  @Override
  public int hashCode() {
    return super.hashCode() + decimals;
  }
}
