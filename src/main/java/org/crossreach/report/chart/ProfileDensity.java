package org.crossreach.report.chart;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.function.DoubleUnaryOperator;
import org.crossreach.evidence.Comparison;
import org.crossreach.profile.ExponentFit;
import org.crossreach.report.Decimals;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;

/**
 * All measured cells without their size: velocity over the mean of its column against height over
 * depth as a density, with every law drawn through their medians and the band of the fitted
 * exponent.
 *
 * @param comparison what is shown
 * @param style colours and fonts
 */
public record ProfileDensity(Comparison comparison, ChartStyle style) implements Picture {

  private static final Margins MARGINS = new Margins(24, 10, 15, 48);
  private static final double LOWEST = 0.2;
  private static final double HIGHEST = 1.6;
  private static final int TILES = 70;
  private static final int STEPS = 40;

  /** Laws of one zone are drawn a little into the measured water, where they can be judged. */
  private static final double INTO = 0.2;

  @Override
  public String name() {
    return "profile-density";
  }

  @Override
  public String title() {
    return "Measured velocities and the laws";
  }

  @Override
  public String description() {
    ExponentFit fit = comparison.exponent();
    Decimals four = new Decimals(4);
    return "Velocity over column mean against height over depth for all used passes as a density,"
        + " with every law through the medians; the fitted exponent is "
        + four.of(fit.value())
        + " with a 95 percent interval from "
        + four.of(fit.low95())
        + " to "
        + four.of(fit.high95())
        + ".";
  }

  @Override
  public double height(double width) {
    return Math.min(330, 0.75 * width);
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    ProfileBins bins = ProfileBins.of(comparison.chosen().reduction().used());
    AxisScale velocities =
        AxisScale.plain("Velocity over column mean (–)", LOWEST, HIGHEST, 7).toWholeSteps();
    AxisScale heights = AxisScale.plain("Height above the bed over depth (–)", 0, 1, 5);
    Plane plane =
        new PlotFrame(style, velocities, heights, MARGINS)
            .add((g, p) -> density(g, p, bins))
            .add((g, p) -> lawsIn(g, p, bins))
            .draw(graphics, area);
    key(graphics, plane, area.getMaxY() - 4);
  }

  /** Tiles as dark as many cells fall into them, against the fullest tile of all. */
  private void density(Graphics2D graphics, Plane plane, ProfileBins bins) {
    double tile = (plane.across().to() - plane.across().from()) / TILES;
    double most = 1;
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      for (int t = 0; t < TILES; t++) {
        most = Math.max(most, count(bins, plane, layer, t, tile));
      }
    }
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      double high = plane.y((layer + 1.0) / ProfileBins.LAYERS);
      double low = plane.y((double) layer / ProfileBins.LAYERS);
      for (int t = 0; t < TILES; t++) {
        double share = count(bins, plane, layer, t, tile) / most;
        if (share > 0) {
          graphics.setPaint(
              Tint.between(style.paper(), style.water(), 0.06 + 0.94 * Math.sqrt(share)));
          double left = plane.x(plane.across().from() + t * tile);
          double right = plane.x(plane.across().from() + (t + 1) * tile);
          // A little wider, so that no seams show between tiles.
          graphics.fill(new Rectangle2D.Double(left, high, right - left + 0.3, low - high + 0.3));
        }
      }
    }
  }

  private static int count(ProfileBins bins, Plane plane, int layer, int t, double tile) {
    double from = plane.across().from() + t * tile;
    return bins.count(layer, from, from + tile);
  }

  /** Standing water has no profile for a law to follow. */
  private void lawsIn(Graphics2D graphics, Plane plane, ProfileBins bins) {
    boolean any = false;
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      any |= bins.filled(layer);
    }
    if (any) {
      laws(graphics, plane, bins);
    }
  }

  private void laws(Graphics2D graphics, Plane plane, ProfileBins bins) {
    ExponentFit fit = comparison.exponent();
    double fixed = comparison.chosen().reduction().settings().exponent().value();
    if (fit.refusal().isEmpty()) {
      band(graphics, plane, bins, fit);
      line(graphics, plane, power(bins, fit.value()), 0, 1, style.line(0.9));
    }
    line(graphics, plane, power(bins, fixed), 0, 1, style.dashed(1.6, 4, 3));
    LawCurves curves = new LawCurves(bins, fixed);
    double above = Math.max(0, bins.meanTop() - INTO);
    line(graphics, plane, curves.of(TopLaw.CONSTANT), above, 1, style.dashed(1.4, 1.2, 1.8));
    line(graphics, plane, curves.of(TopLaw.THREE_POINT), above, 1, dashDot());
    double below = Math.min(1, bins.meanBottom() + INTO);
    line(graphics, plane, curves.of(BottomLaw.NO_SLIP), 0, below, style.dashed(1.4, 1.2, 1.8));
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.5));
    double left = plane.across().from();
    double right = plane.across().to();
    graphics.draw(plane.line(left, bins.meanTop(), right, bins.meanTop()));
    graphics.draw(plane.line(left, bins.meanBottom(), right, bins.meanBottom()));
  }

  private static DoubleUnaryOperator power(ProfileBins bins, double exponent) {
    return new LawCurves(bins, exponent).of(TopLaw.POWER);
  }

  private static Stroke dashDot() {
    return new BasicStroke(
        1.2f,
        BasicStroke.CAP_BUTT,
        BasicStroke.JOIN_ROUND,
        4f,
        new float[] {5, 1.5f, 1.2f, 1.5f},
        0f);
  }

  private void band(Graphics2D graphics, Plane plane, ProfileBins bins, ExponentFit fit) {
    DoubleUnaryOperator low = power(bins, fit.low95());
    DoubleUnaryOperator high = power(bins, fit.high95());
    Path2D band = new Path2D.Double();
    for (int s = 0; s <= STEPS; s++) {
      double h = (double) s * s / (STEPS * STEPS);
      double x = plane.x(low.applyAsDouble(h));
      if (s == 0) {
        band.moveTo(x, plane.y(h));
      } else {
        band.lineTo(x, plane.y(h));
      }
    }
    for (int s = STEPS; s >= 0; s--) {
      double h = (double) s * s / (STEPS * STEPS);
      band.lineTo(plane.x(high.applyAsDouble(h)), plane.y(h));
    }
    band.closePath();
    graphics.setPaint(Tint.between(style.water(), style.deep(), 0.6));
    graphics.fill(band);
  }

  private void line(
      Graphics2D graphics,
      Plane plane,
      DoubleUnaryOperator law,
      double from,
      double to,
      Stroke stroke) {
    double[] velocity = new double[STEPS + 1];
    double[] height = new double[STEPS + 1];
    for (int s = 0; s <= STEPS; s++) {
      height[s] = from + (to - from) * s * s / (STEPS * STEPS);
      velocity[s] = law.applyAsDouble(height[s]);
    }
    graphics.setPaint(style.ink());
    graphics.setStroke(stroke);
    graphics.draw(plane.path(velocity, height));
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    ExponentFit fit = comparison.exponent();
    Decimals four = new Decimals(4);
    double fixed = comparison.chosen().reduction().settings().exponent().value();
    String fitted =
        fit.refusal().isEmpty()
            ? "power, fitted "
                + four.of(fit.value())
                + " ("
                + four.of(fit.low95())
                + " to "
                + four.of(fit.high95())
                + ")"
            : "power, not fitted";
    double x = plane.area().getMinX();
    double first = baseline - 10;
    double next = entry(graphics, fitted, style.line(0.9), x, first);
    next = entry(graphics, "power, fixed " + four.of(fixed), style.dashed(1.6, 4, 3), next, first);
    entry(graphics, "limits of the cells, mean", style.line(0.5), next, first);
    next =
        entry(
            graphics, "constant (top), no-slip (bottom)", style.dashed(1.4, 1.2, 1.8), x, baseline);
    next = entry(graphics, "three-point (top)", dashDot(), next, baseline);
    graphics.setPaint(style.water());
    graphics.fill(new Rectangle2D.Double(next, baseline - 5, 10, 5.5));
    Label.left(style.tick(), style.ink()).draw(graphics, "many cells", next + 14, baseline);
  }

  private double entry(Graphics2D graphics, String name, Stroke stroke, double x, double baseline) {
    graphics.setPaint(style.ink());
    graphics.setStroke(stroke);
    graphics.draw(new Line2D.Double(x, baseline - 2.2, x + 16, baseline - 2.2));
    Label label = Label.left(style.tick(), style.ink());
    label.draw(graphics, name, x + 20, baseline);
    return x + 20 + label.width(name) + 10;
  }
}
