package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.junit.jupiter.api.Test;

/** A line is inside a shape between its first and second crossing, its third and fourth, and on. */
class SidesTest {

  @Test
  void crossesARectangleTwice() {
    Sides square = Sides.of(new Rectangle2D.Double(0, 0, 10, 10));
    assertArrayEquals(new double[] {0, 10}, square.crossings(5, 0), 1e-12);
    // y = 12 - x leaves at the right side and at the lower one.
    assertArrayEquals(new double[] {2, 10}, square.crossings(12, 1), 1e-12);
  }

  @Test
  void missesWhatItDoesNotTouch() {
    assertEquals(0, Sides.of(new Rectangle2D.Double(0, 0, 10, 10)).crossings(11, 0).length);
  }

  @Test
  void crossesTwoPartsFourTimes() {
    Path2D two = new Path2D.Double(new Rectangle2D.Double(0, 0, 2, 10));
    two.append(new Rectangle2D.Double(5, 0, 2, 10), false);
    assertArrayEquals(new double[] {0, 2, 5, 7}, Sides.of(two).crossings(5, 0), 1e-12);
  }

  @Test
  void alwaysCrossesAnEvenNumberOfTimes() {
    Path2D zigzag = new Path2D.Double();
    zigzag.moveTo(0, 0);
    for (int i = 1; i < 50; i++) {
      zigzag.lineTo(i, (i * 7919) % 13);
    }
    zigzag.closePath();
    Sides sides = Sides.of(zigzag);
    for (double offset = -5; offset < 60; offset += 0.25) {
      assertEquals(0, sides.crossings(offset, 1).length % 2);
    }
  }
}
