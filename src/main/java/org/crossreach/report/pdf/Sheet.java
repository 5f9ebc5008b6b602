package org.crossreach.report.pdf;

import java.awt.Color;
import java.io.IOException;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.util.Matrix;

/**
 * One page. Places are in points from the upper left corner; everything drawn is either a piece of
 * an element of the structure or mere decoration.
 */
final class Sheet {

  private final Book book;
  private final PDPage page;
  private final int number;
  private final double height;
  private final PDPageContentStream content;

  Sheet(Book book, PDPage page, int number, PDPageContentStream content) {
    this.book = book;
    this.page = page;
    this.number = number;
    this.height = page.getMediaBox().getHeight();
    this.content = content;
  }

  /** Something to draw. */
  interface Drawing {
    void draw() throws IOException;
  }

  /** Draws a piece of an element. */
  void piece(Structure.Element element, String type, Drawing drawing) throws IOException {
    content.beginMarkedContent(COSName.getPDFName(type), element.mark(page, number));
    drawing.draw();
    content.endMarkedContent();
  }

  /** Draws what says nothing. */
  void decoration(Drawing drawing) throws IOException {
    content.beginMarkedContent(COSName.ARTIFACT);
    drawing.draw();
    content.endMarkedContent();
  }

  /** Draws a line of text with its left end on a base line; {@link Ink#shown} text only. */
  void text(Ink ink, String text, double x, double baseline) throws IOException {
    content.beginText();
    content.setFont(book.font(ink.face()), (float) ink.size());
    content.setNonStrokingColor(ink.colour());
    content.newLineAtOffset((float) x, (float) (height - baseline));
    content.showText(text);
    content.endText();
  }

  /** Draws a straight line. */
  void line(Color colour, double width, double fromX, double fromY, double toX, double toY)
      throws IOException {
    content.setStrokingColor(colour);
    content.setLineWidth((float) width);
    content.moveTo((float) fromX, (float) (height - fromY));
    content.lineTo((float) toX, (float) (height - toY));
    content.stroke();
  }

  /** Fills a rectangle. */
  void fill(Color colour, double x, double y, double width, double high) throws IOException {
    content.setNonStrokingColor(colour);
    content.addRect((float) x, (float) (height - y - high), (float) width, (float) high);
    content.fill();
  }

  /** Draws a finished drawing with its upper left corner at a place. */
  void form(PDFormXObject form, double x, double y) throws IOException {
    content.saveGraphicsState();
    float high = form.getBBox().getHeight();
    content.transform(Matrix.getTranslateInstance((float) x, (float) (height - y - high)));
    content.drawForm(form);
    content.restoreGraphicsState();
  }

  /** Says where a figure stands. */
  void box(Structure.Element figure, double x, double y, double width, double high) {
    figure.box(x, height - y - high, x + width, height - y);
  }

  Book book() {
    return book;
  }

  void close() throws IOException {
    content.close();
  }
}
