package org.crossreach.report.chart;

import java.awt.Shape;
import java.awt.geom.PathIterator;
import java.util.Arrays;

/**
 * The straight sides of a shape.
 *
 * <p>The platform's own cutting of shapes gives different results from version to version; this one
 * needs only additions, products and quotients.
 */
final class Sides {

  private double[] ends = new double[256];
  private int size;

  private Sides() {}

  /** The sides of a shape; curves become chords of 0.1 pt at most beside them. */
  static Sides of(Shape shape) {
    Sides sides = new Sides();
    double[] point = new double[6];
    double startX = 0;
    double startY = 0;
    double x = 0;
    double y = 0;
    for (PathIterator path = shape.getPathIterator(null, 0.1); !path.isDone(); path.next()) {
      int kind = path.currentSegment(point);
      if (kind == PathIterator.SEG_MOVETO) {
        sides.add(x, y, startX, startY);
        startX = point[0];
        startY = point[1];
      } else if (kind == PathIterator.SEG_LINETO) {
        sides.add(x, y, point[0], point[1]);
      } else {
        sides.add(x, y, startX, startY);
        point[0] = startX;
        point[1] = startY;
      }
      x = point[0];
      y = point[1];
    }
    sides.add(x, y, startX, startY);
    return sides;
  }

  private void add(double fromX, double fromY, double toX, double toY) {
    if (fromX == toX && fromY == toY) {
      return;
    }
    if (size == ends.length) {
      ends = Arrays.copyOf(ends, 2 * size);
    }
    ends[size++] = fromX;
    ends[size++] = fromY;
    ends[size++] = toX;
    ends[size++] = toY;
  }

  /**
   * Where the line {@code y = offset - rise x} crosses the sides.
   *
   * @return the places x, rising; the line is inside between the first and the second, and so on
   */
  double[] crossings(double offset, double rise) {
    double[] crossings = new double[16];
    int count = 0;
    for (int s = 0; s < size; s += 4) {
      double from = ends[s + 1] + rise * ends[s] - offset;
      double to = ends[s + 3] + rise * ends[s + 2] - offset;
      if (from < 0 == to < 0) {
        continue;
      }
      if (count == crossings.length) {
        crossings = Arrays.copyOf(crossings, 2 * count);
      }
      crossings[count++] = ends[s] + from / (from - to) * (ends[s + 2] - ends[s]);
    }
    double[] sorted = Arrays.copyOf(crossings, count);
    Arrays.sort(sorted);
    return sorted;
  }
}
