package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;

/**
 * Lines of equal velocity over the cells, with their values: the section reads without colours too.
 *
 * @param style colours and fonts
 * @param units the reader's units
 * @param shape where the pass lies
 * @param verticals depths, and the limits of the measured zone
 * @param scale the velocities whose steps are drawn, in the reader's unit
 */
record EqualVelocityLayer(
    ChartStyle style, Units units, SectionShape shape, Verticals verticals, AxisScale scale)
    implements Layer {

  private static final int SHORTEST_LINE = 2 * 14;
  private static final double LABEL = 6;
  private static final int SHORTEST_LABELLED = 2 * 20;

  @Override
  public void draw(Graphics2D graphics, Plane plane) {
    MeanField field = MeanField.of(shape);
    double step = scale.step() / 2;
    Decimals text = new AxisScale("", scale.from(), scale.to(), step, false).decimals();
    double perUnit = Quantity.VELOCITY.in(units, 1);
    double first = Math.ceil(scale.from() / step + 1e-9);
    for (double k = first; k * step < scale.to(); k++) {
      double level = k * step;
      List<double[]> lines = EqualVelocity.lines(field, level / perUnit);
      for (double[] line : lines) {
        if (line.length < SHORTEST_LINE) {
          continue;
        }
        Path2D path = path(line, plane);
        graphics.setPaint(style.ink());
        // Where the water stands still between two directions the line is twice as strong.
        boolean turning = k == 0;
        graphics.setStroke(style.line(turning ? 1.9 : 1.2));
        graphics.draw(path);
        graphics.setPaint(style.paper());
        graphics.setStroke(style.line(turning ? 1.4 : 0.7));
        graphics.draw(path);
        if (line.length >= SHORTEST_LABELLED) {
          label(graphics, plane, line, text.of(level));
        }
      }
    }
  }

  /** The line as far as it lies between the highest and the lowest cells. */
  private Path2D path(double[] line, Plane plane) {
    Path2D path = new Path2D.Double();
    boolean drawing = false;
    for (int i = 0; i < line.length; i += 2) {
      if (!measured(line[i], line[i + 1])) {
        drawing = false;
        continue;
      }
      double x = x(line[i], plane);
      double y = y(line[i], line[i + 1], plane);
      if (drawing) {
        path.lineTo(x, y);
      } else {
        path.moveTo(x, y);
      }
      drawing = true;
    }
    return path;
  }

  private boolean measured(double column, double row) {
    int k = vertical(column);
    double depth = depthM(column, row);
    return depth >= verticals.topM[k] && depth <= verticals.bottomM[k];
  }

  private void label(Graphics2D graphics, Plane plane, double[] line, String text) {
    int at = labelled(line, plane);
    if (at < 0) {
      return;
    }
    Label label = Label.centre(style.tick(), style.ink());
    double width = label.width(text) + 4;
    double x = x(line[at], plane);
    double y = y(line[at], line[at + 1], plane);
    graphics.setPaint(style.paper());
    graphics.fill(new Rectangle2D.Double(x - width / 2, y - 4, width, 8));
    label.draw(graphics, text, x, y + 2.4);
  }

  /** The vertex nearest to the middle where a label lies among the cells, negative for none. */
  private int labelled(double[] line, Plane plane) {
    int middle = line.length / 4 * 2;
    for (int away = 0; away <= middle; away += 2) {
      for (int at : new int[] {middle - away, middle + away}) {
        if (at >= 0 && at < line.length && roomAround(line[at], line[at + 1], plane)) {
          return at;
        }
      }
    }
    return -1;
  }

  private boolean roomAround(double column, double row, Plane plane) {
    int k = vertical(column);
    double y = y(column, row, plane);
    return y - LABEL > plane.y(Quantity.LENGTH.in(units, verticals.topM[k]))
        && y + LABEL < plane.y(Quantity.LENGTH.in(units, verticals.bottomM[k]));
  }

  private double x(double column, Plane plane) {
    double share = (column + 0.5) / MeanField.COLUMNS;
    double metres = shape.leftEndM() + share * (shape.rightEndM() - shape.leftEndM());
    return plane.x(Quantity.LENGTH.in(units, metres));
  }

  private double y(double column, double row, Plane plane) {
    return plane.y(Quantity.LENGTH.in(units, depthM(column, row)));
  }

  /** Depth of a place of the field below the surface (m). */
  private double depthM(double column, double row) {
    return verticals.bedM[vertical(column)] * (1 - (row + 0.5) / MeanField.ROWS);
  }

  private int vertical(double column) {
    double share = (column + 0.5) / MeanField.COLUMNS;
    return (int) Math.round(share * (verticals.bedM.length - 1));
  }
}
