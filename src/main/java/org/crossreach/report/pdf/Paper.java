package org.crossreach.report.pdf;

import org.crossreach.settings.Choice;

/** The size of a page. */
public enum Paper implements Choice {
  /** ISO 216: 210 mm x 297 mm. */
  A4("a4", 595.276, 841.89),
  /** US letter: 8.5 in x 11 in. */
  LETTER("letter", 612, 792);

  private final String key;
  private final double width;
  private final double height;

  Paper(String key, double width, double height) {
    this.key = key;
    this.width = width;
    this.height = height;
  }

  @Override
  public String key() {
    return key;
  }

  /** Width (pt). */
  double width() {
    return width;
  }

  /** Height (pt). */
  double height() {
    return height;
  }
}
