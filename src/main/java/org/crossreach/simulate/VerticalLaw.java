package org.crossreach.simulate;

/**
 * How velocity is distributed over a vertical whose depth-mean velocity is 1.
 *
 * <p>Every law is given by its integral from the bed, so that means over cells are exact.
 */
public interface VerticalLaw {

  /**
   * Transport per unit width below a height, for a depth-mean velocity of 1 m/s (m²/s): 0 at the
   * bed, {@code depthM} at the surface.
   *
   * @param heightM height above the bed (m), 0 to {@code depthM}
   * @param depthM depth of the vertical (m)
   */
  double below(double heightM, double depthM);
}
