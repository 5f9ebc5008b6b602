package org.crossreach.screen;

/** A turn of horizontal vectors, clockwise seen from above. */
final class NorthTurn {

  private final double cos;
  private final double sin;

  /**
   * Prepares the turn.
   *
   * @param clockwiseDeg angle (deg), positive clockwise seen from above, so that a vector to the
   *     north turned by 90 points east
   */
  NorthTurn(double clockwiseDeg) {
    cos = Math.cos(Math.toRadians(clockwiseDeg));
    sin = Math.sin(Math.toRadians(clockwiseDeg));
  }

  /** East component of the turned vector, in the unit of the given components. */
  double east(double east, double north) {
    return cos * east + sin * north;
  }

  /** North component of the turned vector, in the unit of the given components. */
  double north(double east, double north) {
    return cos * north - sin * east;
  }
}
