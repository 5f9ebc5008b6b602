package org.crossreach.report.pdf;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.crossreach.report.chart.Face;
import org.crossreach.report.chart.Picture;

/** A PDF while its pages are laid out; one book belongs to one thread. */
final class Book implements AutoCloseable {

  private final PDDocument pdf = new PDDocument();
  private final Structure structure = new Structure();
  private final Map<Face, PDType0Font> fonts = new EnumMap<>(Face.class);
  private final List<Sheet> sheets = new ArrayList<>();
  private final Paper paper;

  Book(Paper paper) {
    this.paper = paper;
  }

  PDDocument pdf() {
    return pdf;
  }

  Paper paper() {
    return paper;
  }

  Structure structure() {
    return structure;
  }

  List<Sheet> sheets() {
    return sheets;
  }

  /** A face in this book; only the characters that are used travel with it. */
  PDType0Font font(Face face) throws IOException {
    PDType0Font font = fonts.get(face);
    if (font == null) {
      TrueTypeFont file = new TTFParser().parse(new RandomAccessReadBuffer(face.bytes()));
      // Ligatures would cost a third of the time and make letters harder to find.
      file.setEnableGsub(false);
      font = PDType0Font.load(pdf, file, /* embedSubset= */ true);
      fonts.put(face, font);
    }
    return font;
  }

  /** Opens a new page at the end. */
  Sheet newSheet() throws IOException {
    PDPage page = new PDPage(new PDRectangle((float) paper.width(), (float) paper.height()));
    pdf.addPage(page);
    structure.addPage(page);
    PDPageContentStream content =
        new PDPageContentStream(
            pdf, page, PDPageContentStream.AppendMode.OVERWRITE, /* compress= */ false);
    Sheet sheet = new Sheet(this, page, sheets.size(), content);
    sheets.add(sheet);
    return sheet;
  }

  /** Draws a picture once, to be placed on a page. */
  PDFormXObject drawn(Picture picture, double width, double height) throws IOException {
    PictureCanvas canvas = new PictureCanvas(this, width, height);
    picture.draw(canvas.graphics(), new Rectangle2D.Double(0, 0, width, height));
    return canvas.finished();
  }

  @Override
  public void close() throws IOException {
    pdf.close();
  }
}
