package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;

/** Lines of equal velocity run where the field has that velocity, unbroken. */
class EqualVelocityTest {

  private record Grid(DoubleBinaryOperator velocity) implements EqualVelocity.Field {
    @Override
    public int columns() {
      return 21;
    }

    @Override
    public int rows() {
      return 11;
    }

    @Override
    public double at(int column, int row) {
      return velocity.applyAsDouble(column, row);
    }
  }

  @Test
  void isOneStraightLineThroughALinearField() {
    List<double[]> lines = EqualVelocity.lines(new Grid((x, y) -> 0.1 * x + 0.2 * y), 1.23);
    assertEquals(1, lines.size());
    double[] line = lines.get(0);
    for (int i = 0; i < line.length; i += 2) {
      assertEquals(1.23, 0.1 * line[i] + 0.2 * line[i + 1], 1e-12);
    }
  }

  @Test
  void closesAroundAnIsland() {
    List<double[]> lines = EqualVelocity.lines(new Grid((x, y) -> Math.hypot(x - 10, y - 5)), 3.5);
    assertEquals(1, lines.size());
    double[] line = lines.get(0);
    assertEquals(line[0], line[line.length - 2], 1e-9);
    assertEquals(line[1], line[line.length - 1], 1e-9);
    for (int i = 0; i < line.length; i += 2) {
      // Linear within a square: off a circle of radius 3.5 by at most 1/(8 x 3.5) = 0.036.
      assertEquals(3.5, Math.hypot(line[i] - 10, line[i + 1] - 5), 0.04);
    }
  }

  @Test
  void keepsAwayFromWhatIsMissing() {
    Grid grid = new Grid((x, y) -> x > 12 ? Double.NaN : y);
    double[] line = EqualVelocity.lines(grid, 4.5).get(0);
    for (int i = 0; i < line.length; i += 2) {
      assertTrue(line[i] <= 12);
    }
  }

  @Test
  void hasNoLineInAFieldOfOneVelocity() {
    assertTrue(EqualVelocity.lines(new Grid((x, y) -> 1), 0.5).isEmpty());
    assertTrue(EqualVelocity.lines(new Grid((x, y) -> 1), 1).isEmpty());
  }
}
