package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;

/** An arrow from a place along a vector, with a solid head. */
final class Arrow {

  private static final double HEAD = 4.2;
  private static final double HALF_HEAD = 1.5;

  private Arrow() {}

  /**
   * Draws an arrow (pt, y downwards); a vector shorter than its head becomes the head alone.
   *
   * @param graphics where to
   * @param style colours
   * @param x where it begins
   * @param y where it begins
   * @param dx vector to the right
   * @param dy vector downwards
   */
  static void draw(
      Graphics2D graphics, ChartStyle style, double x, double y, double dx, double dy) {
    double length = Math.hypot(dx, dy);
    if (!(length > 0.5)) {
      return;
    }
    double ux = dx / length;
    double uy = dy / length;
    double shaft = Math.max(0, length - HEAD);
    graphics.setPaint(style.deep());
    graphics.setStroke(style.line(0.8));
    graphics.draw(new Line2D.Double(x, y, x + ux * shaft, y + uy * shaft));
    double head = Math.min(HEAD, length);
    Path2D tip = new Path2D.Double();
    tip.moveTo(x + dx, y + dy);
    tip.lineTo(x + dx - ux * head - uy * HALF_HEAD, y + dy - uy * head + ux * HALF_HEAD);
    tip.lineTo(x + dx - ux * head + uy * HALF_HEAD, y + dy - uy * head - ux * HALF_HEAD);
    tip.closePath();
    graphics.fill(tip);
  }
}
