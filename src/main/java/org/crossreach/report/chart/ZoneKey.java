package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** The row of small samples that says which pattern is which zone. */
final class ZoneKey {

  private static final double SAMPLE_WIDTH = 14;
  private static final double SAMPLE_HEIGHT = 6;
  private static final double GAP = 3;
  private static final double BETWEEN = 10;

  private final ChartStyle style;
  private final Graphics2D graphics;
  private final double baseline;
  private final Label label;
  private double x;

  /** Starts a row at a place (pt). */
  ZoneKey(ChartStyle style, Graphics2D graphics, double x, double baseline) {
    this.style = style;
    this.graphics = graphics;
    this.x = x;
    this.baseline = baseline;
    this.label = Label.left(style.tick(), style.ink());
  }

  /** Adds a patterned zone. */
  ZoneKey pattern(Hatch hatch, String name) {
    Rectangle2D sample = sample();
    graphics.setPaint(style.paper());
    graphics.fill(sample);
    hatch.fill(graphics, sample, style.ink());
    return framed(sample, name);
  }

  /** Adds a filled zone. */
  ZoneKey solid(String name) {
    Rectangle2D sample = sample();
    graphics.setPaint(style.water());
    graphics.fill(sample);
    return framed(sample, name);
  }

  /** Adds a broken line. */
  ZoneKey dashed(String name) {
    graphics.setPaint(style.ink());
    graphics.setStroke(style.dashed(0.8, 3, 1.6));
    double middle = baseline - SAMPLE_HEIGHT / 2 + 0.6;
    graphics.draw(new Line2D.Double(x, middle, x + SAMPLE_WIDTH, middle));
    return named(name);
  }

  private Rectangle2D sample() {
    return new Rectangle2D.Double(x, baseline - SAMPLE_HEIGHT + 0.6, SAMPLE_WIDTH, SAMPLE_HEIGHT);
  }

  private ZoneKey framed(Rectangle2D sample, String name) {
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.4));
    graphics.draw(sample);
    return named(name);
  }

  private ZoneKey named(String name) {
    label.draw(graphics, name, x + SAMPLE_WIDTH + GAP, baseline);
    x += SAMPLE_WIDTH + GAP + label.width(name) + BETWEEN;
    return this;
  }
}
