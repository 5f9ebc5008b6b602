package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/**
 * A picture of a result: a record of what it shows and how, which draws itself and computes
 * nothing.
 */
public interface Picture {

  /** Short name for files, lower case with hyphens, for example {@code velocity-section}. */
  String name();

  /** What stands above the picture. */
  String title();

  /** What a person who cannot see the picture should know: one or two sentences with figures. */
  String description();

  /** The height at which it looks its best in a given width (pt). */
  double height(double width);

  /**
   * Draws the picture without its title.
   *
   * @param graphics where to; its unit is the point
   * @param area room for the picture
   */
  void draw(Graphics2D graphics, Rectangle2D area);
}
