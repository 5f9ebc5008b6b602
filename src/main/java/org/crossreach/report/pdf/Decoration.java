package org.crossreach.report.pdf;

import java.io.IOException;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.crossreach.report.chart.Picture;

/**
 * A picture that repeats what a table beside it says; readers that cannot see pass over it.
 *
 * @param picture the picture
 */
record Decoration(Picture picture) implements Block {

  @Override
  public double height(double width) {
    return picture.height(width);
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    PDFormXObject form = sheet.book().drawn(picture, width, picture.height(width));
    sheet.decoration(() -> sheet.form(form, x, y));
  }
}
