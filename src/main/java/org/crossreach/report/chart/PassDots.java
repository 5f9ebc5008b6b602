package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.crossreach.survey.Bank;

/**
 * The discharge of every pass as a mark that points the way the boat went, with the mean of the
 * used passes and its 95 % interval.
 *
 * @param result the measurement
 * @param marked name of the pass that is picked out, empty for none
 * @param units the reader's units
 * @param style colours and fonts
 */
public record PassDots(Result result, String marked, Units units, ChartStyle style)
    implements Picture {

  private static final Margins WIDE = new Margins(44, 12, 6, 36);
  private static final Margins NARROW = new Margins(44, 12, 6, 25);
  private static final double ROW = 11;
  private static final double WIDTH_FOR_KEY = 400;
  private static final double MARK = 3;
  private static final double PICKED = 4;
  private static final double NAME = 7.5;
  private static final double DENSE = 4;

  /**
   * Largest departure of a pass from the mean that is usual (%). Source: Oberg, Morlock and
   * Caldwell 2005, USGS Scientific Investigations Report 2005-5183 (from memory).
   */
  private static final double USUAL_DEPARTURE_PCT = 5;

  @Override
  public String name() {
    return "passes";
  }

  @Override
  public String title() {
    return "Discharge of the passes";
  }

  @Override
  public String description() {
    Spread spread = result.summary().dischargeM3s();
    double[] shown = totals();
    Decimals decimals = Decimals.showing(4, shown);
    return "Discharge of each pass; the mean of the "
        + spread.count()
        + " used ones is "
        + decimals.of(Quantity.DISCHARGE.in(units, spread.mean()))
        + " "
        + Quantity.DISCHARGE.symbol(units)
        + (Double.isNaN(spread.ci95Half())
            ? "."
            : " with a 95 percent interval of plus or minus "
                + decimals.of(Quantity.DISCHARGE.in(units, spread.ci95Half()))
                + ".");
  }

  @Override
  public double height(double width) {
    Margins margins = margins(width);
    return margins.above() + margins.below() + ROW * (passes().size() + 0.6);
  }

  /** Where there is no room for a key, the text beside the picture has to do. */
  private static Margins margins(double width) {
    return width < WIDTH_FOR_KEY ? NARROW : WIDE;
  }

  private List<PassDischarge> passes() {
    return result.reduction().passes();
  }

  private double[] totals() {
    return passes().stream()
        .mapToDouble(each -> Quantity.DISCHARGE.in(units, each.totalM3s()))
        .toArray();
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    int n = passes().size();
    // A row's name stands where a number would.
    AxisScale rows = new AxisScale("", -0.8, n - 0.2, 10 * n, true);
    Plane plane =
        new PlotFrame(style, discharges(), rows, margins(area.getWidth()))
            .grid(true, false)
            .withoutAxisUp()
            .add(this::mean)
            .add(this::marks)
            .draw(graphics, area);
    names(graphics, plane, area.getMinX());
    if (margins(area.getWidth()) == WIDE) {
      key(graphics, plane, area.getMaxY() - 4);
    }
  }

  /** Wide enough for every pass, the interval and the usual departure. */
  private AxisScale discharges() {
    Spread spread = result.summary().dischargeM3s();
    double half = Math.abs(spread.mean()) * (USUAL_DEPARTURE_PCT + 1) / 100;
    if (spread.ci95Half() > half) {
      half = Math.min(spread.ci95Half(), 3 * half);
    }
    double low = spread.mean() - half;
    double high = spread.mean() + half;
    for (PassDischarge each : passes()) {
      low = Math.min(low, each.totalM3s());
      high = Math.max(high, each.totalM3s());
    }
    double beyond = 0.04 * (high - low);
    return AxisScale.of("Discharge", Quantity.DISCHARGE, units, low - beyond, high + beyond, 6);
  }

  private void mean(Graphics2D graphics, Plane plane) {
    Spread spread = result.summary().dischargeM3s();
    double mean = Quantity.DISCHARGE.in(units, spread.mean());
    double half = Quantity.DISCHARGE.in(units, spread.ci95Half());
    double top = plane.area().getMinY();
    double height = plane.area().getHeight();
    if (!Double.isNaN(half)) {
      double left = plane.x(mean - half);
      graphics.setPaint(style.wash());
      graphics.fill(new Rectangle2D.Double(left, top, plane.x(mean + half) - left, height));
      graphics.setPaint(style.quiet());
      graphics.setStroke(style.line(0.4));
      graphics.draw(plane.line(mean - half, plane.up().from(), mean - half, plane.up().to()));
      graphics.draw(plane.line(mean + half, plane.up().from(), mean + half, plane.up().to()));
    }
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.dashed(0.6, 1.2, 1.8));
    for (int sign = -1; sign <= 1; sign += 2) {
      double limit = mean * (1 + sign * USUAL_DEPARTURE_PCT / 100);
      graphics.draw(plane.line(limit, plane.up().from(), limit, plane.up().to()));
    }
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(1));
    graphics.draw(plane.line(mean, plane.up().from(), mean, plane.up().to()));
  }

  private void marks(Graphics2D graphics, Plane plane) {
    double spacing = plane.y(1) - plane.y(0);
    for (int p = 0; p < passes().size(); p++) {
      PassDischarge pass = passes().get(p);
      double y = plane.y(p);
      if (spacing > DENSE) {
        graphics.setPaint(style.faint());
        graphics.setStroke(style.line(0.4));
        graphics.draw(new Line2D.Double(plane.area().getMinX(), y, plane.area().getMaxX(), y));
      }
      boolean picked = pass.pass().name().equals(marked);
      double size = picked ? PICKED : Math.min(MARK, 0.5 * spacing);
      new PassMark(style, pass.pass().startBank(), pass.pass().used(), size)
          .draw(graphics, plane.x(Quantity.DISCHARGE.in(units, pass.totalM3s())), y);
    }
  }

  /** Where rows stand closer than letters are high, only some have room for their name. */
  private void names(Graphics2D graphics, Plane plane, double left) {
    double lowest = Double.NEGATIVE_INFINITY;
    double picked = place(plane);
    for (int p = 0; p < passes().size(); p++) {
      String name = passes().get(p).pass().name();
      double y = plane.y(p);
      boolean own = name.equals(marked);
      if (own || y - lowest >= NAME && Math.abs(y - picked) >= NAME) {
        Label.left(own ? style.title().deriveFont(7f) : style.tick(), style.ink())
            .draw(graphics, name, left, y + 2.3);
        lowest = y;
      }
    }
  }

  /** Where the marked pass stands (pt), infinitely far away when there is none. */
  private double place(Plane plane) {
    for (int p = 0; p < passes().size(); p++) {
      if (passes().get(p).pass().name().equals(marked)) {
        return plane.y(p);
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    Label label = Label.left(style.tick(), style.ink());
    double y = baseline - 2.2;
    double x = plane.area().getMinX();
    new PassMark(style, Bank.LEFT, true, MARK).draw(graphics, x + 3, y);
    x = named(graphics, label, "from the left bank", x + 9, baseline);
    new PassMark(style, Bank.RIGHT, true, MARK).draw(graphics, x + 3, y);
    x = named(graphics, label, "from the right bank", x + 9, baseline);
    new PassMark(style, Bank.LEFT, false, MARK).draw(graphics, x + 3, y);
    x = named(graphics, label, "not used", x + 9, baseline);
    Rectangle2D band = new Rectangle2D.Double(x, baseline - 5.4, 12, 6);
    graphics.setPaint(style.wash());
    graphics.fill(band);
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.4));
    graphics.draw(band);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(1));
    graphics.draw(new Line2D.Double(x + 6, baseline - 5.4, x + 6, baseline + 0.6));
    x = named(graphics, label, "mean and its 95 % interval", x + 16, baseline);
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.dashed(0.6, 1.2, 1.8));
    graphics.draw(new Line2D.Double(x + 3, baseline - 5.4, x + 3, baseline + 0.6));
    named(graphics, label, "5 % from the mean", x + 7, baseline);
  }

  private static double named(
      Graphics2D graphics, Label label, String name, double x, double baseline) {
    label.draw(graphics, name, x, baseline);
    return x + label.width(name) + 9;
  }
}
