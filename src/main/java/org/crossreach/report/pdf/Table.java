package org.crossreach.report.pdf;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * A table with a heading above each column. A page may end after any row; the headings are then
 * repeated.
 */
final class Table implements Block {

  private static final double PAD = 1.5;
  private static final double BETWEEN = 8;

  private final List<Heading> headings;
  private final Look look;
  private final List<List<String>> rows = new ArrayList<>();
  private Structure.Element element;

  /**
   * A column's heading.
   *
   * @param text what it says, with the unit
   * @param numbers whether the column holds numbers, which stand at the right
   * @param flexible whether the column takes the room that is left and breaks its text
   */
  record Heading(String text, boolean numbers, boolean flexible) {

    static Heading words(String text) {
      return new Heading(text, false, false);
    }

    static Heading numbers(String text) {
      return new Heading(text, true, false);
    }

    static Heading prose(String text) {
      return new Heading(text, false, true);
    }
  }

  /**
   * How a table looks.
   *
   * @param heading the headings
   * @param body the rows
   * @param strong the last row, where it is a sum
   * @param rule lines between rows
   * @param firmRule lines under the headings and above a sum
   */
  record Look(Ink heading, Ink body, Ink strong, Color rule, Color firmRule) {}

  Table(Look look, List<Heading> headings) {
    this.look = look;
    this.headings = List.copyOf(headings);
  }

  /** Adds a row. */
  Table row(String... cells) {
    return row(List.of(cells));
  }

  /** Adds a row. */
  Table row(List<String> cells) {
    if (cells.size() != headings.size()) {
      throw new IllegalArgumentException("cells must be as many as headings");
    }
    rows.add(List.copyOf(cells));
    return this;
  }

  boolean isEmpty() {
    return rows.isEmpty();
  }

  @Override
  public List<Block> parts() {
    List<Block> parts = new ArrayList<>();
    parts.add(new Row(headingCells(), look.heading(), true, false));
    for (List<String> cells : rows) {
      parts.add(new Row(cells, look.body(), false, false));
    }
    return parts;
  }

  /** The same table whose last row is a sum. */
  Block withSum() {
    List<Block> parts = new ArrayList<>(parts());
    parts.set(parts.size() - 1, new Row(rows.get(rows.size() - 1), look.strong(), false, true));
    return new Stack(parts);
  }

  private List<String> headingCells() {
    return headings.stream().map(Heading::text).toList();
  }

  @Override
  public double height(double width) {
    return new Stack(parts()).height(width);
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    new Stack(parts()).draw(sheet, parent, x, y, width);
  }

  /** Width of each column: as its widest text needs, what is left to the flexible ones. */
  private double[] widths(double width) {
    double[] widths = new double[headings.size()];
    double left = width - BETWEEN * (widths.length - 1);
    int flexible = 0;
    for (int c = 0; c < widths.length; c++) {
      if (headings.get(c).flexible()) {
        flexible++;
        continue;
      }
      widths[c] = natural(look.heading(), headings.get(c).text());
      for (List<String> row : rows) {
        widths[c] = Math.max(widths[c], natural(look.strong(), row.get(c)));
      }
      left -= widths[c];
    }
    for (int c = 0; c < widths.length; c++) {
      if (headings.get(c).flexible()) {
        widths[c] = Math.max(30, left / flexible);
      } else if (flexible == 0) {
        widths[c] += Math.max(0, left) / widths.length;
      }
    }
    return widths;
  }

  private static double natural(Ink ink, String text) {
    return ink.width(ink.shown(text));
  }

  /** One row, which may begin a page. */
  private final class Row implements Block {
    private final List<String> cells;
    private final Ink ink;
    private final boolean heading;
    private final boolean sum;

    Row(List<String> cells, Ink ink, boolean heading, boolean sum) {
      this.cells = cells;
      this.ink = ink;
      this.heading = heading;
      this.sum = sum;
    }

    @Override
    public double height(double width) {
      double[] widths = widths(width);
      int most = 1;
      for (int c = 0; c < widths.length; c++) {
        most = Math.max(most, Text.lines(ink, cells.get(c), widths[c] + 0.01).size());
      }
      return most * ink.leading() + 2 * PAD;
    }

    @Override
    public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
        throws IOException {
      double bottom = y + height(width);
      sheet.decoration(
          () -> {
            sheet.line(
                heading ? look.firmRule() : look.rule(),
                heading ? 0.7 : 0.35,
                x,
                bottom,
                x + width,
                bottom);
            if (sum) {
              sheet.line(look.firmRule(), 0.7, x, y, x + width, y);
            }
          });
      if (element == null) {
        element = parent.add("Table");
      }
      write(sheet, element.add("TR"), x, y, width);
    }

    private void write(Sheet sheet, Structure.Element row, double x, double y, double width)
        throws IOException {
      double[] widths = widths(width);
      double left = x;
      for (int c = 0; c < widths.length; c++) {
        String cell = cells.get(c);
        String type = heading ? "TH" : "TD";
        Structure.Element at = row.add(type);
        if (heading) {
          at.headsColumn();
        }
        double shift = headings.get(c).numbers() ? Math.max(0, widths[c] - natural(ink, cell)) : 0;
        if (!cell.isEmpty()) {
          Text.paragraph(ink, cell)
              .write(sheet, at, type, left + shift, y + PAD, widths[c] - shift + 0.01);
        }
        left += widths[c] + BETWEEN;
      }
    }

    @Override
    public boolean staysWithNext() {
      return heading;
    }

    @Override
    public List<Block> repeatedAbove() {
      return heading ? List.of() : List.of(new RepeatedHeadings());
    }
  }

  /** The headings once more on a new page: the structure has them already. */
  private final class RepeatedHeadings implements Block {

    @Override
    public double height(double width) {
      return new Row(headingCells(), look.heading(), true, false).height(width);
    }

    @Override
    public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
        throws IOException {
      double bottom = y + height(width);
      double[] widths = widths(width);
      sheet.decoration(
          () -> {
            sheet.line(look.firmRule(), 0.7, x, bottom, x + width, bottom);
            double left = x;
            for (int c = 0; c < widths.length; c++) {
              String text = look.heading().shown(headings.get(c).text());
              double shift = headings.get(c).numbers() ? widths[c] - look.heading().width(text) : 0;
              sheet.text(look.heading(), text, left + shift, y + PAD + look.heading().ascent());
              left += widths[c] + BETWEEN;
            }
          });
    }
  }
}
