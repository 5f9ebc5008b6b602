package org.crossreach.report.pdf;

import java.io.IOException;
import java.util.List;

/**
 * Stacks of blocks beside each other.
 *
 * @param columns the stacks, from left to right
 * @param shares width of each as a share of the whole, with their gaps
 * @param gap room between them (pt)
 */
record SideBySide(List<List<Block>> columns, List<Double> shares, double gap) implements Block {

  SideBySide {
    columns = List.copyOf(columns);
    shares = List.copyOf(shares);
    if (columns.size() != shares.size()) {
      throw new IllegalArgumentException("shares must be as many as columns");
    }
  }

  private double width(int column, double width) {
    double sum = 0;
    for (double share : shares) {
      sum += share;
    }
    return (width - gap * (columns.size() - 1)) * shares.get(column) / sum;
  }

  @Override
  public double height(double width) {
    double highest = 0;
    for (int c = 0; c < columns.size(); c++) {
      double high = 0;
      for (Block block : columns.get(c)) {
        high += block.height(width(c, width));
      }
      highest = Math.max(highest, high);
    }
    return highest;
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double left = x;
    for (int c = 0; c < columns.size(); c++) {
      double columnWidth = width(c, width);
      double top = y;
      for (Block block : columns.get(c)) {
        block.draw(sheet, parent, left, top, columnWidth);
        top += block.height(columnWidth);
      }
      left += columnWidth + gap;
    }
  }
}
