package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * The vertical laws.
 *
 * <p>Those in pieces follow a power law in the middle and join on to it without a step; all are
 * scaled to a mean of 1.
 */
public final class VerticalLaws {

  private VerticalLaws() {}

  /** {@code u ~ z^m}. */
  public static VerticalLaw power(double exponent) {
    return (z, depth) -> depth * FastMath.pow(z / depth, exponent + 1);
  }

  /**
   * The logarithmic law over a rough bed, {@code u ~ ln(z / z0)} above {@code z0} and 0 below.
   *
   * @param roughnessM z0 (m), much smaller than any depth
   */
  public static VerticalLaw logarithmic(double roughnessM) {
    return (z, depth) -> {
      double r = FastMath.min(roughnessM, depth / 10);
      return z <= r ? 0 : depth * logIntegral(z, r) / logIntegral(depth, r);
    };
  }

  private static double logIntegral(double z, double roughness) {
    return z * FastMath.log(z / roughness) - z + roughness;
  }

  /** The power law up to a share of the depth, and the velocity reached there above it. */
  public static VerticalLaw constantAbove(double exponent, double share) {
    return inPieces(exponent, 0, exponent, share, 1);
  }

  /**
   * The power law up to a share of the depth; above it velocity changes linearly to a multiple of
   * what was reached there.
   *
   * @param surfaceFactor velocity at the surface over velocity at that share, below 1 for wind
   *     against the current
   */
  public static VerticalLaw windAbove(double exponent, double share, double surfaceFactor) {
    return inPieces(exponent, 0, exponent, share, surfaceFactor);
  }

  /**
   * The power law above a share of the depth; below it a steeper power law, as over a rough bed.
   *
   * @param bedExponent exponent of the lower part
   */
  public static VerticalLaw roughBelow(double exponent, double share, double bedExponent) {
    return inPieces(exponent, share, bedExponent, 1, 1);
  }

  private static VerticalLaw inPieces(
      double exponent, double low, double bedExponent, double high, double surfaceFactor) {
    double mean = pieces(1, exponent, low, bedExponent, high, surfaceFactor);
    return (z, depth) ->
        depth * pieces(z / depth, exponent, low, bedExponent, high, surfaceFactor) / mean;
  }

  /** Integral of the unscaled profile from 0 to a share s of the depth. */
  private static double pieces(
      double s, double m, double low, double bedExponent, double high, double surfaceFactor) {
    double sum = 0;
    if (low > 0) {
      double top = FastMath.min(s, low);
      double atLow = FastMath.pow(low, m);
      sum += atLow * low * FastMath.pow(top / low, bedExponent + 1) / (bedExponent + 1);
    }
    if (s > low) {
      double top = FastMath.min(s, high);
      sum += (FastMath.pow(top, m + 1) - FastMath.pow(low, m + 1)) / (m + 1);
    }
    if (s > high) {
      double atHigh = FastMath.pow(high, m);
      double above = s - high;
      double slope = (surfaceFactor - 1) / (1 - high);
      sum += atHigh * (above + 0.5 * slope * above * above);
    }
    return sum;
  }
}
