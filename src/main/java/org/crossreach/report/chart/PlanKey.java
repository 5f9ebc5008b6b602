package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.crossreach.section.Line;

/**
 * North, scale and the length of a velocity, in a row above a plan.
 *
 * @param style colours and fonts
 * @param units the reader's units
 * @param line the section line, which lies level in the plan
 * @param perSpeed length of a velocity of 1 m/s (pt)
 * @param fastestMps largest velocity in the plan (m/s)
 */
record PlanKey(ChartStyle style, Units units, Line line, double perSpeed, double fastestMps) {

  private static final double NORTH = 8;
  private static final double LETTER = 6;

  void draw(Graphics2D graphics, Plane plane, double top) {
    double right = plane.area().getMaxX();
    double middle = top + NORTH + LETTER;
    north(graphics, right - NORTH, middle);
    double next = scaleBar(graphics, plane, right - 2 * NORTH - 14, middle);
    next = speed(graphics, next - 16, middle);
    ends(graphics, next - 16, middle);
  }

  /** The section line points right, so north is turned back by the line's azimuth. */
  private void north(Graphics2D graphics, double x, double y) {
    double angle = Math.toRadians(90 - line.azimuthDeg());
    double ux = StrictMath.sin(angle);
    double uy = -StrictMath.cos(angle);
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.5));
    graphics.draw(new Ellipse2D.Double(x - NORTH, y - NORTH, 2 * NORTH, 2 * NORTH));
    Path2D needle = new Path2D.Double();
    needle.moveTo(x + NORTH * ux, y + NORTH * uy);
    needle.lineTo(x - 0.75 * NORTH * ux - 3 * uy, y - 0.75 * NORTH * uy + 3 * ux);
    needle.lineTo(x - 0.45 * NORTH * ux, y - 0.45 * NORTH * uy);
    needle.closePath();
    graphics.setPaint(style.ink());
    graphics.fill(needle);
    Path2D light = new Path2D.Double();
    light.moveTo(x + NORTH * ux, y + NORTH * uy);
    light.lineTo(x - 0.75 * NORTH * ux + 3 * uy, y - 0.75 * NORTH * uy - 3 * ux);
    light.lineTo(x - 0.45 * NORTH * ux, y - 0.45 * NORTH * uy);
    light.closePath();
    graphics.setPaint(style.paper());
    graphics.fill(light);
    graphics.setPaint(style.ink());
    graphics.draw(light);
    Label.centre(style.tick(), style.ink())
        .draw(graphics, "N", x + (NORTH + 4.5) * ux, y + (NORTH + 4.5) * uy + 2.4);
  }

  private double scaleBar(Graphics2D graphics, Plane plane, double right, double y) {
    double perUnit = (plane.x(1) - plane.x(0));
    double length = AxisScale.roundStep(40 / perUnit);
    double width = length * perUnit;
    String text =
        new AxisScale("", 0, length, length, false).decimals().of(length)
            + " "
            + Quantity.LENGTH.symbol(units);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.8));
    Path2D bar = new Path2D.Double();
    bar.moveTo(right - width, y + 1);
    bar.lineTo(right - width, y + 4);
    bar.lineTo(right, y + 4);
    bar.lineTo(right, y + 1);
    graphics.draw(bar);
    Label.centre(style.tick(), style.ink()).draw(graphics, text, right - width / 2, y);
    return right - width;
  }

  private double speed(Graphics2D graphics, double right, double y) {
    if (!(fastestMps > 0)) {
      return right;
    }
    double perUnit = perSpeed / Quantity.VELOCITY.in(units, 1);
    double round = AxisScale.roundStep(Quantity.VELOCITY.in(units, 0.5 * fastestMps));
    double width = round * perUnit;
    String text =
        new AxisScale("", 0, round, round, false).decimals().of(round)
            + " "
            + Quantity.VELOCITY.symbol(units);
    Label label = Label.right(style.tick(), style.ink());
    label.draw(graphics, text, right, y + 4);
    double left = right - label.width(text) - 4 - width;
    Arrow.draw(graphics, style, left, y + 1.8, width, 0);
    return left;
  }

  private void ends(Graphics2D graphics, double right, double y) {
    Label label = Label.right(style.tick(), style.ink());
    graphics.setStroke(style.line(1));
    String end = "end";
    label.draw(graphics, end, right, y + 4);
    double x = right - label.width(end) - 7;
    graphics.setPaint(style.ink());
    graphics.fill(new Ellipse2D.Double(x, y - 0.6, 4.4, 4.4));
    graphics.draw(new Ellipse2D.Double(x, y - 0.6, 4.4, 4.4));
    String start = "start";
    label.draw(graphics, start, x - 8, y + 4);
    x -= 8 + label.width(start) + 7;
    graphics.draw(new Ellipse2D.Double(x, y - 0.6, 4.4, 4.4));
    graphics.setStroke(style.dashed(0.6, 4, 2));
    graphics.setPaint(style.quiet());
    String section = "section line";
    label.draw(graphics, section, x - 10, y + 4);
    x -= 10 + label.width(section) + 4;
    graphics.setPaint(style.quiet());
    graphics.draw(new Line2D.Double(x - 16, y + 1.8, x, y + 1.8));
  }
}
