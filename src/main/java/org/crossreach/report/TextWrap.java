package org.crossreach.report;

import java.util.ArrayList;
import java.util.List;

/** Breaks prose into lines. */
public final class TextWrap {

  private TextWrap() {}

  /**
   * Breaks a text at its blanks.
   *
   * @param text the text
   * @param width most characters in a line; a longer word stands alone in its line
   * @param indent what every line but the first begins with
   */
  public static List<String> lines(String text, int width, String indent) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" ", -1)) {
      if (line.length() > 0 && line.length() + 1 + word.length() > width) {
        lines.add(line.toString());
        line.setLength(0);
        line.append(indent).append(word);
      } else {
        line.append(line.length() == 0 ? "" : " ").append(word);
      }
    }
    lines.add(line.toString());
    return lines;
  }
}
