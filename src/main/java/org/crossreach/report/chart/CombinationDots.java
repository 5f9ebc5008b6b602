package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.evidence.Combination;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * The discharge under every combination of laws and exponent rule: its mean, its passes as ticks;
 * the chosen one and the one that the evidence favours are marked by words.
 *
 * @param comparison what is shown
 * @param units the reader's units
 * @param style colours and fonts
 */
public record CombinationDots(Comparison comparison, Units units, ChartStyle style)
    implements Picture {

  private static final Margins MARGINS = new Margins(150, 58, 12, 38);
  private static final double ROW = 12;
  private static final double MARK = 2.8;

  @Override
  public String name() {
    return "combinations";
  }

  @Override
  public String title() {
    return "Discharge under every choice of laws and exponent";
  }

  @Override
  public String description() {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (CombinationResult each : comparison.combinations()) {
      least = Math.min(least, each.changePct());
      most = Math.max(most, each.changePct());
    }
    return "Mean discharge and passes under every combination of laws and exponent rule; against the"
        + " chosen settings the means lie from "
        + new Decimals(2).signed(least)
        + " to "
        + new Decimals(2).signed(most)
        + " percent.";
  }

  @Override
  public double height(double width) {
    return MARGINS.above() + MARGINS.below() + ROW * (comparison.combinations().size() + 1.4);
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    List<CombinationResult> rows = comparison.combinations();
    AxisScale lines = new AxisScale("", -1.6, rows.size() - 0.2, 10 * rows.size(), true);
    Plane plane =
        new PlotFrame(style, discharges(), lines, MARGINS)
            .grid(true, false)
            .withoutAxisUp()
            .add(this::marks)
            .draw(graphics, area);
    names(graphics, plane, area.getMinX());
    key(graphics, plane, area.getMaxY() - 4);
  }

  private AxisScale discharges() {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (CombinationResult each : comparison.combinations()) {
      for (PassDischarge pass : each.reduction().used()) {
        low = Math.min(low, pass.totalM3s());
        high = Math.max(high, pass.totalM3s());
      }
    }
    double beyond = 0.04 * (high - low);
    return AxisScale.of("Discharge", Quantity.DISCHARGE, units, low - beyond, high + beyond, 7);
  }

  private double in(double m3s) {
    return Quantity.DISCHARGE.in(units, m3s);
  }

  private void marks(Graphics2D graphics, Plane plane) {
    double chosen = in(comparison.chosen().summary().dischargeM3s().mean());
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.dashed(0.7, 3, 2));
    graphics.draw(plane.line(chosen, plane.up().from(), chosen, plane.up().to()));
    for (int r = 0; r < comparison.combinations().size(); r++) {
      CombinationResult each = comparison.combinations().get(r);
      double y = plane.y(r);
      double left = Double.POSITIVE_INFINITY;
      double right = Double.NEGATIVE_INFINITY;
      graphics.setPaint(style.quiet());
      graphics.setStroke(style.line(0.8));
      for (PassDischarge pass : each.reduction().used()) {
        double x = plane.x(in(pass.totalM3s()));
        graphics.draw(new Line2D.Double(x, y - 2.6, x, y + 2.6));
        left = Math.min(left, x);
        right = Math.max(right, x);
      }
      graphics.draw(new Line2D.Double(left, y, right, y));
      mark(graphics, plane.x(in(each.dischargeM3s().mean())), y, isPicked(each.combination()));
    }
  }

  private boolean isPicked(Combination combination) {
    return combination.equals(comparison.chosenCombination())
        || combination.equals(comparison.verdict().combination());
  }

  private void mark(Graphics2D graphics, double x, double y, boolean filled) {
    Ellipse2D dot = new Ellipse2D.Double(x - MARK, y - MARK, 2 * MARK, 2 * MARK);
    graphics.setPaint(filled ? style.ink() : style.paper());
    graphics.fill(dot);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.9));
    graphics.draw(dot);
  }

  private void names(Graphics2D graphics, Plane plane, double left) {
    Label plain = Label.left(style.tick(), style.ink());
    Label strong = Label.left(style.title().deriveFont(7f), style.ink());
    Label quiet = Label.left(style.tick(), style.quiet());
    double y = plane.y(-1) + 2.3;
    double[] places = {left, left + 44, left + 80};
    String[] heads = {"top", "bottom", "exponent"};
    for (int c = 0; c < heads.length; c++) {
      quiet.draw(graphics, heads[c], places[c], y);
    }
    for (int r = 0; r < comparison.combinations().size(); r++) {
      Combination each = comparison.combinations().get(r).combination();
      Label label = isPicked(each) ? strong : plain;
      String[] cells = {each.top().key(), each.bottom().key(), each.rule().key()};
      for (int c = 0; c < cells.length; c++) {
        label.draw(graphics, cells[c], places[c], plane.y(r) + 2.3);
      }
      Label.left(style.title().deriveFont(7f), style.ink())
          .draw(graphics, word(each), plane.area().getMaxX() + 5, plane.y(r) + 2.3);
    }
  }

  private String word(Combination combination) {
    boolean chosen = combination.equals(comparison.chosenCombination());
    return switch (comparison.verdict().kind()) {
      case CHANGE ->
          combination.equals(comparison.verdict().combination())
              ? "favoured"
              : chosen ? "chosen" : "";
      case KEEP, CANNOT_TELL -> chosen ? "chosen" : "";
    };
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    Label label = Label.left(style.tick(), style.ink());
    double x = plane.area().getMinX();
    double y = baseline - 2.4;
    mark(graphics, x + 3, y, false);
    label.draw(graphics, "mean", x + 10, baseline);
    x += 10 + label.width("mean") + 12;
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.8));
    graphics.draw(new Line2D.Double(x, y, x + 12, y));
    for (int t = 0; t <= 2; t++) {
      graphics.draw(new Line2D.Double(x + 6 * t, y - 2.6, x + 6 * t, y + 2.6));
    }
    label.draw(graphics, "passes", x + 17, baseline);
    x += 17 + label.width("passes") + 12;
    graphics.setStroke(style.dashed(0.7, 3, 2));
    graphics.draw(new Line2D.Double(x, y, x + 12, y));
    label.draw(graphics, "mean as chosen", x + 17, baseline);
  }
}
