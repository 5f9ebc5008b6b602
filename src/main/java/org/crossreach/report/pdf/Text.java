package org.crossreach.report.pdf;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * A paragraph or heading.
 *
 * @param type what it is in the structure: {@code P}, {@code H1}, {@code H2}
 * @param ink how it looks
 * @param text what it says
 */
record Text(String type, Ink ink, String text) implements Block {

  static Text paragraph(Ink ink, String text) {
    return new Text("P", ink, text);
  }

  @Override
  public double height(double width) {
    return lines(ink, text, width).size() * ink.leading();
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    write(sheet, parent.add(type), type, x, y, width);
  }

  /** Writes the lines as one piece of an element. */
  void write(Sheet sheet, Structure.Element element, String type, double x, double y, double width)
      throws IOException {
    if (!Typeface.of(ink.face()).shows(text)) {
      element.actualText(text);
    }
    List<String> lines = lines(ink, text, width);
    sheet.piece(
        element,
        type,
        () -> {
          double baseline = y + ink.ascent();
          for (String line : lines) {
            sheet.text(ink, line, x, baseline);
            baseline += ink.leading();
          }
        });
  }

  @Override
  public boolean staysWithNext() {
    return type.startsWith("H");
  }

  /**
   * Breaks a text into lines, at spaces, or inside a word that is wider than a line.
   *
   * @return the lines as the face can show them, at least one
   */
  static List<String> lines(Ink ink, String text, double width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : ink.shown(text).split(" +", -1)) {
      String rest = word;
      if (line.length() > 0 && ink.width(line + " " + rest) > width) {
        lines.add(line.toString());
        line.setLength(0);
      }
      while (line.length() == 0 && ink.width(rest) > width && rest.length() > 1) {
        int fits = fitting(ink, rest, width);
        lines.add(rest.substring(0, fits));
        rest = rest.substring(fits);
      }
      line.append(line.length() > 0 ? " " : "").append(rest);
    }
    lines.add(line.toString());
    return lines;
  }

  /** How many letters of a word fit, at least one. */
  private static int fitting(Ink ink, String word, double width) {
    int fits = 1;
    while (fits < word.length() && ink.width(word.substring(0, fits + 1)) <= width) {
      fits++;
    }
    return fits;
  }
}
