package org.crossreach.evidence;

import java.util.List;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;
import org.crossreach.profile.HiddenCells;
import org.crossreach.profile.Zone;

/**
 * The bias of every candidate on hidden cells, and the same for data that could have been measured
 * as well: blocks of neighbouring columns are drawn anew within each pass, the same for all
 * candidates, so that what they share cancels when they are compared.
 */
final class Resamples {

  static final int COUNT = 500;
  private static final long SEED = 41027;

  private final List<Candidate> candidates;
  private final int columns;
  private final double[] biasPct;
  private final double[] scatterPct;
  private final double[][] drawnBiasPct;

  /**
   * Draws.
   *
   * @param candidates what was tried, in the order of the trials
   * @param passes the hidden cells of each pass
   */
  Resamples(List<Candidate> candidates, List<HiddenCells> passes) {
    this.candidates = candidates;
    double[][][] blocks = new double[passes.size()][][];
    int count = 0;
    for (int p = 0; p < blocks.length; p++) {
      blocks[p] = blocks(passes.get(p));
      count += passes.get(p).columns();
    }
    columns = count;
    biasPct = bias(sums(blocks, null));
    scatterPct = scatter(passes);
    drawnBiasPct = new double[COUNT][];
    RandomGenerator dice = new Well19937c(SEED);
    for (int r = 0; r < COUNT; r++) {
      drawnBiasPct[r] = bias(sums(blocks, dice));
    }
  }

  /** For each block the errors of all candidates, then what was measured at top and bottom. */
  private double[][] blocks(HiddenCells pass) {
    int n = candidates.size();
    int length = pass.columns() == 0 ? 1 : pass.blockLength();
    double[][] blocks = new double[(pass.columns() + length - 1) / length][n + 2];
    for (int c = 0; c < pass.columns(); c++) {
      double[] block = blocks[c / length];
      for (int t = 0; t < n; t++) {
        block[t] += pass.errorM3s(t, c);
      }
      block[n] += pass.measuredM3s(Zone.TOP, c);
      block[n + 1] += pass.measuredM3s(Zone.BOTTOM, c);
    }
    return blocks;
  }

  private double[] sums(double[][][] passes, RandomGenerator dice) {
    double[] sums = new double[candidates.size() + 2];
    for (double[][] blocks : passes) {
      for (int b = 0; b < blocks.length; b++) {
        double[] drawn = dice == null ? blocks[b] : blocks[dice.nextInt(blocks.length)];
        for (int k = 0; k < sums.length; k++) {
          sums[k] += drawn[k];
        }
      }
    }
    return sums;
  }

  private double[] bias(double[] sums) {
    double[] bias = new double[candidates.size()];
    for (int t = 0; t < bias.length; t++) {
      bias[t] = 100 * sums[t] / sums[measuredAt(t)];
    }
    return bias;
  }

  private int measuredAt(int candidate) {
    return candidates.size() + (candidates.get(candidate).zone() == Zone.TOP ? 0 : 1);
  }

  /** Standard deviation of a column's error about the bias, in percent of a column's mean. */
  private double[] scatter(List<HiddenCells> passes) {
    double[] scatter = new double[candidates.size()];
    for (int t = 0; t < scatter.length; t++) {
      Zone zone = candidates.get(t).zone();
      double squares = 0;
      double measured = 0;
      for (HiddenCells pass : passes) {
        for (int c = 0; c < pass.columns(); c++) {
          double rest = pass.errorM3s(t, c) - biasPct[t] / 100 * pass.measuredM3s(zone, c);
          squares += rest * rest;
          measured += pass.measuredM3s(zone, c);
        }
      }
      scatter[t] = 100 * Math.sqrt(squares * columns) / Math.abs(measured);
    }
    return scatter;
  }

  /** Number of columns with hidden cells. */
  int columns() {
    return columns;
  }

  List<Candidate> candidates() {
    return candidates;
  }

  /** Prediction minus measurement over all columns, in percent of what was measured. */
  double biasPct(int candidate) {
    return biasPct[candidate];
  }

  /** The same in one of the resamples. */
  double biasPct(int candidate, int resample) {
    return drawnBiasPct[resample][candidate];
  }

  double scatterPct(int candidate) {
    return scatterPct[candidate];
  }

  /** 1.96 times the standard deviation of the bias over the resamples. */
  double half95Pct(int candidate) {
    double sum = 0;
    double squares = 0;
    for (double[] drawn : drawnBiasPct) {
      double shift = drawn[candidate] - biasPct[candidate];
      sum += shift;
      squares += shift * shift;
    }
    return 1.96 * Math.sqrt((squares - sum * sum / COUNT) / (COUNT - 1));
  }
}
