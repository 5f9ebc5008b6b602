package org.crossreach.report.chart;

import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/**
 * The room between the axes.
 *
 * @param area the room (pt)
 * @param across the horizontal axis
 * @param up the vertical axis
 */
record Plane(Rectangle2D area, AxisScale across, AxisScale up) {

  /** Place of a value of the horizontal axis (pt). */
  double x(double value) {
    double share = (value - across.from()) / (across.to() - across.from());
    return area.getMinX() + area.getWidth() * (across.inverted() ? 1 - share : share);
  }

  /** Place of a value of the vertical axis (pt, downwards). */
  double y(double value) {
    double share = (value - up.from()) / (up.to() - up.from());
    return area.getMinY() + area.getHeight() * (up.inverted() ? share : 1 - share);
  }

  /** A straight line between two points given in the axes' values. */
  Line2D line(double fromX, double fromY, double toX, double toY) {
    return new Line2D.Double(x(fromX), y(fromY), x(toX), y(toY));
  }

  /**
   * A broken line through points given in the axes' values; it is interrupted where a value is NaN.
   *
   * @param xs values of the horizontal axis
   * @param ys as many values of the vertical axis
   */
  Path2D path(double[] xs, double[] ys) {
    Path2D path = new Path2D.Double();
    boolean drawing = false;
    for (int i = 0; i < xs.length; i++) {
      if (Double.isNaN(xs[i]) || Double.isNaN(ys[i])) {
        drawing = false;
      } else if (drawing) {
        path.lineTo(x(xs[i]), y(ys[i]));
      } else {
        path.moveTo(x(xs[i]), y(ys[i]));
        drawing = true;
      }
    }
    return path;
  }

  /**
   * The band between two broken lines over the same places; where a value is NaN there is none.
   *
   * @param xs values of the horizontal axis
   * @param lows one edge, in values of the vertical axis
   * @param highs the other edge
   */
  Path2D band(double[] xs, double[] lows, double[] highs) {
    Path2D path = new Path2D.Double();
    int start = 0;
    while (start < xs.length) {
      int end = start;
      while (end < xs.length && !Double.isNaN(lows[end]) && !Double.isNaN(highs[end])) {
        end++;
      }
      if (end - start > 1) {
        path.moveTo(x(xs[start]), y(lows[start]));
        for (int i = start + 1; i < end; i++) {
          path.lineTo(x(xs[i]), y(lows[i]));
        }
        for (int i = end - 1; i >= start; i--) {
          path.lineTo(x(xs[i]), y(highs[i]));
        }
        path.closePath();
      }
      start = Math.max(end, start + 1);
    }
    return path;
  }
}
