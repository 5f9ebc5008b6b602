package org.crossreach.screen;

/**
 * Limits of departures from neighbours (m/s), NaN where there is none.
 *
 * @param relative for a cell relative to the middle of its ensemble
 * @param overGround for a cell over the ground
 * @param least the least of them that the river allows; change of velocity across comes on top
 */
record SpikeLimits(double relative, double overGround, double least) {

  private static final double SHARPER = 0.9;

  static final SpikeLimits NONE = new SpikeLimits(Double.NaN, Double.NaN, Double.NaN);

  /** The same limit for all. */
  static SpikeLimits of(double limit) {
    return new SpikeLimits(limit, limit, limit);
  }

  /** Whether comparing relative to the middle is clearly sharper than over the ground. */
  boolean relativeIsSharper() {
    return relative < SHARPER * overGround;
  }

  /** The limit that is reported: the narrower one of a cell. */
  double reported() {
    return relative > overGround || Double.isNaN(relative) ? overGround : relative;
  }
}
