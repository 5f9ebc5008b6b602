package org.crossreach.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/**
 * A pattern of parallel lines that tells areas apart without colour.
 *
 * @param slope rise of a line over its run: 1 rises to the right, -1 falls, 0 is level
 * @param spacing distance between lines, measured upright (pt)
 * @param width width of a line (pt)
 * @param crossed whether the mirrored lines are drawn too
 */
public record Hatch(double slope, double spacing, double width, boolean crossed) {

  /** A stretch of a line that is not worth drawing (pt). */
  private static final double SHORTEST = 0.05;

  /** Fills a shape with straight sides with lines of a colour. */
  void fill(Graphics2D graphics, Shape shape, Color colour) {
    Rectangle2D bounds = shape.getBounds2D();
    if (bounds.getWidth() <= 0 || bounds.getHeight() <= 0) {
      return;
    }
    Path2D lines = new Path2D.Double();
    Sides sides = Sides.of(shape);
    addLines(lines, sides, bounds, slope);
    if (crossed) {
      addLines(lines, sides, bounds, -slope);
    }
    graphics.setPaint(colour);
    graphics.setStroke(
        new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_BEVEL));
    graphics.draw(lines);
  }

  /** Adds lines on a grid that is common to the whole picture, so that neighbours line up. */
  private void addLines(Path2D lines, Sides sides, Rectangle2D bounds, double rise) {
    double left = bounds.getMinX();
    double right = bounds.getMaxX();
    // A line is y = offset - rise x, with y downwards.
    double lowest = bounds.getMinY() + Math.min(rise * left, rise * right);
    double highest = bounds.getMaxY() + Math.max(rise * left, rise * right);
    for (double k = Math.ceil(lowest / spacing); k * spacing <= highest; k++) {
      double offset = k * spacing;
      double[] crossings = sides.crossings(offset, rise);
      for (int c = 0; c + 1 < crossings.length; c += 2) {
        if (crossings[c + 1] - crossings[c] > SHORTEST) {
          lines.moveTo(crossings[c], offset - rise * crossings[c]);
          lines.lineTo(crossings[c + 1], offset - rise * crossings[c + 1]);
        }
      }
    }
  }
}
