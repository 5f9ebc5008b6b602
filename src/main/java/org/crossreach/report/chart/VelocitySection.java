package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * The section as the water flows through it: velocity normal to the section over distance and
 * depth, with the bed, the side-lobe limit and what was not measured.
 *
 * @param pass what is shown
 * @param units the reader's units
 * @param style colours and fonts
 */
public record VelocitySection(PassDischarge pass, Units units, ChartStyle style)
    implements Picture {

  private static final Margins MARGINS = new Margins(30, 10, 24, 25);
  private static final double PIXELS_PER_POINT = 2.5;

  @Override
  public String name() {
    return "velocity-section";
  }

  @Override
  public String title() {
    return "Velocity normal to the section";
  }

  @Override
  public String description() {
    VelocityRange range = VelocityRange.of(pass.section());
    Decimals two = new Decimals(2);
    return "Section of "
        + pass.pass().name()
        + " seen downstream, left bank at the left: measured velocities from "
        + two.of(Quantity.VELOCITY.in(units, range.lowest()))
        + " to "
        + two.of(Quantity.VELOCITY.in(units, range.highest()))
        + " "
        + Quantity.VELOCITY.symbol(units)
        + " over a width of "
        + new Decimals(1).of(Quantity.LENGTH.in(units, pass.geometry().widthM()))
        + " "
        + Quantity.LENGTH.symbol(units)
        + ", with the bed, the side-lobe limit and the extrapolated zones.";
  }

  @Override
  public double height(double width) {
    return 0.36 * width;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    SectionShape shape = new SectionShape(pass);
    double planeWidth = area.getWidth() - MARGINS.left() - MARGINS.right();
    Verticals verticals = Verticals.of(shape, pass.transports(), Math.max(2, (int) planeWidth));
    AxisScale velocities = velocities();
    Plane plane =
        new PlotFrame(style, SectionAxes.distance(shape, units), depths(verticals), MARGINS)
            .grid(false, false)
            .add((g, p) -> cells(g, p, shape, velocities))
            .add(new EqualVelocityLayer(style, units, shape, verticals, velocities))
            .add((g, p) -> new SectionZones(style, units, shape, verticals).draw(g, p))
            .draw(graphics, area);
    new ColourBar(style, velocities).draw(graphics, plane.area().getMaxX() - 5, area.getMinY());
    new ZoneKey(style, graphics, plane.area().getMinX(), area.getMaxY() - 5)
        .pattern(style.top(), "top, extrapolated")
        .pattern(style.bottom(), "bottom, extrapolated")
        .pattern(style.edge(), "edge, estimated")
        .dashed("side-lobe limit");
  }

  private AxisScale velocities() {
    VelocityRange range = VelocityRange.of(pass.section());
    return AxisScale.of(
            "Normal velocity", Quantity.VELOCITY, units, range.lowest(), range.highest(), 6)
        .toWholeSteps();
  }

  private AxisScale depths(Verticals verticals) {
    double deepest = 0;
    for (double depth : verticals.bedM) {
      deepest = Math.max(deepest, depth);
    }
    return AxisScale.of("Depth below the surface", Quantity.LENGTH, units, 0, 1.06 * deepest, 6)
        .invert();
  }

  private void cells(Graphics2D graphics, Plane plane, SectionShape shape, AxisScale velocities) {
    double left = plane.x(Quantity.LENGTH.in(units, shape.leftEndM()));
    double right = plane.x(Quantity.LENGTH.in(units, shape.rightEndM()));
    int width = Math.max(1, (int) Math.round((right - left) * PIXELS_PER_POINT));
    int height = Math.max(1, (int) Math.round(plane.area().getHeight() * PIXELS_PER_POINT));
    double perUnit = Quantity.VELOCITY.in(units, 1);
    BufferedImage image =
        VelocityImage.of(
            shape,
            plane.up().to() / Quantity.LENGTH.in(units, 1),
            new VelocityRange(velocities.from() / perUnit, velocities.to() / perUnit),
            width,
            height);
    Pixels.draw(
        graphics,
        image,
        new Rectangle2D.Double(
            left, plane.area().getMinY(), right - left, plane.area().getHeight()));
  }
}
