package org.crossreach.report;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * Numbers as people read them: a fixed count of decimals, a decimal point, no grouping; the same on
 * every machine and in every locale.
 *
 * @param count decimals that are shown, at least 0
 */
public record Decimals(int count) {

  /** What stands for a value that is missing or could not be computed. */
  public static final String NONE = "–";

  private static final int MOST = 6;

  /**
   * As many decimals as show the largest of some values with a count of significant digits.
   *
   * @param significant significant digits of the largest value, at least 1
   * @param values the values; those that are not finite are passed over
   */
  public static Decimals showing(int significant, double... values) {
    double largest = 0;
    for (double value : values) {
      if (Double.isFinite(value)) {
        largest = Math.max(largest, Math.abs(value));
      }
    }
    int decimals = significant - 1;
    for (double limit = 10; largest >= limit && decimals > 0; limit *= 10) {
      decimals--;
    }
    for (double limit = 1; largest > 0 && largest < limit && decimals < MOST; limit /= 10) {
      decimals++;
    }
    return new Decimals(decimals);
  }

  /** The value rounded half to even, {@link #NONE} when it is not finite; never {@code -0}. */
  public String of(double value) {
    return Double.isFinite(value)
        ? new BigDecimal(value).setScale(count, RoundingMode.HALF_EVEN).toPlainString()
        : NONE;
  }

  /** As {@link #of}, with a plus sign in front of a value that rounds to more than 0. */
  public String signed(double value) {
    String plain = of(value);
    boolean positive = value > 0 && plain.chars().anyMatch(c -> c >= '1' && c <= '9');
    return positive ? "+" + plain : plain;
  }
}
