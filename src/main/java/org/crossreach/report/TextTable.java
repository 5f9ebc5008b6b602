package org.crossreach.report;

import java.util.ArrayList;
import java.util.List;

/** A table of text in columns: the first ones to the left, the others to the right. */
public final class TextTable {

  private final int leftAligned;
  private final String gap;
  private final List<String[]> rows = new ArrayList<>();

  /**
   * Starts an empty table.
   *
   * @param leftAligned number of columns, from the first, that are aligned to the left
   */
  public TextTable(int leftAligned) {
    this(leftAligned, 2);
  }

  /**
   * Starts an empty table with another gap.
   *
   * @param leftAligned number of columns, from the first, that are aligned to the left
   * @param gap blanks between columns
   */
  public TextTable(int leftAligned, int gap) {
    this.leftAligned = leftAligned;
    this.gap = " ".repeat(gap);
  }

  /** Appends a row; every row has the same number of cells. */
  public void row(String... cells) {
    rows.add(cells);
  }

  /** Appends a line across the table. */
  public void rule() {
    rows.add(null);
  }

  /** The lines of the table, without blanks at their ends. */
  public List<String> lines() {
    int[] widths = widths();
    int whole = -gap.length();
    for (int width : widths) {
      whole += width + gap.length();
    }
    List<String> lines = new ArrayList<>();
    for (String[] row : rows) {
      lines.add(row == null ? "-".repeat(whole) : line(row, widths));
    }
    return lines;
  }

  private int[] widths() {
    int[] widths = new int[0];
    for (String[] row : rows) {
      if (row != null && widths.length == 0) {
        widths = new int[row.length];
      }
      for (int c = 0; row != null && c < row.length; c++) {
        widths[c] = Math.max(widths[c], row[c].codePointCount(0, row[c].length()));
      }
    }
    return widths;
  }

  private String line(String[] row, int[] widths) {
    StringBuilder line = new StringBuilder();
    for (int c = 0; c < row.length; c++) {
      String padding = " ".repeat(widths[c] - row[c].codePointCount(0, row[c].length()));
      line.append(c == 0 ? "" : gap);
      line.append(c < leftAligned ? row[c] + padding : padding + row[c]);
    }
    return line.toString().stripTrailing();
  }
}
