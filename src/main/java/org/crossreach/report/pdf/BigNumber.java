package org.crossreach.report.pdf;

import java.io.IOException;

/**
 * A number that everything is about, with its unit behind it.
 *
 * @param number the number
 * @param unit the unit
 * @param ink how the number looks
 * @param small how the unit looks
 */
record BigNumber(String number, String unit, Ink ink, Ink small) implements Block {

  @Override
  public double height(double width) {
    return ink.leading();
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double baseline = y + ink.ascent();
    String shown = ink.shown(number);
    sheet.piece(
        parent.add("P"),
        "P",
        () -> {
          sheet.text(ink, shown + " ", x, baseline);
          sheet.text(small, unit, x + ink.width(shown + " "), baseline);
        });
  }
}
