package org.crossreach.report.pdf;

import java.awt.Color;
import java.io.IOException;

/**
 * A line across.
 *
 * @param colour its colour
 * @param thick its width (pt)
 */
record Rule(Color colour, double thick) implements Block {

  @Override
  public double height(double width) {
    return thick;
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double middle = y + thick / 2;
    sheet.decoration(() -> sheet.line(colour, thick, x, middle, x + width, middle));
  }

  @Override
  public boolean staysWithNext() {
    return true;
  }
}
