package org.crossreach.report.pdf;

import java.awt.Color;
import org.crossreach.report.chart.Face;

/**
 * How a piece of text looks.
 *
 * @param face the face
 * @param size the size (pt)
 * @param colour the colour
 */
record Ink(Face face, double size, Color colour) {

  /** Distance between base lines (pt). */
  double leading() {
    return 1.32 * size;
  }

  /** Height of a line above its base line (pt). */
  double ascent() {
    return 0.95 * size;
  }

  double width(String text) {
    return Typeface.of(face).width(text, size);
  }

  /** The text as this face can show it. */
  String shown(String text) {
    return Typeface.of(face).shown(text);
  }
}
