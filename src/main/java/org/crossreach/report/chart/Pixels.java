package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Base64;
import org.jfree.svg.SVGGraphics2D;
import org.jfree.svg.SVGHints;

/** Draws an image whose pixels are to stay sharp. */
final class Pixels {

  private static final double INCH_PT = 72;

  private Pixels() {}

  /**
   * Draws an image.
   *
   * @param graphics where to
   * @param image an image with a palette
   * @param room the place that it fills (pt)
   */
  static void draw(Graphics2D graphics, BufferedImage image, Rectangle2D room) {
    graphics.setRenderingHint(
        RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_NEAREST_NEIGHBOR);
    if (graphics instanceof SVGGraphics2D) {
      // The library would compress the image by the platform; a reference lets us do it.
      byte[] png = PngEncoder.encode(image, INCH_PT);
      graphics.setRenderingHint(
          SVGHints.KEY_IMAGE_HANDLING, SVGHints.VALUE_IMAGE_HANDLING_REFERENCE);
      graphics.setRenderingHint(
          SVGHints.KEY_IMAGE_HREF,
          "data:image/png;base64," + Base64.getEncoder().encodeToString(png));
    }
    AffineTransform place = AffineTransform.getTranslateInstance(room.getMinX(), room.getMinY());
    place.scale(room.getWidth() / image.getWidth(), room.getHeight() / image.getHeight());
    graphics.drawImage(image, place, null);
  }
}
