package org.crossreach.report.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import org.crossreach.report.Decimals;
import org.jfree.svg.SVGGraphics2D;

/**
 * A picture as a file of its own, with its title above it.
 *
 * @param picture the picture
 * @param style its colours and fonts
 */
public record PictureFile(Picture picture, ChartStyle style) {

  private static final double WIDTH = 540;
  private static final double BORDER = 14;
  private static final double TITLE = 18;
  private static final double SCALE = 2;
  private static final double INCH_PT = 72;

  /** A picture in the one look of all reports. */
  public PictureFile(Picture picture) {
    this(picture, ChartStyle.standard());
  }

  /** The picture as SVG; its text stays text, and the letters that it needs are inside. */
  public byte[] svg() {
    double height = height();
    SVGGraphics2D graphics = new SVGGraphics2D(WIDTH, height);
    graphics.setDefsKeyPrefix(picture.name() + "-");
    graphics.setGeomDoubleConverter(new Decimals(3)::of);
    graphics.setTransformDoubleConverter(new Decimals(6)::of);
    graphics.setFontFunction(
        family -> "\"" + family + "\", Roboto, Arial, \"Liberation Sans\", sans-serif");
    draw(graphics, height);
    return SvgFonts.embedded(graphics.getSVGElement()).getBytes(StandardCharsets.UTF_8);
  }

  /** The picture as PNG, twice as fine as a screen of 72 dots per inch. */
  public byte[] png() {
    double height = height();
    BufferedImage image =
        new BufferedImage(
            (int) Math.ceil(SCALE * WIDTH),
            (int) Math.ceil(SCALE * height),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.scale(SCALE, SCALE);
    draw(graphics, height);
    graphics.dispose();
    return PngEncoder.encode(image, SCALE * INCH_PT);
  }

  private double height() {
    return Math.ceil(picture.height(WIDTH - 2 * BORDER) + 2 * BORDER + TITLE);
  }

  private void draw(Graphics2D graphics, double height) {
    PlotFrame.smooth(graphics);
    graphics.setPaint(style.paper());
    // A point more, since a picture may end inside a pixel.
    graphics.fill(new Rectangle2D.Double(0, 0, WIDTH + 1, height + 1));
    Label.left(style.title(), style.ink()).draw(graphics, picture.title(), BORDER, BORDER + 9);
    picture.draw(
        graphics,
        new Rectangle2D.Double(
            BORDER, BORDER + TITLE, WIDTH - 2 * BORDER, height - 2 * BORDER - TITLE));
  }
}
