package org.crossreach.report.chart;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.zip.CRC32;

/**
 * Writes opaque images as PNG, the same bytes on every machine. Source: W3C, Portable Network
 * Graphics (PNG) Specification, second edition, 2003.
 */
final class PngEncoder {

  private static final byte[] SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', '\r', '\n', 0x1A, '\n'};
  private static final int TRUE_COLOUR = 2;
  private static final int PALETTE = 3;
  private static final int FILTER_UP = 2;
  private static final double INCH_M = 0.0254;

  private PngEncoder() {}

  /**
   * Encodes an image.
   *
   * @param image an image with a palette, or with red, green and blue
   * @param pixelsPerInch for programs that print
   */
  static byte[] encode(BufferedImage image, double pixelsPerInch) {
    boolean indexed = image.getColorModel() instanceof IndexColorModel;
    ByteArrayOutputStream png = new ByteArrayOutputStream();
    png.writeBytes(SIGNATURE);
    ByteBuffer header = ByteBuffer.allocate(13);
    header.putInt(image.getWidth()).putInt(image.getHeight());
    header.put((byte) 8).put((byte) (indexed ? PALETTE : TRUE_COLOUR));
    chunk(png, "IHDR", header.array());
    int perMetre = (int) Math.round(pixelsPerInch / INCH_M);
    chunk(
        png,
        "pHYs",
        ByteBuffer.allocate(9).putInt(perMetre).putInt(perMetre).put((byte) 1).array());
    if (indexed) {
      chunk(png, "PLTE", IndexedRows.palette((IndexColorModel) image.getColorModel()));
    }
    chunk(
        png,
        "IDAT",
        PortableDeflate.compress(indexed ? IndexedRows.filtered(image) : filtered(image)));
    chunk(png, "IEND", new byte[0]);
    return png.toByteArray();
  }

  private static byte[] filtered(BufferedImage image) {
    int width = image.getWidth();
    byte[] filtered = new byte[(3 * width + 1) * image.getHeight()];
    int[] above = new int[width];
    int[] row = new int[width];
    int at = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      image.getRGB(0, y, width, 1, row, 0, width);
      filtered[at++] = FILTER_UP;
      for (int x = 0; x < width; x++) {
        for (int shift = 16; shift >= 0; shift -= 8) {
          filtered[at++] = (byte) ((row[x] >> shift) - (above[x] >> shift));
        }
      }
      int[] swap = above;
      above = row;
      row = swap;
    }
    return filtered;
  }

  private static void chunk(ByteArrayOutputStream png, String type, byte[] data) {
    byte[] name = type.getBytes(StandardCharsets.US_ASCII);
    CRC32 crc = new CRC32();
    crc.update(name);
    crc.update(data);
    png.writeBytes(ByteBuffer.allocate(4).putInt(data.length).array());
    png.writeBytes(name);
    png.writeBytes(data);
    png.writeBytes(ByteBuffer.allocate(4).putInt((int) crc.getValue()).array());
  }
}
