package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.profile.Zone;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * Where in the section the discharge flows: per unit width over the distance from the left bank,
 * stacked by zone, with the places where a quarter, a half and three quarters have gone by.
 *
 * @param pass what is shown
 * @param units the reader's units
 * @param style colours and fonts
 */
public record DischargeAlong(PassDischarge pass, Units units, ChartStyle style) implements Picture {

  private static final Margins MARGINS = new Margins(30, 10, 22, 25);
  private static final int PANELS = 40;
  private static final double[] SHARES = {0.1, 0.25, 0.5, 0.75, 0.9};

  @Override
  public String name() {
    return "discharge-along-section";
  }

  @Override
  public String title() {
    return "Discharge along the section";
  }

  @Override
  public String description() {
    SectionShape shape = new SectionShape(pass);
    CumulativeDischarge cumulative = cumulative(shape, new DischargePanels(pass, shape, PANELS));
    String text =
        "Discharge per unit width of "
            + pass.pass().name()
            + " from the left to the right bank, stacked by zone: bottom, measured, top.";
    double half = cumulative.stationM(0.5);
    if (Double.isNaN(half)) {
      return text;
    }
    return text
        + " Half of the discharge flows within "
        + new Decimals(1).of(Quantity.LENGTH.in(units, half))
        + " "
        + Quantity.LENGTH.symbol(units)
        + " of the left bank.";
  }

  @Override
  public double height(double width) {
    return 0.24 * width;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    SectionShape shape = new SectionShape(pass);
    DischargePanels panels = new DischargePanels(pass, shape, PANELS);
    ZoneStacks stacks = new ZoneStacks(units, pass, shape, panels);
    AxisScale discharges =
        AxisScale.of(
                "Discharge per unit width",
                Quantity.UNIT_DISCHARGE,
                units,
                stacks.lowest(),
                stacks.highest(),
                4)
            .toWholeSteps();
    Plane plane =
        new PlotFrame(style, SectionAxes.distance(shape, units), discharges, MARGINS)
            .grid(false, true)
            .raiseName(8)
            .add((g, p) -> bars(g, p, stacks))
            .draw(graphics, area);
    shares(graphics, plane, cumulative(shape, panels));
    new ZoneKey(style, graphics, plane.area().getMinX(), area.getMaxY() - 5)
        .pattern(style.top(), "top, extrapolated")
        .solid("measured")
        .pattern(style.bottom(), "bottom, extrapolated")
        .pattern(style.edge(), "edge, estimated");
  }

  private CumulativeDischarge cumulative(SectionShape shape, DischargePanels panels) {
    return new CumulativeDischarge(
        panels, shape.widthM(), pass.zones().leftEdge(), pass.zones().rightEdge());
  }

  private void bars(Graphics2D graphics, Plane plane, ZoneStacks stacks) {
    graphics.setPaint(style.water());
    graphics.fill(stacks.bars(plane, Zone.MEASURED));
    style.bottom().fill(graphics, stacks.bars(plane, Zone.BOTTOM), style.ink());
    style.top().fill(graphics, stacks.bars(plane, Zone.TOP), style.ink());
    Path2D edges = stacks.edges(plane);
    style.edge().fill(graphics, edges, style.ink());
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.3));
    for (Zone zone : Zone.values()) {
      graphics.draw(stacks.bars(plane, zone));
    }
    graphics.draw(edges);
    graphics.setStroke(style.line(0.6));
    graphics.draw(plane.line(plane.across().from(), 0, plane.across().to(), 0));
  }

  /** Marks above the plane: the share of the discharge that flows left of them. */
  private void shares(Graphics2D graphics, Plane plane, CumulativeDischarge cumulative) {
    if (Double.isNaN(cumulative.stationM(0.5))) {
      return;
    }
    double y = plane.area().getMinY();
    Label number = Label.centre(style.tick(), style.ink());
    for (double share : SHARES) {
      double x = plane.x(Quantity.LENGTH.in(units, cumulative.stationM(share)));
      Path2D mark = new Path2D.Double();
      mark.moveTo(x, y);
      mark.lineTo(x - 2.2, y - 4);
      mark.lineTo(x + 2.2, y - 4);
      mark.closePath();
      graphics.setPaint(style.ink());
      graphics.fill(mark);
      number.draw(graphics, Math.round(100 * share) + " %", x, y - 6.5);
    }
    Label.right(style.label(), style.quiet())
        .draw(graphics, "share of the discharge to the left", plane.area().getMaxX(), y - 15);
  }
}
