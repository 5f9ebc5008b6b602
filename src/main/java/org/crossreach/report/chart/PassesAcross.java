package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.crossreach.survey.Bank;

/**
 * Whether the passes agree along the section: discharge per unit width of every used pass, told
 * apart by the bank from which it started, and their mean.
 *
 * @param result the measurement
 * @param units the reader's units
 * @param style colours and fonts
 */
public record PassesAcross(Result result, Units units, ChartStyle style) implements Picture {

  private static final Margins MARGINS = new Margins(30, 10, 15, 25);
  private static final int PANELS = 40;

  @Override
  public String name() {
    return "passes-across";
  }

  @Override
  public String title() {
    return "Agreement of the passes along the section";
  }

  @Override
  public String description() {
    return "Discharge per unit width from the left to the right bank, a line for each of the "
        + result.summary().passesUsed()
        + " used passes and one for their mean.";
  }

  @Override
  public double height(double width) {
    return 0.27 * width;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    List<PassDischarge> used = result.reduction().used();
    double width = result.summary().widthM().mean();
    double[][] lines = new double[used.size()][];
    double lowest = 0;
    double highest = 0;
    for (int p = 0; p < lines.length; p++) {
      lines[p] = line(used.get(p));
      for (double value : lines[p]) {
        lowest = Math.min(lowest, value);
        highest = Math.max(highest, value);
      }
    }
    AxisScale up =
        AxisScale.of("Discharge per unit width", Quantity.UNIT_DISCHARGE, units, lowest, highest, 5)
            .toWholeSteps();
    AxisScale across =
        AxisScale.of("Distance from the left bank", Quantity.LENGTH, units, 0, width, 9);
    Plane plane =
        new PlotFrame(style, across, up, MARGINS)
            .add((g, p) -> lines(g, p, lines, used, width))
            .draw(graphics, area);
    key(graphics, plane, area.getMaxY() - 5);
  }

  /** Panels at equal shares of the pass's own measured width (m²/s). */
  private static double[] line(PassDischarge pass) {
    SectionShape shape = new SectionShape(pass);
    DischargePanels panels = new DischargePanels(pass, shape, PANELS);
    double[] line = new double[PANELS];
    for (int k = 0; k < PANELS; k++) {
      line[k] = panels.dischargeM3s(k) / panels.widthM();
    }
    return line;
  }

  private void lines(
      Graphics2D graphics, Plane plane, double[][] lines, List<PassDischarge> used, double width) {
    double left = 0;
    double right = 0;
    for (PassDischarge pass : used) {
      left += pass.pass().leftEdge().distanceM() / used.size();
      right += pass.pass().rightEdge().distanceM() / used.size();
    }
    double[] station = new double[PANELS];
    double[] mean = new double[PANELS];
    for (int k = 0; k < PANELS; k++) {
      station[k] = left + (k + 0.5) / PANELS * (width - left - right);
      for (double[] line : lines) {
        mean[k] += line[k] / lines.length;
      }
    }
    double[] x = Quantity.LENGTH.in(units, station);
    for (int p = 0; p < lines.length; p++) {
      pen(graphics, used.get(p).pass().startBank());
      graphics.draw(plane.path(x, Quantity.UNIT_DISCHARGE.in(units, lines[p])));
    }
    graphics.setPaint(style.deep());
    graphics.setStroke(style.line(1.7));
    graphics.draw(plane.path(x, Quantity.UNIT_DISCHARGE.in(units, mean)));
  }

  private void pen(Graphics2D graphics, Bank start) {
    graphics.setPaint(style.quiet());
    graphics.setStroke(start == Bank.LEFT ? style.line(0.6) : style.dashed(0.7, 2.4, 1.6));
  }

  private void key(Graphics2D graphics, Plane plane, double baseline) {
    Label label = Label.left(style.tick(), style.ink());
    double y = baseline - 2.2;
    double x = plane.area().getMinX();
    for (Bank bank : Bank.values()) {
      pen(graphics, bank);
      graphics.draw(new Line2D.Double(x, y, x + 16, y));
      String name = bank == Bank.LEFT ? "from the left bank" : "from the right bank";
      label.draw(graphics, name, x + 20, baseline);
      x += 20 + label.width(name) + 10;
    }
    graphics.setPaint(style.deep());
    graphics.setStroke(style.line(1.7));
    graphics.draw(new Line2D.Double(x, y, x + 16, y));
    label.draw(graphics, "mean", x + 20, baseline);
  }
}
