package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/**
 * The key of the colours: a bar with numbers under it and the quantity beside it.
 *
 * @param style colours and fonts
 * @param scale the range that the colours cover, in the reader's unit
 */
record ColourBar(ChartStyle style, AxisScale scale) {

  private static final double WIDTH = 150;
  private static final double HEIGHT = 5.5;
  private static final int STRIPES = 64;

  /** Draws the bar with its right end and upper edge at a place (pt). */
  void draw(Graphics2D graphics, double right, double top) {
    double left = right - WIDTH;
    for (int s = 0; s < STRIPES; s++) {
      graphics.setPaint(ColourMap.at((s + 0.5) / STRIPES));
      double from = left + WIDTH * s / STRIPES;
      // A hair of overlap keeps viewers from showing the paper between stripes.
      double overlap = s < STRIPES - 1 ? 0.3 : 0;
      graphics.fill(new Rectangle2D.Double(from, top, WIDTH / STRIPES + overlap, HEIGHT));
    }
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.4));
    Label number = Label.centre(style.tick(), style.quiet());
    double from = Math.ceil(scale.from() / scale.step() - 1e-9);
    for (double k = from; k * scale.step() <= scale.to() * (1 + 1e-9); k++) {
      double value = k * scale.step();
      double x = left + WIDTH * (value - scale.from()) / (scale.to() - scale.from());
      graphics.setPaint(style.quiet());
      graphics.draw(new Line2D.Double(x, top + HEIGHT, x, top + HEIGHT + 2));
      number.draw(graphics, scale.decimals().of(value), x, top + HEIGHT + 8.5);
    }
    Label.right(style.label(), style.ink()).draw(graphics, scale.label(), left - 6, top + HEIGHT);
  }
}
