package org.crossreach.report.chart;

import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * One axis: what it shows, from where to where, and its round steps, all in the reader's unit.
 *
 * @param label quantity and unit
 * @param from lower end
 * @param to upper end, more than {@code from}
 * @param step distance between numbers, more than 0
 * @param inverted whether values grow downwards or to the left
 */
public record AxisScale(String label, double from, double to, double step, boolean inverted) {

  public AxisScale {
    if (!(to > from) || !(step > 0) || !Double.isFinite(to - from)) {
      throw new IllegalArgumentException(
          "from " + from + ", to " + to + " and step " + step + " make no axis");
    }
  }

  /**
   * An axis of a quantity over exactly a range.
   *
   * @param name name of the quantity as people read it
   * @param from lower end (SI)
   * @param to upper end (SI); where it is not above the lower one, the axis is widened around both
   * @param steps about how many steps fit
   */
  static AxisScale of(
      String name, Quantity quantity, Units units, double from, double to, int steps) {
    return plain(
        name + " (" + quantity.symbol(units) + ")",
        quantity.in(units, from),
        quantity.in(units, to),
        steps);
  }

  /** An axis over exactly a range; see {@link #of}. */
  static AxisScale plain(String label, double from, double to, int steps) {
    double low = Double.isFinite(from) ? from : 0;
    double high = Double.isFinite(to) ? to : 0;
    if (!(high - low > 1e-9 * Math.max(Math.abs(low), Math.abs(high)))) {
      double half = low == 0 ? 1 : 0.1 * Math.abs(low);
      low -= half;
      high = low + 2 * half;
    }
    return new AxisScale(label, low, high, roundStep((high - low) / steps), false);
  }

  /** The same axis with its ends moved out to whole steps. */
  AxisScale toWholeSteps() {
    return new AxisScale(
        label,
        step * Math.floor(from / step + 1e-9),
        step * Math.ceil(to / step - 1e-9),
        step,
        inverted);
  }

  /** The same axis with values growing the other way. */
  AxisScale invert() {
    return new AxisScale(label, from, to, step, !inverted);
  }

  /** The smallest of 1, 2 or 5 times a power of ten that is not below a step. */
  static double roundStep(double step) {
    double power = StrictMath.pow(10, Math.floor(StrictMath.log10(step)));
    double[] choices = {1, 2, 5};
    for (double choice : choices) {
      if (choice * power >= step * (1 - 1e-9)) {
        return choice * power;
      }
    }
    return 10 * power;
  }

  /** Decimals that tell the steps apart. */
  Decimals decimals() {
    int count = 0;
    for (double rest = step; Math.abs(rest - Math.rint(rest)) > 1e-6 && count < 9; rest *= 10) {
      count++;
    }
    return new Decimals(count);
  }
}
