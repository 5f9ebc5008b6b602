package org.crossreach.report.pdf;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * Facts as small labels with their values, in columns of about equal height that are read
 * downwards.
 */
final class Facts implements Block {

  private static final double GAP = 12;
  private static final double AFTER_LABEL = 4;

  private final Ink label;
  private final Ink value;
  private final int columns;
  private final boolean inLine;
  private final List<Fact> facts = new ArrayList<>();

  private record Fact(String label, String value) {}

  private Facts(Ink label, Ink value, int columns, boolean inLine) {
    this.label = label;
    this.value = value;
    this.columns = columns;
    this.inLine = inLine;
  }

  /** Facts whose values stand under their labels. */
  static Facts under(Ink label, Ink value, int columns) {
    return new Facts(label, value, columns, false);
  }

  /** Facts whose values stand behind their labels. */
  static Facts inLine(Ink label, Ink value, int columns) {
    return new Facts(label, value, columns, true);
  }

  /** Adds a fact; one that was not recorded is left out. */
  Facts add(String name, String text) {
    if (!text.isBlank()) {
      facts.add(new Fact(name, text));
    }
    return this;
  }

  private double columnWidth(double width) {
    return (width - GAP * (columns - 1)) / columns;
  }

  private double factHeight(Fact fact, double width) {
    double column = columnWidth(width);
    if (inLine) {
      double room = column - label.width(label.shown(fact.label)) - AFTER_LABEL;
      return Text.lines(value, fact.value, room).size() * value.leading() + 0.5;
    }
    return label.leading() + Text.lines(value, fact.value, column).size() * value.leading() + 3.5;
  }

  /** The facts of each column: a column ends where the next fact would make it the tallest. */
  private List<List<Fact>> laidOut(double width) {
    double least = 0;
    double most = 0;
    for (Fact fact : facts) {
      double high = factHeight(fact, width);
      least = Math.max(least, high);
      most += high;
    }
    // The smallest height at which everything finds its place, to half a point.
    while (most - least > 0.5) {
      double middle = 0.5 * (least + most);
      if (filled(width, middle).size() > columns) {
        least = middle;
      } else {
        most = middle;
      }
    }
    return filled(width, most);
  }

  private List<List<Fact>> filled(double width, double limit) {
    List<List<Fact>> filled = new ArrayList<>();
    double high = 0;
    for (Fact fact : facts) {
      double more = factHeight(fact, width);
      if (filled.isEmpty() || high + more > limit) {
        filled.add(new ArrayList<>());
        high = 0;
      }
      filled.get(filled.size() - 1).add(fact);
      high += more;
    }
    return filled;
  }

  @Override
  public double height(double width) {
    double highest = 0;
    for (List<Fact> column : laidOut(width)) {
      double high = 0;
      for (Fact fact : column) {
        high += factHeight(fact, width);
      }
      highest = Math.max(highest, high);
    }
    return highest;
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double left = x;
    for (List<Fact> column : laidOut(width)) {
      double top = y;
      for (Fact fact : column) {
        draw(sheet, parent.add("P"), fact, left, top, columnWidth(width));
        top += factHeight(fact, width);
      }
      left += columnWidth(width) + GAP;
    }
  }

  private void draw(
      Sheet sheet, Structure.Element element, Fact fact, double x, double y, double width)
      throws IOException {
    double right = inLine ? label.width(label.shown(fact.label)) + AFTER_LABEL : 0;
    double down = inLine ? 0 : label.leading();
    // In a line both stand on one base line.
    double lower = inLine ? value.ascent() - label.ascent() : 0;
    Text.paragraph(label, fact.label)
        .write(sheet, element.add("Span"), "Span", x, y + lower, width);
    Text.paragraph(value, fact.value)
        .write(sheet, element.add("Span"), "Span", x + right, y + down, width - right);
  }
}
