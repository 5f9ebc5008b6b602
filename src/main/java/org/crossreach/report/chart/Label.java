package org.crossreach.report.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;

/**
 * How a piece of text stands at its place.
 *
 * @param font font and size
 * @param colour colour
 * @param anchor share of the text's width that lies left of its place: 0, 0.5 or 1
 */
record Label(Font font, Color colour, double anchor) {

  /** Widths that depend on no screen: unhinted, in fractions of a point. */
  private static final FontRenderContext MEASURE = new FontRenderContext(null, true, true);

  static Label left(Font font, Color colour) {
    return new Label(font, colour, 0);
  }

  static Label centre(Font font, Color colour) {
    return new Label(font, colour, 0.5);
  }

  static Label right(Font font, Color colour) {
    return new Label(font, colour, 1);
  }

  /** Width of a text (pt). */
  double width(String text) {
    return font.getStringBounds(text, MEASURE).getWidth();
  }

  /** Draws a text on a base line (pt). */
  void draw(Graphics2D graphics, String text, double x, double baseline) {
    graphics.setFont(font);
    graphics.setPaint(colour);
    graphics.drawString(text, (float) (x - anchor * width(text)), (float) baseline);
  }
}
