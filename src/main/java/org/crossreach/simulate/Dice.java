package org.crossreach.simulate;

import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;

/**
 * Random numbers that depend on the seed, the pass and the purpose alone, so that switching one
 * effect on leaves the others as they were.
 */
final class Dice {

  private static final long GOLDEN = 0x9E3779B97F4A7C15L;

  private Dice() {}

  /**
   * A generator.
   *
   * @param seed the recipe's seed
   * @param pass number of the pass
   * @param purpose what the numbers are for
   */
  static RandomGenerator of(long seed, int pass, int purpose) {
    return new Well19937c(mixed(mixed(mixed(seed) + pass) + purpose));
  }

  /**
   * Scatters a number over all longs. Source: Steele, Lea and Flood 2014,
   * doi:10.1145/2660193.2660195.
   */
  private static long mixed(long value) {
    long z = value + GOLDEN;
    z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
    z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
    return z ^ (z >>> 31);
  }
}
