package org.crossreach.report.pdf;

import java.io.IOException;
import java.util.List;

/** A piece of a page's content that knows its height. */
interface Block {

  /** Height that the block takes in a width (pt). */
  double height(double width);

  /**
   * Draws the block with its upper left corner at a place (pt from the upper left corner).
   *
   * @param sheet the page
   * @param parent the element of the structure in which the block stands
   * @param x left
   * @param y top
   * @param width width
   */
  void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
      throws IOException;

  /** The pieces between which a page may end. */
  default List<Block> parts() {
    return List.of(this);
  }

  /** Whether a page may not end after the block. */
  default boolean staysWithNext() {
    return false;
  }

  /** Whether the block, with which everything ends, belongs at the foot of its page. */
  default boolean sinks() {
    return false;
  }

  /** What is to be repeated, as decoration, when a page begins with this block. */
  default List<Block> repeatedAbove() {
    return List.of();
  }
}
