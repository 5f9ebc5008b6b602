package org.crossreach.report.pdf;

import java.io.IOException;
import java.util.List;

/**
 * Blocks under each other.
 *
 * @param blocks the blocks, from the top
 */
record Stack(List<Block> blocks) implements Block {

  Stack {
    blocks = List.copyOf(blocks);
  }

  @Override
  public double height(double width) {
    double high = 0;
    for (Block block : blocks) {
      high += block.height(width);
    }
    return high;
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException {
    double top = y;
    for (Block block : blocks) {
      block.draw(sheet, parent, x, top, width);
      top += block.height(width);
    }
  }

  @Override
  public List<Block> parts() {
    return blocks;
  }
}
