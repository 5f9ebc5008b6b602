package org.crossreach.report.chart;

import java.awt.Graphics2D;

/** One thing that is drawn between the axes of a picture. */
@FunctionalInterface
interface Layer {

  /**
   * Draws the layer; clipped to the plane.
   *
   * @param graphics where to
   * @param plane from the axes' values to places
   */
  void draw(Graphics2D graphics, Plane plane);
}
