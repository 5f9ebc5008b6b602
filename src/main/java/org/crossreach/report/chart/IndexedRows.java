package org.crossreach.report.chart;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.awt.image.Raster;

/** The pixels of an image with a palette, as PNG and PDF both want them before compression. */
public final class IndexedRows {

  private static final int FILTER_UP = 2;

  private IndexedRows() {}

  /** Red, green and blue of each colour in turn. */
  public static byte[] palette(IndexColorModel model) {
    byte[] palette = new byte[3 * model.getMapSize()];
    for (int c = 0; c < model.getMapSize(); c++) {
      palette[3 * c] = (byte) model.getRed(c);
      palette[3 * c + 1] = (byte) model.getGreen(c);
      palette[3 * c + 2] = (byte) model.getBlue(c);
    }
    return palette;
  }

  /**
   * Rows of palette indexes, each as its difference from the row above, after the filter's name.
   */
  public static byte[] filtered(BufferedImage image) {
    int width = image.getWidth();
    Raster raster = image.getRaster();
    byte[] filtered = new byte[(width + 1) * image.getHeight()];
    int[] above = new int[width];
    int[] row = new int[width];
    int at = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      raster.getSamples(0, y, width, 1, 0, row);
      filtered[at++] = FILTER_UP;
      for (int x = 0; x < width; x++) {
        filtered[at++] = (byte) (row[x] - above[x]);
      }
      int[] swap = above;
      above = row;
      row = swap;
    }
    return filtered;
  }
}
