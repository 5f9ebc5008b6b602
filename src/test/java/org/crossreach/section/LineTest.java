package org.crossreach.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Looking downstream, the line runs from the left hand to the right hand and its normal points
 * ahead.
 */
class LineTest {

  @ParameterizedTest
  @CsvSource({
    // line from left to right, then the direction downstream
    "1,0, 0,1",
    "0,1, -1,0",
    "-1,0, 0,-1",
    "0,-1, 1,0"
  })
  void downstreamIsToTheLeftOfTheLine(
      double east, double north, double flowEast, double flowNorth) {
    Line line = Line.ofVector(3 * east, 3 * north);
    assertEquals(1, line.normal(flowEast, flowNorth), 1e-15);
    assertEquals(0, line.along(flowEast, flowNorth), 1e-15);
    assertEquals(2, line.along(2 * east, 2 * north), 1e-15);
  }

  @ParameterizedTest
  @CsvSource({"0,0,1", "90,1,0", "180,0,-1", "270,-1,0", "45,1,1", "306.870,-4,3"})
  void azimuthIsClockwiseFromNorth(double azimuth, double east, double north) {
    assertEquals(azimuth, Line.ofVector(east, north).azimuthDeg(), 0.5e-3);
  }

  @ParameterizedTest
  @CsvSource({"80,80", "260,80", "100,100", "280,100", "-100,80"})
  void givenAzimuthIsTakenTheWayRoundThatFitsTheBanks(double given, double leftToRight) {
    assertEquals(leftToRight, Line.ofVector(1, 0).turnedTo(given).azimuthDeg(), 1e-12);
  }

  @Test
  void refusesAVectorWithoutDirection() {
    assertThrows(IllegalArgumentException.class, () -> Line.ofVector(0, 0));
    assertThrows(IllegalArgumentException.class, () -> Line.ofVector(Double.NaN, 1));
  }
}
