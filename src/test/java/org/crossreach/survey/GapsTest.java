package org.crossreach.survey;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;

import org.junit.jupiter.api.Test;

/** Gaps are filled linearly in position, and by the nearest value at the ends. */
class GapsTest {

  private static final double NO = Double.NaN;

  @Test
  void fillsLinearlyInPositionNotInIndex() {
    assertArrayEquals(
        new double[] {1, 2.5, 4},
        Gaps.fillLinear(new double[] {1, NO, 4}, new double[] {0, 5, 10}),
        1e-15);
    assertArrayEquals(
        new double[] {1, 1.3, 3.7, 4},
        Gaps.fillLinear(new double[] {1, NO, NO, 4}, new double[] {0, 1, 9, 10}),
        1e-15);
  }

  @Test
  void carriesTheNearestValueToTheEnds() {
    assertArrayEquals(
        new double[] {7, 7, 7, 9, 9},
        Gaps.fillLinear(new double[] {NO, NO, 7, 9, NO}, new double[] {0, 1, 2, 3, 4}));
  }

  @Test
  void takesTheMeanWhereTheBoatStoodStill() {
    assertArrayEquals(
        new double[] {2, 3, 4}, Gaps.fillLinear(new double[] {2, NO, 4}, new double[] {5, 5, 5}));
  }

  @Test
  void nothingComesFromNothing() {
    assertArrayEquals(
        new double[] {NO, NO}, Gaps.fillLinear(new double[] {NO, NO}, new double[] {0, 1}));
    assertArrayEquals(new double[0], Gaps.fillLinear(new double[0], new double[0]));
  }

  @Test
  void leavesTheGivenColumnAsItWas() {
    double[] given = {1, NO, 3};
    Gaps.fillLinear(given, new double[] {0, 1, 2});
    assertArrayEquals(new double[] {1, NO, 3}, given);
  }
}
