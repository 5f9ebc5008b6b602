package org.crossreach.report.pdf;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * Lets blocks flow over pages.
 *
 * @param book the pages
 * @param foot what stands at the foot of every page, at the left
 * @param ink how it looks
 * @param rule the line above it
 */
record Flow(Book book, String foot, Ink ink, Color rule) {

  static final double SIDE = 42;
  private static final double ABOVE = 34;
  private static final double BELOW = 40;

  double width() {
    return book.paper().width() - 2 * SIDE;
  }

  /** Lays out everything. */
  void lay(List<Block> blocks) throws IOException {
    List<Block> parts = new ArrayList<>();
    for (Block block : blocks) {
      parts.addAll(block.parts());
    }
    double bottom = book.paper().height() - BELOW;
    Structure.Element document = book.structure().document();
    Sheet sheet = book.newSheet();
    double y = ABOVE;
    boolean fresh = true;
    for (int b = 0; b < parts.size(); b++) {
      Block block = parts.get(b);
      if (!fresh && y + needed(parts, b) > bottom) {
        sheet = book.newSheet();
        y = ABOVE;
        for (Block repeated : block.repeatedAbove()) {
          repeated.draw(sheet, document, SIDE, y, width());
          y += repeated.height(width());
        }
        fresh = true;
      }
      if (block.sinks()) {
        y = bottom - block.height(width());
      }
      if (fresh && block instanceof Gap) {
        continue;
      }
      block.draw(sheet, document, SIDE, y, width());
      y += block.height(width());
      fresh = false;
    }
    feet();
  }

  /** Height of a block with those that may not be parted from it. */
  private double needed(List<Block> parts, int from) {
    double needed = 0;
    for (int b = from; b < parts.size(); b++) {
      needed += parts.get(b).height(width());
      if (!parts.get(b).staysWithNext()) {
        break;
      }
    }
    return needed;
  }

  private void feet() throws IOException {
    double baseline = book.paper().height() - 24;
    double right = book.paper().width() - SIDE;
    int count = book.sheets().size();
    for (int s = 0; s < count; s++) {
      Sheet sheet = book.sheets().get(s);
      String page = "Page " + (s + 1) + " of " + count;
      sheet.decoration(
          () -> {
            sheet.line(rule, 0.4, SIDE, baseline - 10, right, baseline - 10);
            sheet.text(ink, ink.shown(foot), SIDE, baseline);
            sheet.text(ink, page, right - ink.width(page), baseline);
          });
      sheet.close();
    }
  }
}
