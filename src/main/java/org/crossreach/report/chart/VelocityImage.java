package org.crossreach.report.chart;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.awt.image.WritableRaster;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The usable cells of a pass as one image, each at its true width and height; a pixel that several
 * ensembles cover takes their mean. Colour 0 is the paper.
 */
final class VelocityImage {

  private final int width;
  private final int height;
  private final double[] sum;
  private final double[] weight;

  private VelocityImage(int width, int height) {
    this.width = width;
    this.height = height;
    sum = new double[width * height];
    weight = new double[width * height];
  }

  /**
   * Draws the cells.
   *
   * @param shape the pass
   * @param depthM depth at the lower edge of the image (m); its upper edge is the surface
   * @param colours velocities of the lightest and the darkest colour
   * @param width pixels between the ends of the measured water
   * @param height pixels from the surface down
   */
  static BufferedImage of(
      SectionShape shape, double depthM, VelocityRange colours, int width, int height) {
    VelocityImage image = new VelocityImage(width, height);
    Section section = shape.section();
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    double perMetre = width / (shape.rightEndM() - shape.leftEndM());
    for (int i = 0; i < shape.size(); i++) {
      section.read(i, row, column);
      double from = (shape.fromM(i) - shape.leftEndM()) * perMetre;
      double to = (shape.toM(i) - shape.leftEndM()) * perMetre;
      for (int j = 0; j < column.size(); j++) {
        image.add(
            from,
            to,
            (column.depthM() - column.upperM(j)) / depthM * height,
            (column.depthM() - column.lowerM(j)) / depthM * height,
            column.velocityMps(Component.NORMAL, j));
      }
    }
    return image.coloured(colours);
  }

  /** Adds a cell to the pixels whose middle row it covers, by the share of their width. */
  private void add(double from, double to, double upper, double lower, double velocity) {
    int firstRow = Math.max(0, (int) Math.ceil(upper - 0.5));
    int endRow = Math.min(height, (int) Math.ceil(lower - 0.5));
    for (int x = Math.max(0, (int) from); x < width && x < to; x++) {
      double share = Math.min(x + 1, to) - Math.max(x, from);
      for (int y = firstRow; y < endRow; y++) {
        sum[y * width + x] += share * velocity;
        weight[y * width + x] += share;
      }
    }
  }

  private BufferedImage coloured(VelocityRange colours) {
    BufferedImage image =
        new BufferedImage(width, height, BufferedImage.TYPE_BYTE_INDEXED, palette());
    WritableRaster raster = image.getRaster();
    int[] line = new int[width];
    for (int y = 0; y < height; y++) {
      for (int x = 0; x < width; x++) {
        int at = y * width + x;
        line[x] =
            weight[at] > 1e-6
                ? colour((sum[at] / weight[at] - colours.lowest()) / colours.span())
                : 0;
      }
      raster.setSamples(0, y, width, 1, 0, line);
    }
    return image;
  }

  private static int colour(double share) {
    return 1 + (int) Math.max(0, Math.min(254, Math.floor(share * 255)));
  }

  private static IndexColorModel palette() {
    int[] rgb = new int[256];
    rgb[0] = 0xFFFFFF;
    for (int c = 1; c < 256; c++) {
      rgb[c] = ColourMap.at((c - 0.5) / 255).getRGB() & 0xFFFFFF;
    }
    return new IndexColorModel(
        8,
        256,
        rgb,
        0,
        /* hasalpha= */ false,
        /* trans= */ -1,
        java.awt.image.DataBuffer.TYPE_BYTE);
  }
}
