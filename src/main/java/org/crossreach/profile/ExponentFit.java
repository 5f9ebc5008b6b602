package org.crossreach.profile;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;
import org.crossreach.section.Section;

/**
 * The exponent of the power law that fits the usable cells of some passes best.
 *
 * <p>One exponent for all columns and an amplitude for each, by least squares over the cells'
 * means, with less weight for outliers. The interval comes from resampling blocks of columns.
 *
 * @param value the exponent; NaN when there was nothing to fit
 * @param low95 lower end of its 95 % interval
 * @param high95 upper end of its 95 % interval
 * @param columns number of columns that were used
 * @param refusal why the data cannot tell the exponent; empty when they can
 */
public record ExponentFit(
    double value, double low95, double high95, int columns, Optional<String> refusal) {

  private static final double LOWEST = 0.01;
  private static final double HIGHEST = 0.8;
  private static final int FEWEST_COLUMNS = 30;
  private static final double WIDEST_HALF = 0.06;
  private static final double MOST_REVERSING = 0.2;
  private static final int REWEIGHTINGS = 2;
  private static final int RESAMPLES = 400;
  private static final long SEED = 20310418;
  private static final double ACCURACY = 1e-5;

  /**
   * Fits the exponent of some passes.
   *
   * @param sections the passes on their lines
   */
  public static ExponentFit of(List<Section> sections) {
    ColumnFit fit = ColumnFit.of(sections);
    if (fit.columns() < FEWEST_COLUMNS) {
      return refused(
          fit,
          fit.columns()
              + " columns with at least "
              + ColumnFit.FEWEST_CELLS
              + " usable cells, "
              + FEWEST_COLUMNS
              + " are needed");
    }
    double exponent = best(fit);
    for (int r = 0; r < REWEIGHTINGS; r++) {
      fit.reweight(exponent);
      exponent = best(fit);
    }
    double half = halfWidth(fit, exponent);
    return new ExponentFit(
        exponent, exponent - half, exponent + half, fit.columns(), doubt(fit, exponent, half));
  }

  private static ExponentFit refused(ColumnFit fit, String why) {
    return new ExponentFit(Double.NaN, Double.NaN, Double.NaN, fit.columns(), Optional.of(why));
  }

  private static Optional<String> doubt(ColumnFit fit, double exponent, double half) {
    if (fit.reversingShare() > MOST_REVERSING) {
      return Optional.of(
          "the flow turns within the vertical in "
              + Math.round(100 * fit.reversingShare())
              + " % of the columns");
    }
    if (exponent < LOWEST + 0.005 || exponent > HIGHEST - 0.005) {
      return Optional.of("the best exponent lies outside " + LOWEST + " to " + HIGHEST);
    }
    if (!(half <= WIDEST_HALF)) {
      return Optional.of("its 95 % interval is wider than plus or minus " + WIDEST_HALF);
    }
    return Optional.empty();
  }

  private static double best(ColumnFit fit) {
    return best(fit::explained, LOWEST, HIGHEST);
  }

  /**
   * The exponent for which most is explained.
   *
   * @param explained what a model explains of the squares, by exponent
   * @param lowest lower end of the search
   * @param highest upper end of the search
   */
  static double best(UnivariateFunction explained, double lowest, double highest) {
    return new BrentOptimizer(ACCURACY, ACCURACY)
        .optimize(
            new MaxEval(200),
            GoalType.MAXIMIZE,
            new UnivariateObjectiveFunction(explained),
            new SearchInterval(lowest, highest))
        .getPoint();
  }

  /**
   * Half-width of the 95 % interval: Student's t times the standard deviation over resampled blocks
   * of neighbouring columns. Near its top what the fit explains is a parabola in the exponent, so
   * three exponents for each block are enough to find the top of every resample.
   */
  private static double halfWidth(ColumnFit fit, double exponent) {
    double step = 0.02;
    int length = blockLength(fit, exponent, step);
    int blocks = fit.columns() / length;
    if (blocks < 4) {
      return Double.NaN;
    }
    double[][] explained = new double[3][blocks];
    for (int c = 0; c < blocks * length; c++) {
      for (int side = 0; side < 3; side++) {
        explained[side][c / length] += fit.explained(c, exponent + (side - 1) * step);
      }
    }
    RandomGenerator dice = new Well19937c(SEED);
    double sum = 0;
    double squares = 0;
    for (int r = 0; r < RESAMPLES; r++) {
      double[] total = new double[3];
      for (int b = 0; b < blocks; b++) {
        int drawn = dice.nextInt(blocks);
        for (int side = 0; side < 3; side++) {
          total[side] += explained[side][drawn];
        }
      }
      double curvature = total[0] - 2 * total[1] + total[2];
      double shift = curvature < 0 ? 0.5 * step * (total[0] - total[2]) / curvature : step;
      sum += shift;
      squares += shift * shift;
    }
    double variance = (squares - sum * sum / RESAMPLES) / (RESAMPLES - 1);
    double t = new TDistribution(null, blocks - 1).inverseCumulativeProbability(0.975);
    return t * Math.sqrt(variance * blocks / (blocks - 1)) / fit.stiffness();
  }

  /**
   * Number of neighbouring columns in a block: long enough that blocks hardly depend on each other,
   * from the correlation of neighbouring columns' pull on the exponent.
   */
  private static int blockLength(ColumnFit fit, double exponent, double step) {
    int n = fit.columns();
    double[] pull = new double[n];
    double mean = 0;
    for (int c = 0; c < n; c++) {
      pull[c] = fit.explained(c, exponent + step) - fit.explained(c, exponent - step);
      mean += pull[c] / n;
    }
    double own = 0;
    double next = 0;
    for (int c = 0; c < n; c++) {
      own += (pull[c] - mean) * (pull[c] - mean);
      next += c + 1 < n ? (pull[c] - mean) * (pull[c + 1] - mean) : 0;
    }
    double correlation = own > 0 ? Math.max(0, Math.min(0.95, next / own)) : 0;
    int wanted = (int) Math.ceil(4 * (1 + correlation) / (1 - correlation));
    return Math.max(1, Math.min(wanted, n / 15));
  }
}
