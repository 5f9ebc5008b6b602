package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.crossreach.section.Section;
import org.crossreach.survey.Bank;

/**
 * The river from above, turned so that it flows up the page and the left bank is at the left: the
 * boat's track over the bed with the depth-mean velocity of the water, north and scale. Distances
 * are equal in all directions.
 *
 * @param pass what is shown
 * @param units the reader's units
 * @param style colours and fonts
 */
public record BoatTrack(PassDischarge pass, Units units, ChartStyle style) implements Picture {

  private static final Margins MARGINS = new Margins(30, 10, 28, 25);
  private static final int VECTORS = 30;
  private static final double LONGEST_VECTOR = 26;
  private static final double LEAST_PLANE = 44;
  private static final double MOST_PLANE = 150;
  private static final double PAD = 7;

  @Override
  public String name() {
    return "boat-track";
  }

  @Override
  public String title() {
    return "Boat track and depth-mean velocity";
  }

  @Override
  public String description() {
    Decimals whole = new Decimals(0);
    return "Track of "
        + pass.pass().name()
        + " from the "
        + (pass.pass().startBank() == Bank.LEFT ? "left" : "right")
        + " bank seen from above; the water flows towards "
        + whole.of(pass.geometry().flowAzimuthDeg())
        + " degrees, the section runs from left to right towards "
        + whole.of(pass.section().line().azimuthDeg())
        + " degrees.";
  }

  /** Where the track and its vectors reach to (m downstream of the start, without vectors). */
  private record Reach(double lowM, double highM, double fastestUpMps, double fastestDownMps) {}

  private Reach reach(SectionShape shape, FlowVectors vectors) {
    Section section = shape.section();
    double low = 0;
    double high = 0;
    for (int i = 0; i < shape.size(); i++) {
      double y = FlowVectors.downstreamM(section, i);
      low = Math.min(low, y);
      high = Math.max(high, y);
    }
    double up = 0;
    double down = 0;
    for (int k = 0; k < vectors.count(); k++) {
      up = Math.max(up, orZero(vectors.downstreamMps[k]));
      down = Math.max(down, -orZero(vectors.downstreamMps[k]));
    }
    return new Reach(low, high, up, down);
  }

  private static double orZero(double value) {
    return Double.isNaN(value) ? 0 : value;
  }

  @Override
  public double height(double width) {
    SectionShape shape = new SectionShape(pass);
    FlowVectors vectors = FlowVectors.of(pass, shape, VECTORS);
    AxisScale distance = SectionAxes.distance(shape, Units.SI);
    double perMetre =
        (width - MARGINS.left() - MARGINS.right()) / (distance.to() - distance.from());
    double needed = needed(reach(shape, vectors), vectors, perMetre);
    return MARGINS.above() + MARGINS.below() + Math.max(LEAST_PLANE, Math.min(MOST_PLANE, needed));
  }

  /** Height of the plane that track and vectors need at a scale of the paper (pt per m). */
  private static double needed(Reach reach, FlowVectors vectors, double perMetre) {
    return (reach.highM - reach.lowM) * perMetre
        + (reach.fastestUpMps + reach.fastestDownMps) * perSpeed(vectors)
        + 2 * PAD;
  }

  /** Length of a velocity of 1 m/s on the paper (pt). */
  private static double perSpeed(FlowVectors vectors) {
    double fastest = vectors.fastestMps();
    return fastest > 0 ? LONGEST_VECTOR / fastest : 0;
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    SectionShape shape = new SectionShape(pass);
    FlowVectors vectors = FlowVectors.of(pass, shape, VECTORS);
    Reach reach = reach(shape, vectors);
    AxisScale natural = SectionAxes.distance(shape, units);
    double width = area.getWidth() - MARGINS.left() - MARGINS.right();
    double height = area.getHeight() - MARGINS.above() - MARGINS.below();
    double metre = Quantity.LENGTH.in(units, 1);
    double fixed = (reach.fastestUpMps + reach.fastestDownMps) * perSpeed(vectors) + 2 * PAD;
    double perUnit =
        Math.min(
            width / (natural.to() - natural.from()),
            Math.max(1, height - fixed) / (metre * Math.max(1e-3, reach.highM - reach.lowM)));
    double spareAcross = width / perUnit - (natural.to() - natural.from());
    AxisScale across =
        AxisScale.of(
            "Distance from the left bank",
            Quantity.LENGTH,
            units,
            (natural.from() - spareAcross / 2) / metre,
            (natural.to() + spareAcross / 2) / metre,
            9);
    double spareUp = height / perUnit - (reach.highM - reach.lowM) * metre - fixed / perUnit;
    double bottom =
        reach.lowM * metre
            - (PAD + reach.fastestDownMps * perSpeed(vectors)) / perUnit
            - spareUp / 2;
    AxisScale up =
        AxisScale.of(
            "Downstream of the start",
            Quantity.LENGTH,
            units,
            bottom / metre,
            (bottom + height / perUnit) / metre,
            Math.max(3, (int) (height / 11)));
    Plane plane =
        new PlotFrame(style, across, up, MARGINS)
            .add((g, p) -> banks(g, p, shape))
            .add((g, p) -> vectors(g, p, vectors))
            .add((g, p) -> track(g, p, shape))
            .draw(graphics, area);
    new PlanKey(style, units, pass.section().line(), perSpeed(vectors), vectors.fastestMps())
        .draw(graphics, plane, area.getMinY());
  }

  private void banks(Graphics2D graphics, Plane plane, SectionShape shape) {
    Rectangle2D room = plane.area();
    double left = plane.x(0);
    double right = plane.x(Quantity.LENGTH.in(units, shape.widthM()));
    graphics.setPaint(style.ground());
    graphics.fill(
        new Rectangle2D.Double(
            room.getMinX(), room.getMinY(), left - room.getMinX(), room.getHeight()));
    graphics.fill(
        new Rectangle2D.Double(right, room.getMinY(), room.getMaxX() - right, room.getHeight()));
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.dashed(0.6, 4, 2));
    graphics.draw(plane.line(0, 0, Quantity.LENGTH.in(units, shape.widthM()), 0));
  }

  private void vectors(Graphics2D graphics, Plane plane, FlowVectors vectors) {
    double perSpeed = perSpeed(vectors);
    for (int k = 0; k < vectors.count(); k++) {
      if (Double.isNaN(vectors.stationM[k])) {
        continue;
      }
      Arrow.draw(
          graphics,
          style,
          plane.x(Quantity.LENGTH.in(units, vectors.stationM[k])),
          plane.y(Quantity.LENGTH.in(units, vectors.downstreamM[k])),
          vectors.acrossMps[k] * perSpeed,
          -vectors.downstreamMps[k] * perSpeed);
    }
  }

  private void track(Graphics2D graphics, Plane plane, SectionShape shape) {
    Path2D path = new Path2D.Double();
    int last = shape.size() - 1;
    double drawnX = Double.NaN;
    double drawnY = Double.NaN;
    for (int i = 0; i <= last; i++) {
      double x = plane.x(Quantity.LENGTH.in(units, shape.stationM(i)));
      double y = plane.y(Quantity.LENGTH.in(units, FlowVectors.downstreamM(shape.section(), i)));
      if (i == 0) {
        path.moveTo(x, y);
      } else if (i == last || Math.hypot(x - drawnX, y - drawnY) > 0.8) {
        path.lineTo(x, y);
      } else {
        continue;
      }
      drawnX = x;
      drawnY = y;
    }
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(1.1));
    graphics.draw(path);
    end(graphics, plane, shape, 0, style.paper());
    end(graphics, plane, shape, last, style.ink());
  }

  /** A ring where the pass began, a disc where it ended. */
  private void end(
      Graphics2D graphics, Plane plane, SectionShape shape, int ensemble, java.awt.Color fill) {
    double x = plane.x(Quantity.LENGTH.in(units, shape.stationM(ensemble)));
    double y =
        plane.y(Quantity.LENGTH.in(units, FlowVectors.downstreamM(shape.section(), ensemble)));
    Ellipse2D mark = new Ellipse2D.Double(x - 2.4, y - 2.4, 4.8, 4.8);
    graphics.setPaint(fill);
    graphics.fill(mark);
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(1));
    graphics.draw(mark);
  }
}
