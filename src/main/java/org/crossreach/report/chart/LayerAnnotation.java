package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Hangs a layer into the chart library's drawing order, which clips it to the plane. */
final class LayerAnnotation extends AbstractXYAnnotation {

  private static final long serialVersionUID = 1L;

  private final transient Layer layer;
  private final transient Plane plane;

  LayerAnnotation(Layer layer, Plane plane) {
    this.layer = layer;
    this.plane = plane;
  }

  @Override
  public void draw(
      Graphics2D graphics,
      XYPlot plot,
      Rectangle2D dataArea,
      ValueAxis domainAxis,
      ValueAxis rangeAxis,
      int rendererIndex,
      PlotRenderingInfo info) {
    Graphics2D own = (Graphics2D) graphics.create();
    layer.draw(own, plane);
    own.dispose();
  }
}
