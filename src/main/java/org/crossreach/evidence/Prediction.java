package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.List;

/**
 * How well a law predicts the discharge through cells that were hidden from it.
 *
 * <p>Percentages are of the discharge measured through the hidden cells. Blocks are runs of
 * neighbouring columns.
 *
 * @param candidate the law
 * @param blocks predicted minus measured, and measured, discharge of each block (m³/s)
 * @param scatterPct standard deviation of a block's error (%)
 * @param passBiasPct bias of each pass (%), NaN where none of its cells could be hidden
 */
public record Prediction(
    Candidate candidate, List<Block> blocks, double scatterPct, List<Double> passBiasPct) {

  public Prediction {
    blocks = List.copyOf(blocks);
    passBiasPct = List.copyOf(passBiasPct);
  }

  /**
   * Sums over neighbouring columns.
   *
   * @param pass place of the pass
   * @param error predicted minus measured discharge (m³/s)
   * @param measured discharge measured through the hidden cells (m³/s)
   */
  public record Block(int pass, double error, double measured) {}

  static Prediction of(Candidate candidate, List<Block> blocks, int passes) {
    double measured = blocks.stream().mapToDouble(Block::measured).sum();
    double mean = blocks.isEmpty() ? Double.NaN : measured / blocks.size();
    double bias = bias(blocks);
    double squares = 0;
    for (Block block : blocks) {
      double rest = block.error - bias * block.measured;
      squares += rest * rest;
    }
    double scatter =
        blocks.size() < 2
            ? Double.NaN
            : 100 * Math.sqrt(squares / (blocks.size() - 1)) / Math.abs(mean);
    List<Double> byPass = new ArrayList<>();
    for (int p = 0; p < passes; p++) {
      int pass = p;
      byPass.add(100 * bias(blocks.stream().filter(block -> block.pass == pass).toList()));
    }
    return new Prediction(candidate, blocks, scatter, byPass);
  }

  private static double bias(List<Block> blocks) {
    double error = 0;
    double measured = 0;
    for (Block block : blocks) {
      error += block.error;
      measured += block.measured;
    }
    return measured == 0 ? Double.NaN : error / measured;
  }

  /** Predicted minus measured discharge of all hidden cells (%). */
  public double biasPct() {
    return 100 * bias(blocks);
  }

  /** Standard error of the bias from the differences between blocks (%). */
  public double standardErrorPct() {
    return scatterPct / Math.sqrt(blocks.size());
  }

  /** Bias and its standard error together (%): what ranks the laws, the smaller the better. */
  double score() {
    return Math.hypot(biasPct(), standardErrorPct());
  }

  /**
   * By how many standard errors of the difference this law's bias is smaller than another's, block
   * by block over the same hidden cells.
   */
  double leadOver(Prediction other) {
    double own = Math.signum(biasPct());
    double others = Math.signum(other.biasPct());
    List<Block> difference = new ArrayList<>();
    for (int b = 0; b < blocks.size(); b++) {
      difference.add(
          new Block(
              0,
              others * other.blocks.get(b).error - own * blocks.get(b).error,
              blocks.get(b).measured));
    }
    Prediction lead = of(candidate, difference, 0);
    return lead.biasPct() / lead.standardErrorPct();
  }
}
