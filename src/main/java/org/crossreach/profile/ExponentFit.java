package org.crossreach.profile;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;

/**
 * The exponent of the power law that fits the usable cells of some passes best.
 *
 * <p>One exponent for all columns and an amplitude for each, by least squares over the cells'
 * means, with less weight for outliers. The interval comes from resampling blocks of neighbouring
 * columns within each pass.
 *
 * @param value the exponent; NaN when there was nothing to fit
 * @param low95 lower end of its 95 % interval
 * @param high95 upper end of its 95 % interval
 * @param columns number of columns that were used
 * @param refusal why the data cannot tell the exponent; empty when they can
 */
public record ExponentFit(
    double value, double low95, double high95, int columns, Optional<String> refusal) {

  /** Fewest columns of at least four usable cells. */
  private static final int FEWEST_COLUMNS = 30;

  /** Largest half-width of the 95 % interval with which a fit is taken. */
  private static final double WIDEST_HALF = 0.06;

  /** Largest share of the flow in columns that turn within the vertical. */
  private static final double MOST_REVERSING = 0.2;

  private static final int RESAMPLES = 400;
  private static final long SEED = 20310418;

  /** Distance of the exponents by which a block's part in the fit is described. */
  private static final double STEP = 0.02;

  /** Nearer than this to an end of the search is no top. */
  private static final double FROM_THE_END = 0.005;

  /**
   * Fits one exponent to some passes.
   *
   * @param passes the columns of each pass
   */
  public static ExponentFit of(List<ColumnFit> passes) {
    int columns = 0;
    for (ColumnFit each : passes) {
      columns += each.columns();
    }
    if (columns < FEWEST_COLUMNS) {
      return new ExponentFit(
          Double.NaN,
          Double.NaN,
          Double.NaN,
          columns,
          Optional.of(
              columns
                  + " columns with at least "
                  + ColumnFit.FEWEST_CELLS
                  + " usable cells, "
                  + FEWEST_COLUMNS
                  + " are needed"));
    }
    double exponent =
        ExponentSearch.top(m -> explained(passes, m), ColumnFit.LOWEST, ColumnFit.HIGHEST);
    double half = halfWidth(passes, exponent);
    return new ExponentFit(
        exponent, exponent - half, exponent + half, columns, doubt(passes, exponent, half));
  }

  private static double explained(List<ColumnFit> passes, double exponent) {
    double sum = 0;
    for (ColumnFit each : passes) {
      sum += each.explained(exponent);
    }
    return sum;
  }

  private static Optional<String> doubt(List<ColumnFit> passes, double exponent, double half) {
    double reversing = 0;
    for (ColumnFit each : passes) {
      reversing = Math.max(reversing, each.reversingShare());
    }
    if (reversing > MOST_REVERSING) {
      return Optional.of(
          "the flow turns within the vertical in " + Math.round(100 * reversing) + " % of it");
    }
    if (exponent < ColumnFit.LOWEST + FROM_THE_END || exponent > ColumnFit.HIGHEST - FROM_THE_END) {
      return Optional.of(
          "the best exponent lies outside " + ColumnFit.LOWEST + " to " + ColumnFit.HIGHEST);
    }
    if (!(half <= WIDEST_HALF)) {
      return Optional.of("its 95 % interval is wider than plus or minus " + WIDEST_HALF);
    }
    return Optional.empty();
  }

  /**
   * Half-width of the 95 % interval: Student's t times the standard deviation over resampled
   * blocks. Near its top what the fit explains is a parabola in the exponent, so that three
   * exponents for each block are enough to find the top of every resample.
   */
  private static double halfWidth(List<ColumnFit> passes, double exponent) {
    double[][][] blocks = new double[passes.size()][][];
    int count = 0;
    for (int p = 0; p < blocks.length; p++) {
      blocks[p] = blocks(passes.get(p), exponent);
      count += blocks[p].length;
    }
    int freedom = count - blocks.length;
    if (freedom < 3) {
      return Double.NaN;
    }
    RandomGenerator dice = new Well19937c(SEED);
    double sum = 0;
    double squares = 0;
    for (int r = 0; r < RESAMPLES; r++) {
      double shift = shift(blocks, dice);
      sum += shift;
      squares += shift * shift;
    }
    double variance = (squares - sum * sum / RESAMPLES) / (RESAMPLES - 1);
    double t = new TDistribution(null, freedom).inverseCumulativeProbability(0.975);
    return t * Math.sqrt(variance * count / freedom);
  }

  /** How far the top of one resample lies from that of the data. */
  private static double shift(double[][][] blocks, RandomGenerator dice) {
    double below = 0;
    double at = 0;
    double above = 0;
    for (double[][] pass : blocks) {
      for (int b = 0; b < pass.length; b++) {
        double[] drawn = pass[dice.nextInt(pass.length)];
        below += drawn[0];
        at += drawn[1];
        above += drawn[2];
      }
    }
    double curvature = below - 2 * at + above;
    return curvature < 0 ? 0.5 * STEP * (below - above) / curvature : STEP;
  }

  /** For each block of a pass what the fit explains one step below, at, and one step above. */
  private static double[][] blocks(ColumnFit fit, double exponent) {
    int n = fit.columns();
    double[][] each = fit.explainedAround(exponent, STEP);
    double[] pull = new double[n];
    for (int c = 0; c < n; c++) {
      pull[c] = each[c][2] - each[c][0];
    }
    int length = BlockLength.of(pull);
    double[][] blocks = new double[n / length][3];
    for (int c = 0; c < blocks.length * length; c++) {
      for (int side = 0; side < 3; side++) {
        blocks[c / length][side] += each[c][side];
      }
    }
    return blocks;
  }
}
