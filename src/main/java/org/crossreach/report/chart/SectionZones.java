package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * What surrounds the measured cells: extrapolated zones, edges, bed, banks, surface and side-lobe
 * limit.
 *
 * @param style colours and patterns
 * @param units the reader's units
 * @param shape where the pass lies
 * @param verticals limits of the zones
 */
record SectionZones(ChartStyle style, Units units, SectionShape shape, Verticals verticals) {

  void draw(Graphics2D graphics, Plane plane) {
    double[] x = Quantity.LENGTH.in(units, verticals.stationM);
    double[] bed = Quantity.LENGTH.in(units, verticals.bedM);
    double[] top = Quantity.LENGTH.in(units, verticals.topM);
    double[] bottom = Quantity.LENGTH.in(units, verticals.bottomM);
    double[] surface = new double[x.length];
    style.top().fill(graphics, plane.band(x, surface, top), style.ink());
    style.bottom().fill(graphics, plane.band(x, bottom, bed), style.ink());
    style.edge().fill(graphics, edge(plane, 0, leftBankDepthM(), 0), style.ink());
    style
        .edge()
        .fill(graphics, edge(plane, shape.widthM(), rightBankDepthM(), x.length - 1), style.ink());
    graphics.setPaint(style.ink());
    graphics.setStroke(style.line(0.5));
    graphics.draw(plane.path(x, top));
    graphics.draw(plane.path(x, bottom));
    graphics.draw(side(plane, 0));
    graphics.draw(side(plane, x.length - 1));
    graphics.setStroke(style.dashed(0.8, 3, 1.6));
    graphics.draw(plane.path(x, Quantity.LENGTH.in(units, verticals.sideLobeM)));
    ground(graphics, plane, x, bed);
  }

  /** The edge between a bank and the measured water's end at an index. */
  private Path2D edge(Plane plane, double bankM, double bankDepthM, int end) {
    double[] x = {length(bankM), length(verticals.stationM[end])};
    double[] bed = {length(bankDepthM), length(verticals.bedM[end])};
    return plane.band(x, new double[] {0, 0}, bed);
  }

  private Line2D side(Plane plane, int end) {
    double x = length(verticals.stationM[end]);
    return plane.line(x, 0, x, length(verticals.bedM[end]));
  }

  /** Bed and banks as one body, and the water's surface. */
  private void ground(Graphics2D graphics, Plane plane, double[] x, double[] bed) {
    Path2D line = new Path2D.Double();
    line.moveTo(plane.x(0), plane.y(0));
    line.lineTo(plane.x(0), plane.y(length(leftBankDepthM())));
    for (int i = 0; i < x.length; i++) {
      line.lineTo(plane.x(x[i]), plane.y(bed[i]));
    }
    double right = plane.x(length(shape.widthM()));
    line.lineTo(right, plane.y(length(rightBankDepthM())));
    line.lineTo(right, plane.y(0));
    Path2D body = new Path2D.Double(line);
    body.lineTo(plane.area().getMaxX(), plane.y(0));
    body.lineTo(plane.area().getMaxX(), plane.area().getMaxY());
    body.lineTo(plane.area().getMinX(), plane.area().getMaxY());
    body.lineTo(plane.area().getMinX(), plane.y(0));
    body.closePath();
    graphics.setPaint(style.ground());
    graphics.fill(body);
    graphics.setPaint(style.earth());
    graphics.setStroke(style.line(1.3));
    graphics.draw(line);
    graphics.setPaint(style.deep());
    graphics.setStroke(style.line(1));
    graphics.draw(plane.line(0, 0, length(shape.widthM()), 0));
    names(graphics, plane, bed);
  }

  /** Names the banks in the lower corners, where the bed leaves room for them. */
  private void names(Graphics2D graphics, Plane plane, double[] bed) {
    double low = plane.area().getMaxY() - 4;
    int reach = Math.min(bed.length, 40);
    double left = 0;
    double right = 0;
    for (int i = 0; i < reach; i++) {
      left = Math.max(left, bed[i]);
      right = Math.max(right, bed[bed.length - 1 - i]);
    }
    if (plane.y(left) < low - 9) {
      Label.left(style.tick(), style.earth())
          .draw(graphics, "left bank", plane.area().getMinX() + 4, low);
    }
    if (plane.y(right) < low - 9) {
      Label.right(style.tick(), style.earth())
          .draw(graphics, "right bank", plane.area().getMaxX() - 4, low);
    }
  }

  private double leftBankDepthM() {
    return shape.leftBankShare() * verticals.bedM[0];
  }

  private double rightBankDepthM() {
    return shape.rightBankShare() * verticals.bedM[verticals.bedM.length - 1];
  }

  private double length(double metres) {
    return Quantity.LENGTH.in(units, metres);
  }
}
