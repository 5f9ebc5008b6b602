package org.crossreach.report.chart;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.Range;
import org.jfree.data.xy.XYSeriesCollection;

/** Axes and grid in our style, with layers between them; filled, drawn once and thrown away. */
final class PlotFrame {

  private final ChartStyle style;
  private final AxisScale across;
  private final AxisScale up;
  private final Margins margins;
  private final List<Layer> layers = new ArrayList<>();
  private double raised;
  private boolean axisUp = true;
  private boolean gridAcross = true;
  private boolean gridUp = true;

  PlotFrame(ChartStyle style, AxisScale across, AxisScale up, Margins margins) {
    this.style = style;
    this.across = across;
    this.up = up;
    this.margins = margins;
  }

  /** Adds a layer on top of those so far. */
  PlotFrame add(Layer layer) {
    layers.add(layer);
    return this;
  }

  /** Chooses which grid lines are drawn; without a call both are. */
  PlotFrame grid(boolean atAcross, boolean atUp) {
    gridAcross = atAcross;
    gridUp = atUp;
    return this;
  }

  /** Moves the name of the vertical axis up, to make room for marks above the plane (pt). */
  PlotFrame raiseName(double by) {
    raised = by;
    return this;
  }

  /** Leaves out the vertical axis, for pictures whose rows have names. */
  PlotFrame withoutAxisUp() {
    axisUp = false;
    return this;
  }

  /** Draws everything and returns the plane, for what is to stand around it. */
  Plane draw(Graphics2D graphics, Rectangle2D area) {
    Rectangle2D inner =
        new Rectangle2D.Double(
            area.getX() + margins.left(),
            area.getY() + margins.above(),
            area.getWidth() - margins.left() - margins.right(),
            area.getHeight() - margins.above() - margins.below());
    smooth(graphics);
    Plane plane = new Plane(inner, across, up);
    plot(plane).draw(graphics, area, null, null, null);
    // Once more, over what the layers may have laid on them.
    graphics.setPaint(style.quiet());
    graphics.setStroke(style.line(0.5));
    graphics.draw(
        new Line2D.Double(inner.getMinX(), inner.getMaxY(), inner.getMaxX(), inner.getMaxY()));
    if (axisUp) {
      graphics.draw(
          new Line2D.Double(inner.getMinX(), inner.getMinY(), inner.getMinX(), inner.getMaxY()));
    }
    Label.left(style.label(), style.ink())
        .draw(graphics, up.label(), area.getX(), area.getY() + margins.above() - 7 - raised);
    Label.right(style.label(), style.ink())
        .draw(graphics, across.label(), inner.getMaxX(), inner.getMaxY() + 20);
    return plane;
  }

  /** Draws lines and letters smooth, and as wide as they are. */
  static void smooth(Graphics2D graphics) {
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
  }

  private XYPlot plot(Plane plane) {
    XYPlot plot =
        new XYPlot(new XYSeriesCollection(), axis(across), axis(up), new XYLineAndShapeRenderer());
    plot.getRangeAxis().setVisible(axisUp);
    plot.setBackgroundPaint(null);
    plot.setOutlineVisible(false);
    plot.setNoDataMessage(null);
    plot.setInsets(RectangleInsets.ZERO_INSETS);
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    plot.setDomainGridlinesVisible(gridAcross);
    plot.setRangeGridlinesVisible(gridUp);
    plot.setDomainGridlinePaint(style.faint());
    plot.setRangeGridlinePaint(style.faint());
    plot.setDomainGridlineStroke(style.line(0.35));
    plot.setRangeGridlineStroke(style.line(0.35));
    plot.setDomainZeroBaselineVisible(false);
    plot.setFixedDomainAxisSpace(space(0, 0, margins.above(), margins.below()));
    plot.setFixedRangeAxisSpace(space(margins.left(), margins.right(), 0, 0));
    for (Layer layer : layers) {
      plot.addAnnotation(new LayerAnnotation(layer, plane), false);
    }
    return plot;
  }

  private static AxisSpace space(double left, double right, double top, double bottom) {
    AxisSpace space = new AxisSpace();
    space.setLeft(left);
    space.setRight(right);
    space.setTop(top);
    space.setBottom(bottom);
    return space;
  }

  private NumberAxis axis(AxisScale scale) {
    Font tick = style.tick();
    NumberAxis axis = new NumberAxis(null);
    axis.setRange(new Range(scale.from(), scale.to()), true, false);
    axis.setTickUnit(new RoundTicks(scale), false, true);
    axis.setInverted(scale.inverted());
    axis.setTickLabelFont(tick);
    axis.setTickLabelPaint(style.quiet());
    axis.setTickLabelInsets(new RectangleInsets(1.5, 2, 1, 2));
    axis.setAxisLinePaint(style.quiet());
    axis.setAxisLineStroke(style.line(0.5));
    axis.setTickMarkPaint(style.quiet());
    axis.setTickMarkStroke(style.line(0.5));
    axis.setTickMarkOutsideLength(2.5f);
    return axis;
  }
}
