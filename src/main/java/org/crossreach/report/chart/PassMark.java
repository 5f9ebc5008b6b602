package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import org.crossreach.survey.Bank;

/**
 * The mark of a pass: a triangle that points the way the boat went, empty when the pass is not
 * used.
 *
 * @param style colours
 * @param start bank from which the boat started; the left one lies at the left
 * @param used whether the pass counts
 * @param size half its height (pt)
 */
record PassMark(ChartStyle style, Bank start, boolean used, double size) {

  /** Draws the mark around a place (pt). */
  void draw(Graphics2D graphics, double x, double y) {
    double ahead = start == Bank.LEFT ? size : -size;
    Path2D triangle = new Path2D.Double();
    triangle.moveTo(x - ahead, y - size);
    triangle.lineTo(x + ahead, y);
    triangle.lineTo(x - ahead, y + size);
    triangle.closePath();
    graphics.setPaint(used ? style.deep() : style.paper());
    graphics.fill(triangle);
    graphics.setPaint(used ? style.deep() : style.quiet());
    graphics.setStroke(style.line(0.9));
    graphics.draw(triangle);
  }
}
