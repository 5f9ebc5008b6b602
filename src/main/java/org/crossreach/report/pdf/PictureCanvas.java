package org.crossreach.report.pdf;

import de.rototor.pdfbox.graphics2d.IPdfBoxGraphics2DFontTextDrawer;
import de.rototor.pdfbox.graphics2d.IPdfBoxGraphics2DImageEncoder;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.font.TextAttribute;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.text.AttributedCharacterIterator;
import java.text.CharacterIterator;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.pdmodel.graphics.image.PDImageXObject;
import org.apache.pdfbox.util.Matrix;
import org.crossreach.report.chart.Face;

/** Turns what a picture draws into PDF: its text stays text, its images keep their palette. */
final class PictureCanvas {

  private final Book book;
  private final PdfBoxGraphics2D graphics;

  /** Opens a canvas of a size (pt). */
  PictureCanvas(Book book, double width, double height) throws IOException {
    this.book = book;
    graphics = new PdfBoxGraphics2D(book.pdf(), (float) width, (float) height);
    graphics.setFontTextDrawer(new Texts());
    graphics.setImageEncoder(new Images());
  }

  Graphics2D graphics() {
    return graphics;
  }

  PDFormXObject finished() {
    graphics.dispose();
    return graphics.getXFormObject();
  }

  /** Writes text in the faces of the book. */
  private final class Texts implements IPdfBoxGraphics2DFontTextDrawer {

    @Override
    public boolean canDrawText(AttributedCharacterIterator text, IFontTextDrawerEnv env) {
      return true;
    }

    @Override
    public void drawText(AttributedCharacterIterator text, IFontTextDrawerEnv env)
        throws IOException {
      Font font = (Font) text.getAttribute(TextAttribute.FONT);
      Face face =
          Face.of(font)
              .orElseThrow(
                  () ->
                      new IllegalStateException(
                          "a picture uses " + font.getPSName() + ", which reports do not have"));
      PDPageContentStream content = env.getContentStream();
      content.beginText();
      content.setFont(book.font(face), font.getSize2D());
      env.applyPaint(env.getPaint(), null);
      content.setTextMatrix(Matrix.getScaleInstance(1, -1));
      content.showText(Typeface.of(face).shown(plain(text)));
      content.endText();
    }

    private String plain(AttributedCharacterIterator text) {
      StringBuilder plain = new StringBuilder();
      for (char c = text.first(); c != CharacterIterator.DONE; c = text.next()) {
        plain.append(c);
      }
      return plain.toString();
    }

    @Override
    public FontMetrics getFontMetrics(Font font, IFontTextDrawerEnv env) {
      return env.getCalculationGraphics().getFontMetrics(font);
    }
  }

  /** Embeds images with their palette. */
  private static final class Images implements IPdfBoxGraphics2DImageEncoder {

    @Override
    public PDImageXObject encodeImage(
        PDDocument document,
        PDPageContentStream content,
        Image image,
        IPdfBoxGraphics2DImageEncoderEnv env) {
      try {
        return PaletteImage.of(document, (BufferedImage) image);
      } catch (IOException impossible) {
        throw new IllegalStateException(impossible);
      }
    }
  }
}
