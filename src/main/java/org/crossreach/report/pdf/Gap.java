package org.crossreach.report.pdf;

/**
 * Empty room.
 *
 * @param high its height (pt)
 */
record Gap(double high) implements Block {

  @Override
  public double height(double width) {
    return high;
  }

  @Override
  public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width) {
    // There is nothing to draw in a gap.
  }

  @Override
  public boolean staysWithNext() {
    return true;
  }
}
