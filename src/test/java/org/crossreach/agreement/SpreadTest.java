package org.crossreach.agreement;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Mean, standard deviation and 95 % half-width are those of the references, to their digits. */
class SpreadTest {

  /** Four passes, worked out by hand: printed to six decimals. */
  @Test
  void fourPasses() {
    Spread spread = Spread.of(101.2, 99.1, 100.4, 98.7);
    assertEquals(99.85, spread.mean(), 1e-12);
    assertEquals(1.156143, spread.sd(), 0.5e-6);
    assertEquals(1.157880, spread.covPct(), 0.5e-6);
    assertEquals(1.839682, spread.ci95Half(), 0.5e-6);
    assertEquals(1.842445, 100 * spread.ci95Half() / spread.mean(), 0.5e-6);
    assertEquals(1.352028, spread.deviationPct(101.2), 0.5e-6);
    assertEquals(100 * 2.5 / 99.85, spread.rangePct(), 1e-12);
  }

  /** Student's t at 95 %, two-sided; any statistical table, printed to four decimals. */
  @ParameterizedTest
  @CsvSource({
    "1,12.7062",
    "2,4.3027",
    "3,3.1824",
    "5,2.5706",
    "7,2.3646",
    "10,2.2281",
    "30,2.0423"
  })
  void halfWidthUsesStudentsT(int degrees, double t) {
    int n = degrees + 1;
    double[] values = IntStream.range(0, n).mapToDouble(i -> 100 + i % 3).toArray();
    Spread spread = Spread.of(values);
    assertEquals(t, spread.ci95Half() * Math.sqrt(n) / spread.sd(), 0.5e-4);
  }

  /**
   * NIST Statistical Reference Datasets, univariate summary statistics: NumAcc1 to NumAcc4 with
   * certified mean and standard deviation; plain doubles reach about 9 digits on NumAcc4.
   */
  @ParameterizedTest
  @CsvSource({"1.2,0,1e-14", "1000000.2,1000000,1e-9", "10000000.2,10000000,1e-8"})
  void numericalAccuracy(double first, double base, double tolerance) {
    double low = base == 0 ? 1.1 : base + 0.1;
    double high = base == 0 ? 1.3 : base + 0.3;
    double[] values =
        DoubleStream.concat(
                DoubleStream.of(first),
                IntStream.range(0, 1000).mapToDouble(i -> i % 2 == 0 ? low : high))
            .toArray();
    Spread spread = Spread.of(values);
    assertEquals(first, spread.mean(), 1e-15 * first);
    assertEquals(0.1, spread.sd(), tolerance);
    Spread whole = Spread.of(10000001, 10000003, 10000002);
    assertEquals(10000002, whole.mean());
    assertEquals(1, whole.sd());
  }

  /**
   * NIST Statistical Reference Datasets, Mavro: certified mean 2.001856, sd 0.000429123454003053.
   */
  @Test
  void mavro() {
    int[] tenThousandths = {
      18, 17, 18, 19, 18, 17, 15, 14, 15, 15, 17, 18, 18, 19, 19, 21, 20, 16, 14, 13, 13, 15, 15,
      16, 15, 14, 13, 14, 15, 14, 15, 16, 15, 16, 19, 20, 20, 21, 22, 23, 24, 25, 27, 26, 26, 26,
      27, 26, 25, 24
    };
    double[] values = Arrays.stream(tenThousandths).mapToDouble(v -> (20000 + v) / 1e4).toArray();
    Spread spread = Spread.of(values);
    assertEquals(2.001856, spread.mean(), 1e-15);
    assertEquals(0.000429123454003053, spread.sd(), 1e-14);
  }

  @Test
  void oneValueHasNoSpread() {
    Spread one = Spread.of(12.5);
    assertEquals(12.5, one.mean());
    assertTrue(Double.isNaN(one.sd()) && Double.isNaN(one.ci95Half()));
    assertTrue(Double.isNaN(one.rangePct()));
    assertEquals(0, one.deviationPct(12.5));
  }

  @Test
  void noValueHasNoMean() {
    assertTrue(Double.isNaN(Spread.of().mean()));
  }

  /** Reversing flow: percentages are of the mean's size, so a larger value departs upwards. */
  @Test
  void negativeMeanKeepsTheSignOfDepartures() {
    Spread spread = Spread.of(-10, -12);
    assertEquals(100.0 / 11, spread.deviationPct(-10), 1e-12);
    assertEquals(200.0 / 11, spread.rangePct(), 1e-12);
    assertTrue(spread.covPct() > 0);
    assertTrue(Double.isNaN(Spread.of(-1, 1).covPct()));
  }
}
