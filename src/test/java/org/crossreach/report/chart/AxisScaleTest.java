package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Steps are 1, 2 or 5 times a power of ten, and an axis of equal values is widened around them. */
class AxisScaleTest {

  @ParameterizedTest
  @CsvSource({"1,1", "1.1,2", "2,2", "2.2,5", "5.01,10", "0.03,0.05", "0.1,0.1", "730,1000"})
  void roundsStepsUp(double step, double round) {
    assertEquals(round, AxisScale.roundStep(step), 1e-12 * round);
  }

  @ParameterizedTest
  @CsvSource({"1,0", "0.5,1", "0.25,2", "0.05,2", "20,0"})
  void writesAsManyDecimalsAsTellStepsApart(double step, int decimals) {
    assertEquals(decimals, new AxisScale("", 0, 10 * step, step, false).decimals().count());
  }

  @Test
  void widensAroundEqualValues() {
    AxisScale axis = AxisScale.plain("", 3, 3, 5);
    assertTrue(axis.from() < 3 && axis.to() > 3);
    AxisScale zero = AxisScale.plain("", 0, 0, 5);
    assertTrue(zero.from() < 0 && zero.to() > 0);
  }

  @Test
  void drawsWhatIsMissingAroundZero() {
    AxisScale axis = AxisScale.plain("", Double.NaN, Double.NEGATIVE_INFINITY, 5);
    assertTrue(axis.from() < 0 && axis.to() > 0);
  }

  @Test
  void movesEndsToWholeSteps() {
    AxisScale axis = AxisScale.plain("", -0.3, 1.9, 4).toWholeSteps();
    assertEquals(-1, axis.from(), 1e-12);
    assertEquals(2, axis.to(), 1e-12);
  }

  @Test
  void convertsToTheReadersUnit() {
    AxisScale axis = AxisScale.of("Depth", Quantity.LENGTH, Units.US, 0, 3.048, 5);
    assertEquals("Depth (ft)", axis.label());
    assertEquals(10, axis.to(), 1e-12);
  }

  @Test
  void refusesAnAxisWithoutLength() {
    assertThrows(IllegalArgumentException.class, () -> new AxisScale("", 1, 1, 1, false));
    assertThrows(IllegalArgumentException.class, () -> new AxisScale("", 0, 1, 0, false));
  }
}
