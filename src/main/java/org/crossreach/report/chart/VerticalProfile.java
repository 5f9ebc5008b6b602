package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.function.DoubleUnaryOperator;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.settings.Settings;

/**
 * The vertical profile of a pass without its size: velocity over the mean of its column against
 * height over depth, the middle half of the cells in each layer, and the chosen laws through their
 * medians.
 *
 * @param pass what is shown
 * @param settings the chosen laws
 * @param style colours and fonts
 */
public record VerticalProfile(PassDischarge pass, Settings settings, ChartStyle style)
    implements Picture {

  private static final Margins MARGINS = new Margins(24, 10, 15, 36);
  private static final double ZONE_STRIP = 9;
  private static final int STEPS = 40;

  @Override
  public String name() {
    return "vertical-profile";
  }

  @Override
  public String title() {
    return "Vertical profile and the chosen laws";
  }

  @Override
  public String description() {
    ProfileBins bins = ProfileBins.of(pass);
    Decimals whole = new Decimals(0);
    return "Velocity over column mean against height over depth for "
        + pass.pass().name()
        + ": medians and quartiles of the measured cells with the laws "
        + settings.top().key()
        + " at the top and "
        + settings.bottom().key()
        + " at the bottom, exponent "
        + new Decimals(4).of(pass.exponent())
        + "; on average cells reach from "
        + whole.of(100 * bins.meanBottom())
        + " to "
        + whole.of(100 * bins.meanTop())
        + " percent of the depth.";
  }

  @Override
  public double height(double width) {
    return Math.min(290, 1.15 * width);
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    ProfileBins bins = ProfileBins.of(pass);
    AxisScale velocities =
        AxisScale.plain("Velocity over column mean (–)", 0, largest(bins), 5).toWholeSteps();
    AxisScale heights = AxisScale.plain("Height above the bed over depth (–)", 0, 1, 5);
    Plane plane =
        new PlotFrame(style, velocities, heights, MARGINS)
            .add((g, p) -> zones(g, p, bins))
            .add((g, p) -> layers(g, p, bins))
            .add((g, p) -> laws(g, p, bins))
            .draw(graphics, area);
    key(graphics, plane, area.getMaxY() - 4);
  }

  private static double largest(ProfileBins bins) {
    double largest = 1.2;
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      if (bins.filled(layer)) {
        largest = Math.max(largest, bins.quantile(layer, 0.75));
      }
    }
    return Math.min(3, largest * 1.04);
  }

  /** A strip at the right: which part of the depth is measured, on average. */
  private void zones(Graphics2D graphics, Plane plane, ProfileBins bins) {
    double left = plane.area().getMaxX() - ZONE_STRIP;
    double top = plane.y(bins.meanTop());
    double bottom = plane.y(bins.meanBottom());
    Rectangle2D measured = new Rectangle2D.Double(left, top, ZONE_STRIP, bottom - top);
    Rectangle2D above = new Rectangle2D.Double(left, plane.y(1), ZONE_STRIP, top - plane.y(1));
    Rectangle2D below = new Rectangle2D.Double(left, bottom, ZONE_STRIP, plane.y(0) - bottom);
    graphics.setPaint(style.water());
    graphics.fill(measured);
    graphics.setPaint(style.paper());
    graphics.fill(above);
    graphics.fill(below);
    style.top().fill(graphics, above, style.ink());
    style.bottom().fill(graphics, below, style.ink());
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.4));
    graphics.draw(measured);
    graphics.draw(above);
    graphics.draw(below);
  }

  private void layers(Graphics2D graphics, Plane plane, ProfileBins bins) {
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      if (!bins.filled(layer)) {
        continue;
      }
      double y = ProfileBins.height(layer);
      graphics.setPaint(style.water());
      graphics.setStroke(style.line(2.2));
      graphics.draw(plane.line(bins.quantile(layer, 0.25), y, bins.quantile(layer, 0.75), y));
      dot(graphics, plane.x(bins.quantile(layer, 0.5)), plane.y(y));
    }
  }

  private void dot(Graphics2D graphics, double x, double y) {
    Ellipse2D dot = new Ellipse2D.Double(x - 2, y - 2, 4, 4);
    graphics.setPaint(style.paper());
    graphics.fill(dot);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.9));
    graphics.draw(dot);
  }

  /** The laws: a full line where they are used, a broken one where the cells are. */
  private void laws(Graphics2D graphics, Plane plane, ProfileBins bins) {
    LawCurves curves = new LawCurves(bins, pass.exponent());
    DoubleUnaryOperator top = curves.of(settings.top());
    DoubleUnaryOperator bottom = curves.of(settings.bottom());
    graphics.setPaint(style.deep());
    graphics.setStroke(style.dashed(0.9, 3, 2));
    double middle = 0.5 * (bins.meanTop() + bins.meanBottom());
    graphics.draw(curve(plane, bottom, bins.meanBottom(), middle));
    graphics.draw(curve(plane, top, middle, bins.meanTop()));
    graphics.setStroke(style.line(1.8));
    graphics.draw(curve(plane, bottom, 0, bins.meanBottom()));
    graphics.draw(curve(plane, top, bins.meanTop(), 1));
  }

  private static Path2D curve(Plane plane, DoubleUnaryOperator law, double from, double to) {
    double[] velocity = new double[STEPS + 1];
    double[] height = new double[STEPS + 1];
    for (int s = 0; s <= STEPS; s++) {
      // Squared, since a power law bends most at the bed.
      height[s] = from + (to - from) * s * s / (STEPS * STEPS);
      velocity[s] = law.applyAsDouble(height[s]);
    }
    return plane.path(velocity, height);
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    Label label = Label.left(style.tick(), style.ink());
    double x = plane.area().getMinX();
    double y = baseline - 2.2;
    graphics.setPaint(style.water());
    graphics.setStroke(style.line(2.2));
    graphics.draw(new Line2D.Double(x + 1, y, x + 15, y));
    dot(graphics, x + 8, y);
    String cells = "median, middle half";
    label.draw(graphics, cells, x + 20, baseline);
    x += 20 + label.width(cells) + 10;
    graphics.setPaint(style.deep());
    graphics.setStroke(style.line(1.8));
    graphics.draw(new Line2D.Double(x, y, x + 12, y));
    label.draw(graphics, "law in use", x + 16, baseline);
    x += 16 + label.width("law in use") + 10;
    graphics.setPaint(style.deep());
    graphics.setStroke(style.dashed(0.9, 3, 2));
    graphics.draw(new Line2D.Double(x, y, x + 12, y));
    label.draw(graphics, "law, elsewhere", x + 16, baseline);
  }
}
