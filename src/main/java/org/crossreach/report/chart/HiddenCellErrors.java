package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.CandidateEvidence;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Decimals;

/**
 * How each law misses the cells that were hidden from it: bias with its 95 % interval, the surface
 * above, the bed below; filled marks cannot be told from the best.
 *
 * @param comparison what is shown
 * @param style colours and fonts
 */
public record HiddenCellErrors(Comparison comparison, ChartStyle style) implements Picture {

  private static final Margins MARGINS = new Margins(104, 66, 12, 38);
  private static final double ROW = 13;
  private static final double MARK = 2.6;
  private static final double MOST_PCT = 40;

  @Override
  public String name() {
    return "hidden-cells";
  }

  @Override
  public String title() {
    return "How each law misses the cells hidden from it";
  }

  @Override
  public String description() {
    CandidateEvidence top = comparison.top().ranked().get(0);
    CandidateEvidence bottom = comparison.bottom().ranked().get(0);
    return "Bias of each law on hidden cells with its 95 percent interval; the best near the surface"
        + " is "
        + top.candidate().text()
        + " at "
        + percent(top.biasPct())
        + " percent, near the bed "
        + bottom.candidate().text()
        + " at "
        + percent(bottom.biasPct())
        + " percent.";
  }

  private static String percent(double value) {
    return new Decimals(1).signed(value);
  }

  @Override
  public double height(double width) {
    return MARGINS.above() + MARGINS.below() + ROW * (rows().size() + 0.4);
  }

  /** The candidates by zone, with nothing where a heading or a gap stands. */
  private List<CandidateEvidence> rows() {
    List<CandidateEvidence> rows = new ArrayList<>();
    rows.add(null);
    rows.addAll(comparison.top().ranked());
    rows.add(null);
    rows.add(null);
    rows.addAll(comparison.bottom().ranked());
    return rows;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    List<CandidateEvidence> rows = rows();
    AxisScale lines = new AxisScale("", -0.6, rows.size() - 0.2, 10 * rows.size(), true);
    Plane plane =
        new PlotFrame(style, errors(rows), lines, MARGINS)
            .grid(true, false)
            .withoutAxisUp()
            .add((g, p) -> marks(g, p, rows))
            .draw(graphics, area);
    names(graphics, plane, rows, area.getMinX());
    key(graphics, plane, area.getMaxY() - 4);
  }

  private static AxisScale errors(List<CandidateEvidence> rows) {
    double low = -1;
    double high = 1;
    for (CandidateEvidence each : rows) {
      if (each != null && Double.isFinite(each.biasPct() + each.half95Pct())) {
        low = Math.min(low, each.biasPct() - each.half95Pct());
        high = Math.max(high, each.biasPct() + each.half95Pct());
      }
    }
    return AxisScale.plain(
            "Prediction minus measurement (% of what was measured there)",
            Math.max(low, -MOST_PCT), Math.min(high, MOST_PCT), 8)
        .toWholeSteps();
  }

  private void marks(Graphics2D graphics, Plane plane, List<CandidateEvidence> rows) {
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.8));
    graphics.draw(plane.line(0, plane.up().from(), 0, plane.up().to()));
    for (int r = 0; r < rows.size(); r++) {
      CandidateEvidence each = rows.get(r);
      if (each == null || !Double.isFinite(each.biasPct())) {
        continue;
      }
      double y = plane.y(r);
      graphics.setPaint(style.faint());
      graphics.setStroke(style.line(0.4));
      graphics.draw(new Line2D.Double(plane.area().getMinX(), y, plane.area().getMaxX(), y));
      graphics.setPaint(style.ink());
      graphics.setStroke(style.line(1.1));
      double left = plane.x(each.biasPct() - each.half95Pct());
      double right = plane.x(each.biasPct() + each.half95Pct());
      graphics.draw(new Line2D.Double(left, y, right, y));
      graphics.draw(new Line2D.Double(left, y - 2, left, y + 2));
      graphics.draw(new Line2D.Double(right, y - 2, right, y + 2));
      mark(graphics, plane.x(each.biasPct()), y, each.equal());
    }
  }

  private void mark(Graphics2D graphics, double x, double y, boolean filled) {
    Ellipse2D dot = new Ellipse2D.Double(x - MARK, y - MARK, 2 * MARK, 2 * MARK);
    graphics.setPaint(filled ? style.ink() : style.paper());
    graphics.fill(dot);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.9));
    graphics.draw(dot);
  }

  private void names(Graphics2D graphics, Plane plane, List<CandidateEvidence> rows, double left) {
    Label plain = Label.left(style.tick(), style.ink());
    Label heading = Label.left(style.title().deriveFont(7.5f), style.ink());
    Label numbers = Label.right(style.tick(), style.ink());
    double right = plane.area().getMaxX() + MARGINS.right();
    List<String> zones = new ArrayList<>(List.of("Near the surface", "", "Near the bed"));
    for (int r = 0; r < rows.size(); r++) {
      double y = plane.y(r) + 2.3;
      CandidateEvidence each = rows.get(r);
      if (each == null) {
        String zone = zones.remove(0);
        heading.draw(graphics, zone, left, y);
        numbers.draw(graphics, zone.isEmpty() ? "" : "bias ± 95 %", right, y);
      } else {
        plain.draw(graphics, each.candidate().text(), left + 6, y);
        numbers.draw(
            graphics,
            percent(each.biasPct()) + " ± " + new Decimals(1).of(each.half95Pct()) + " %",
            right,
            y);
      }
    }
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    Label label = Label.left(style.tick(), style.ink());
    double x = plane.area().getMinX();
    mark(graphics, x + 3, baseline - 2.4, true);
    String equal = "best, or not to be told from it";
    label.draw(graphics, equal, x + 10, baseline);
    x += 10 + label.width(equal) + 12;
    mark(graphics, x + 3, baseline - 2.4, false);
    label.draw(graphics, "worse", x + 10, baseline);
  }
}
