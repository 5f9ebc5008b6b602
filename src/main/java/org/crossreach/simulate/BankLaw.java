package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * How the depth-mean velocity falls off towards a bank: with a power of the distance, within a
 * width.
 *
 * <p>The exponents make the edge discharge {@code C V d L} exact for a boat anywhere within the
 * width: at a wall {@code C = 1/(1 + q)}; over a bed that rises linearly to the bank {@code C =
 * 1/(2 + q)}.
 *
 * @param widthM width within which the velocity falls off (m), 0 for none
 * @param exponent q
 */
public record BankLaw(double widthM, double exponent) {

  /** No fall-off. */
  public static final BankLaw NONE = new BankLaw(0, 0);

  /** At a vertical wall, for an edge coefficient below 1. */
  public static BankLaw wall(double widthM, double coefficient) {
    return new BankLaw(widthM, 1 / coefficient - 1);
  }

  /** Over a bed that rises linearly to the bank, for an edge coefficient below 0.5. */
  public static BankLaw sloping(double widthM, double coefficient) {
    return new BankLaw(widthM, 1 / coefficient - 2);
  }

  /** Factor of the depth-mean velocity at a distance from the bank (m). */
  double factor(double distanceM) {
    if (distanceM >= widthM) {
      return 1;
    }
    return distanceM <= 0 ? 0 : FastMath.pow(distanceM / widthM, exponent);
  }
}
