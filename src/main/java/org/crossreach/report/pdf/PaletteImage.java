package org.crossreach.report.pdf;

import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.io.IOException;
import java.io.OutputStream;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDStream;
import org.apache.pdfbox.pdmodel.graphics.image.PDImageXObject;
import org.crossreach.report.chart.IndexedRows;
import org.crossreach.report.chart.PortableDeflate;

/** Embeds an image with a palette of at most 256 colours, one byte a pixel. */
final class PaletteImage {

  /** Each row as its difference from the row above (ISO 32000-1, table 10). */
  private static final int PREDICTOR = 12;

  private PaletteImage() {}

  /**
   * Embeds an image.
   *
   * @throws IllegalArgumentException when the image has no palette
   */
  static PDImageXObject of(PDDocument document, BufferedImage image) throws IOException {
    if (!(image.getColorModel() instanceof IndexColorModel model)) {
      throw new IllegalArgumentException("image must have a palette");
    }
    COSStream stream = document.getDocument().createCOSStream();
    try (OutputStream raw = stream.createRawOutputStream()) {
      raw.write(PortableDeflate.compress(IndexedRows.filtered(image)));
    }
    COSDictionary parameters = new COSDictionary();
    parameters.setInt(COSName.PREDICTOR, PREDICTOR);
    parameters.setInt(COSName.COLUMNS, image.getWidth());
    parameters.setInt(COSName.COLORS, 1);
    parameters.setInt(COSName.BITS_PER_COMPONENT, 8);
    stream.setItem(COSName.FILTER, COSName.FLATE_DECODE);
    stream.setItem(COSName.DECODE_PARMS, parameters);
    stream.setItem(COSName.TYPE, COSName.XOBJECT);
    stream.setItem(COSName.SUBTYPE, COSName.IMAGE);
    stream.setInt(COSName.WIDTH, image.getWidth());
    stream.setInt(COSName.HEIGHT, image.getHeight());
    stream.setInt(COSName.BITS_PER_COMPONENT, 8);
    COSArray colours = new COSArray();
    colours.add(COSName.INDEXED);
    colours.add(COSName.DEVICERGB);
    colours.add(COSInteger.get(model.getMapSize() - 1));
    colours.add(new COSString(IndexedRows.palette(model)));
    stream.setItem(COSName.COLORSPACE, colours);
    return new PDImageXObject(new PDStream(stream), null);
  }
}
