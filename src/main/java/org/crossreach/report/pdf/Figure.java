package org.crossreach.report.pdf;

import java.io.IOException;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.crossreach.report.chart.Picture;

/**
 * A picture with its title above it.
 *
 * @param picture the picture
 * @param ink how the title looks
 * @param tallest height that the picture may take at most (pt)
 */
record Figure(Picture picture, Ink ink, double tallest) implements Block {

  private double pictureHeight(double width) {
    return Math.min(tallest, picture.height(width));
  }

  @Override
  public double height(double width) {
    return ink.leading() + 2 + pictureHeight(width);
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double high = pictureHeight(width);
    double top = y + ink.leading() + 2;
    PDFormXObject form = sheet.book().drawn(picture, width, high);
    Structure.Element figure = parent.add("Figure").alternative(picture.description());
    new Text("Caption", ink, picture.title())
        .write(sheet, figure.add("Caption"), "Caption", x, y, width);
    sheet.box(figure, x, top, width, high);
    sheet.piece(figure, "Figure", () -> sheet.form(form, x, top));
  }
}
