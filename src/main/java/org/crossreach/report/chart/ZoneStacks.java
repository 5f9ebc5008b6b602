package org.crossreach.report.chart;

import java.awt.geom.Path2D;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.profile.Zone;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * Bars of discharge per unit width, stacked from the bed up; what flows back hangs below zero.
 *
 * @param units the reader's units
 * @param pass the pass, for its edges
 * @param shape its stations
 * @param panels its panels
 */
record ZoneStacks(Units units, PassDischarge pass, SectionShape shape, DischargePanels panels) {

  private static final Zone[] FROM_THE_BED = {Zone.BOTTOM, Zone.MEASURED, Zone.TOP};

  /** The lowest value that a stack reaches, at most 0 (m²/s). */
  double lowest() {
    return extreme(-1);
  }

  /** The highest value that a stack reaches, at least 0 (m²/s). */
  double highest() {
    return extreme(1);
  }

  private double extreme(int sign) {
    double extreme = Math.max(0, Math.max(sign * leftEdge(), sign * rightEdge()));
    for (int k = 0; k < panels.count(); k++) {
      double sum = 0;
      for (Zone zone : FROM_THE_BED) {
        sum += Math.max(0, sign * panels.perWidth(zone, k));
      }
      extreme = Math.max(extreme, sum);
    }
    return sign * extreme;
  }

  private double leftEdge() {
    return perWidth(pass.zones().leftEdge(), shape.leftEndM());
  }

  private double rightEdge() {
    return perWidth(pass.zones().rightEdge(), shape.widthM() - shape.rightEndM());
  }

  private static double perWidth(double dischargeM3s, double distanceM) {
    return distanceM > 0 ? dischargeM3s / distanceM : 0;
  }

  /** The bars of one zone over all panels. */
  Path2D bars(Plane plane, Zone zone) {
    Path2D bars = new Path2D.Double();
    for (int k = 0; k < panels.count(); k++) {
      double value = panels.perWidth(zone, k);
      double base = 0;
      for (Zone below : FROM_THE_BED) {
        if (below == zone) {
          break;
        }
        double other = panels.perWidth(below, k);
        base += other < 0 == value < 0 ? other : 0;
      }
      double from = panels.fromM(k);
      add(bars, plane, new Bar(from, from + panels.widthM(), base, base + value));
    }
    return bars;
  }

  /** The bars of both edges. */
  Path2D edges(Plane plane) {
    Path2D bars = new Path2D.Double();
    add(bars, plane, new Bar(0, shape.leftEndM(), 0, leftEdge()));
    add(bars, plane, new Bar(shape.rightEndM(), shape.widthM(), 0, rightEdge()));
    return bars;
  }

  /** A bar in SI. */
  private record Bar(double fromM, double toM, double base, double end) {}

  private void add(Path2D path, Plane plane, Bar bar) {
    if (bar.base == bar.end || !(bar.toM > bar.fromM)) {
      return;
    }
    double left = plane.x(Quantity.LENGTH.in(units, bar.fromM));
    double right = plane.x(Quantity.LENGTH.in(units, bar.toM));
    double base = plane.y(Quantity.UNIT_DISCHARGE.in(units, bar.base));
    double end = plane.y(Quantity.UNIT_DISCHARGE.in(units, bar.end));
    path.moveTo(left, base);
    path.lineTo(left, end);
    path.lineTo(right, end);
    path.lineTo(right, base);
    path.closePath();
  }
}
