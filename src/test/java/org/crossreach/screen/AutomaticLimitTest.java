package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Limits found in the pass itself spare good samples and catch spikes: of Gaussian samples fewer
 * than 0.5 % are rejected by all automatic screens together, and of 5 % spikes of ten standard
 * deviations at least 99 % are caught.
 */
class AutomaticLimitTest {

  private static final int SIZE = 300;
  private static final int CELLS = Recording.CELLS_ABOVE_SIDE_LOBES;
  private static final int SEEDS = 20;

  /** What became of good and of struck cells. */
  private static final class Count {
    int good;
    int goodRejected;
    int struck;
    int struckRejected;

    void add(ScreenedPass pass, boolean[][] hit) {
      for (int i = 0; i < pass.size(); i++) {
        for (int k = 0; k < CELLS; k++) {
          if (hit[i][k]) {
            struck++;
            struckRejected += pass.usable(i, k) ? 0 : 1;
          } else {
            good++;
            goodRejected += pass.usable(i, k) ? 0 : 1;
          }
        }
      }
    }

    double goodRejectedPct() {
      return 100.0 * goodRejected / good;
    }

    double struckRejectedPct() {
      return 100.0 * struckRejected / struck;
    }
  }

  @ParameterizedTest
  @CsvSource({"0.02", "0.05", "0.1", "0.3"})
  void sparesGaussianSamples(double sigma) {
    Count cells = new Count();
    long boats = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      ScreenedPass pass = Recording.noisy(SIZE, sigma, seed).screen(everything());
      cells.add(pass, new boolean[SIZE][CELLS]);
      boats += pass.accounting().bottomTrack().rejected();
    }
    assertTrue(cells.goodRejectedPct() < 0.5, cells.goodRejectedPct() + " % of good cells");
    assertTrue(100.0 * boats / (SEEDS * SIZE) < 0.5, boats + " of the boat velocities");
  }

  @ParameterizedTest
  @CsvSource({
    // standard deviation, direction of the spikes (deg; NaN for a random one)
    "0.02, 0",
    "0.05, 90",
    "0.05, 45",
    "0.1, NaN",
    "0.3, NaN"
  })
  void catchesSpikesOfTenStandardDeviations(double sigma, double directionDeg) {
    Count cells = new Count();
    for (int seed = 0; seed < SEEDS; seed++) {
      boolean[][] hit = new boolean[SIZE][CELLS];
      Recording recording = Recording.noisy(SIZE, sigma, seed);
      strike(recording, hit, 10 * sigma, directionDeg, new Random(1000 + seed));
      cells.add(recording.screen(), hit);
    }
    assertTrue(cells.struckRejectedPct() >= 99, cells.struckRejectedPct() + " % of the spikes");
    assertTrue(cells.goodRejectedPct() < 0.5, cells.goodRejectedPct() + " % of good cells");
  }

  @ParameterizedTest
  @CsvSource({"WATER_3", "WATER_4"})
  void catchesSpikesOfVerticalAndErrorVelocity(CellQuantity component) {
    Count cells = new Count();
    for (int seed = 0; seed < SEEDS; seed++) {
      boolean[][] hit = new boolean[SIZE][CELLS];
      Random random = new Random(seed);
      Recording recording = Recording.noisy(SIZE, 0.05, seed);
      recording.add(
          component,
          (i, k) -> {
            if (k >= CELLS || random.nextDouble() > 0.05) {
              return 0;
            }
            hit[i][k] = true;
            return random.nextBoolean() ? 0.5 : -0.5;
          });
      cells.add(recording.screen(), hit);
    }
    assertTrue(cells.struckRejectedPct() >= 99, cells.struckRejectedPct() + " % of the spikes");
    assertTrue(cells.goodRejectedPct() < 0.5, cells.goodRejectedPct() + " % of good cells");
  }

  @Test
  void catchesSpikesOfTheBoat() {
    int struck = 0;
    int caught = 0;
    int lost = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Random random = new Random(77 + seed);
      boolean[] hit = new boolean[SIZE];
      Recording recording = Recording.noisy(SIZE, 0.05, seed);
      recording.add(
          EnsembleQuantity.BOTTOM_1,
          i -> {
            hit[i] = random.nextDouble() < 0.05 && i > 0 && i < SIZE - 1;
            return hit[i] ? (random.nextBoolean() ? 0.5 : -0.5) : 0;
          });
      ScreenedPass pass = recording.screen();
      for (int i = 0; i < SIZE; i++) {
        boolean used = pass.bottomTrackReason(i) == Reason.NONE;
        struck += hit[i] ? 1 : 0;
        caught += hit[i] && !used ? 1 : 0;
        lost += !hit[i] && !used ? 1 : 0;
      }
    }
    assertTrue(100.0 * caught / struck >= 99, caught + " of " + struck);
    assertTrue(100.0 * lost / (SEEDS * SIZE) < 0.5, lost + " good ones");
  }

  /**
   * Turbulence that lasts over ten ensembles and several cells, above a shear of a power law, seen
   * from a boat that stops, starts and turns, is no spike.
   */
  @Test
  void sparesTurbulenceShearAndManoeuvres() {
    Count cells = new Count();
    for (int seed = 0; seed < SEEDS; seed++) {
      Random random = new Random(seed);
      double[][][] gusts = new double[2][SIZE][16];
      for (double[][] component : gusts) {
        for (int i = 0; i < SIZE; i++) {
          for (int k = 0; k < 16; k++) {
            double before = i == 0 ? random.nextGaussian() : component[i - 1][k];
            double above = k == 0 ? random.nextGaussian() : component[i][k - 1];
            component[i][k] = 0.6 * before + 0.35 * above + 0.45 * random.nextGaussian();
          }
        }
      }
      Recording recording = Recording.noisy(SIZE, 0.03, seed);
      double[] boatEast = new double[SIZE];
      double[] boatNorth = new double[SIZE];
      for (int i = 0; i < SIZE; i++) {
        boatEast[i] = i % 100 < 50 ? 1.2 : 0;
        boatNorth[i] = i % 100 < 50 ? 0.8 * Math.sin(i % 100 / 4.0) : 0;
      }
      recording.add(EnsembleQuantity.BOTTOM_1, i -> boatEast[i] - 1);
      recording.add(EnsembleQuantity.BOTTOM_2, i -> boatNorth[i]);
      recording.add(CellQuantity.WATER_1, (i, k) -> 1 + 0.1 * gusts[0][i][k] - boatEast[i]);
      recording.add(
          CellQuantity.WATER_2,
          (i, k) ->
              1.3 * Math.pow((4.375 - 0.25 * k) / 4.75, 1 / 6.0)
                  - 1
                  + 0.1 * gusts[1][i][k]
                  - boatNorth[i]);
      ScreenedPass pass = recording.screen();
      cells.add(pass, new boolean[SIZE][CELLS]);
      assertEquals(0, pass.accounting().bottomTrack().rejected(), "seed " + seed);
    }
    assertTrue(cells.goodRejectedPct() < 0.5, cells.goodRejectedPct() + " % of good cells");
  }

  @Test
  void limitsAreThoseOfTheDistribution() {
    Accounting accounting = Recording.noisy(2000, 0.1, 1).screen().accounting();
    // 30 000 samples know their spread to 1 %, 2 000 to 3 %.
    assertEquals(0.5, limit(accounting, Criterion.ERROR_VELOCITY), 0.01);
    assertEquals(0.5, limit(accounting, Criterion.VERTICAL_VELOCITY), 0.01);
    assertEquals(0.5, limit(accounting, Criterion.BOTTOM_ERROR_VELOCITY), 0.03);
    assertEquals(0, accounting.limit(Criterion.ERROR_VELOCITY).orElseThrow().centre(), 0.003);
  }

  /** A boat that heaves by 0.3 m/s does not widen the limit of the vertical velocity. */
  @Test
  void countsVerticalVelocityOverTheBedWhenTheBoatHeaves() {
    Recording recording = Recording.noisy(2000, 0.02, 1);
    recording.add(EnsembleQuantity.BOTTOM_3, i -> 0.3 * Math.sin(i));
    recording.add(CellQuantity.WATER_3, (i, k) -> -0.3 * Math.sin(i));
    double found = limit(recording.screen().accounting(), Criterion.VERTICAL_VELOCITY);
    assertEquals(5 * 0.02 * Math.sqrt(2), found, 0.01);
  }

  @Test
  void allowanceIsAsRareAsItSays() {
    NormalDistribution normal = new NormalDistribution(null, 0, 1);
    double single = 2 * normal.cumulativeProbability(-AutomaticLimit.SIGMAS);
    assertEquals(1.7e6, 1 / single, 0.05e6);
    double alongOneAxis = 2 * normal.cumulativeProbability(-AutomaticLimit.SIGMAS_OF_VECTOR);
    assertEquals(16_000, 1 / alongOneAxis, 300);
    double bothAxes = Math.exp(-AutomaticLimit.SIGMAS_OF_VECTOR * AutomaticLimit.SIGMAS_OF_VECTOR);
    assertEquals(9e6, 1 / bothAxes, 0.2e6);
  }

  @Test
  void lowestValueLooksOnlyDownwards() {
    Sample sample = new Sample();
    Random random = new Random(2);
    for (int i = 0; i < 20_000; i++) {
      double value = random.nextGaussian();
      sample.add(value < 0 ? value : 5 * value);
    }
    assertEquals(-5, AutomaticLimit.lowest(sample, 0), 0.1);
    assertTrue(Double.isNaN(AutomaticLimit.lowest(new Sample(), 0)));
  }

  private static double limit(Accounting accounting, Criterion criterion) {
    return accounting.limit(criterion).orElseThrow().value();
  }

  private static Screening everything() {
    Screening all = Screening.defaults();
    for (Criterion each : List.of(Criterion.CORRELATION, Criterion.INTENSITY, Criterion.GOOD_PCT)) {
      all = Recording.with(all, each, Limit.AUTO);
    }
    return all;
  }

  private static void strike(
      Recording recording, boolean[][] hit, double size, double directionDeg, Random random) {
    double[][] east = new double[SIZE][16];
    double[][] north = new double[SIZE][16];
    for (int i = 0; i < SIZE; i++) {
      for (int k = 0; k < CELLS; k++) {
        if (random.nextDouble() < 0.05) {
          hit[i][k] = true;
          double direction =
              Double.isNaN(directionDeg)
                  ? 2 * Math.PI * random.nextDouble()
                  : Math.toRadians(directionDeg);
          double signed = random.nextBoolean() ? size : -size;
          east[i][k] = signed * Math.sin(direction);
          north[i][k] = signed * Math.cos(direction);
        }
      }
    }
    recording.add(CellQuantity.WATER_1, (i, k) -> east[i][k]);
    recording.add(CellQuantity.WATER_2, (i, k) -> north[i][k]);
  }
}
