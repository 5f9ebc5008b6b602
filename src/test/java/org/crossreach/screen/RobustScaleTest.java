package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.stat.descriptive.rank.Percentile;
import org.junit.jupiter.api.Test;

/**
 * Medians are medians, and the robust spread is the standard deviation of Gaussian numbers that a
 * minority of outliers hardly moves.
 *
 * <p>Validation: worked example of the robust z (Iglewicz and Hoaglin 1993, from memory; values
 * recomputed) and, as a general-purpose library, Apache Commons Math.
 */
class RobustScaleTest {

  @Test
  void workedExampleOfTheRobustZ() {
    double[] set = {1.02, 0.98, 1.05, 1.00, 0.97, 1.01, 1.03, 0.99, 1.04, 2.50};
    RobustScale scale = RobustScale.of(set.clone(), set.length);
    assertEquals(1.015, scale.median(), 1e-15);
    assertEquals(0.037065055, scale.sigma(), 0.5e-9);
    assertEquals(40.0647, (2.50 - scale.median()) / scale.sigma(), 0.5e-4);
  }

  @Test
  void factorIsOneOverTheNormalQuantileOfThreeQuarters() {
    double quantile = new NormalDistribution(null, 0, 1).inverseCumulativeProbability(0.75);
    assertEquals(1 / quantile, RobustScale.SIGMA_PER_MAD, 1e-12);
  }

  @Test
  void medianIsThatOfCommonsMathForEverySizeAndShape() {
    Random random = new Random(9);
    for (int size = 1; size < 300; size++) {
      double[] values = new double[size];
      for (int i = 0; i < size; i++) {
        values[i] =
            switch (size % 4) {
              case 0 -> random.nextGaussian();
              case 1 -> random.nextInt(3);
              case 2 -> i;
              default -> -i * (i % 2);
            };
      }
      double expected = new Percentile().evaluate(values, 50);
      assertEquals(expected, Median.of(values.clone(), size), 1e-15, "size " + size);
    }
  }

  @Test
  void medianOfNothingIsNothing() {
    assertTrue(Double.isNaN(Median.of(new double[3], 0)));
    assertTrue(Double.isNaN(RobustScale.of(new double[0], 0).sigma()));
    assertEquals(0, RobustScale.of(new double[] {7}, 1).sigma());
  }

  @Test
  void outliersHardlyMoveIt() {
    Random random = new Random(5);
    double[] values = new double[20_000];
    for (int i = 0; i < values.length; i++) {
      values[i] = random.nextGaussian() + (i % 20 == 0 ? 10 : 0);
    }
    // 5 % outliers: 6.2 % too wide by the normal quantile of 0.5 / 0.95, and sampling error 1 %.
    assertEquals(1.062, RobustScale.of(values, values.length).sigma(), 0.025);
  }

  @Test
  void sampleLeavesOutWhatIsMissingAndGrows() {
    Sample sample = new Sample();
    for (int i = 0; i < 5001; i++) {
      sample.add(i);
      sample.add(Double.NaN);
    }
    assertEquals(5001, sample.size());
    assertEquals(2500, sample.median());
  }

  @Test
  void runningMedianKeepsSlopesAndStepsAndDropsSpikes() {
    double nan = Double.NaN;
    double[] slope = {1, 2, 3, nan, 5, 6, 9, 10};
    assertArrayEquals(slope, running(slope, 3));
    double[] step = {0, 0, 0, 0, 7, 7, 7, 7};
    assertArrayEquals(step, running(step, 2));
    double[] spikes = {0, 0, 9, 9, nan, 0, 0, 0};
    double[] without = {0, 0, 0, 0, nan, 0, 0, 0};
    assertArrayEquals(without, running(spikes, 3));
    assertArrayEquals(new double[] {4}, running(new double[] {4}, 3));
  }

  @Test
  void medianOfOneSidePassesOverWhatIsMissing() {
    double nan = Double.NaN;
    double[] values = {8, 1, nan, 5, 100, nan, 3, 2};
    assertEquals(5, RunningMedian.beside(values, 4, 3, -1));
    assertEquals(2.5, RunningMedian.beside(values, 4, 3, 1));
    assertEquals(nan, RunningMedian.beside(values, 0, 3, -1));
  }

  private static double[] running(double[] values, int reach) {
    double[] result = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      result[i] = Double.isNaN(values[i]) ? values[i] : RunningMedian.at(values, i, reach);
    }
    return result;
  }
}
