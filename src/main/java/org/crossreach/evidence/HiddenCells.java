package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.crossreach.discharge.Exponents;
import org.crossreach.discharge.LaidMeasurement;
import org.crossreach.profile.Zone;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.settings.ExponentRule;

/**
 * Hides measured cells from the laws and lets them predict what flows there.
 *
 * <p>In every column as many of the uppermost (or lowermost) usable cells are hidden as the
 * unmeasured zone above (or below) them is thick, or as many as can be spared. The laws see the
 * other cells of the column only; a fitted exponent is one number out of all cells of the passes.
 */
final class HiddenCells {

  /** Fewest cells that are left to the laws: as many as the most demanding of them needs. */
  private static final int FEWEST_LEFT = 6;

  /** Number of neighbouring columns in a block. */
  private static final int BLOCK = 10;

  private final LaidMeasurement laid;
  private final Map<ExponentRule, Exponents> exponents;
  private final Zone zone;
  private final List<Candidate> candidates;
  private final List<List<Prediction.Block>> blocks = new ArrayList<>();
  private final double[] error;
  private double measured;
  private int columns;

  private HiddenCells(
      LaidMeasurement laid,
      Map<ExponentRule, Exponents> exponents,
      Zone zone,
      List<Candidate> candidates) {
    this.laid = laid;
    this.exponents = exponents;
    this.zone = zone;
    this.candidates = candidates;
    this.error = new double[candidates.size()];
    for (int c = 0; c < candidates.size(); c++) {
      blocks.add(new ArrayList<>());
    }
  }

  /**
   * Lets laws predict the hidden cells of the used passes.
   *
   * @param laid the passes
   * @param exponents the exponents by every rule
   * @param zone top or bottom
   * @param candidates the laws
   * @return one prediction for each law, in their order
   */
  static List<Prediction> predict(
      LaidMeasurement laid,
      Map<ExponentRule, Exponents> exponents,
      Zone zone,
      List<Candidate> candidates) {
    HiddenCells hidden = new HiddenCells(laid, exponents, zone, candidates);
    for (int p = 0; p < laid.passes().size(); p++) {
      if (laid.passes().get(p).pass().used()) {
        hidden.addPass(p, laid.passes().get(p).section());
      }
    }
    List<Prediction> predictions = new ArrayList<>();
    for (int c = 0; c < candidates.size(); c++) {
      predictions.add(Prediction.of(candidates.get(c), hidden.blocks.get(c), laid.passes().size()));
    }
    return predictions;
  }

  private void addPass(int pass, Section section) {
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    Column rest = section.newColumn();
    double[] exponent = new double[candidates.size()];
    for (int c = 0; c < exponent.length; c++) {
      exponent[c] = exponents.get(candidates.get(c).rule()).passes().get(pass).value();
    }
    for (int i = 0; i < section.size(); i++) {
      section.read(i, row, column);
      int hidden = count(column);
      if (hidden > 0 && section.progressM(i) != 0) {
        addColumn(column, rest, hidden, exponent, section.progressM(i));
        if (columns == BLOCK) {
          closeBlock(pass);
        }
      }
    }
    if (columns > BLOCK / 2) {
      closeBlock(pass);
    }
    columns = 0;
    measured = 0;
    Arrays.fill(error, 0);
  }

  /** Number of cells to hide. */
  private int count(Column column) {
    int size = column.size();
    int most = size - FEWEST_LEFT;
    if (most < 1) {
      return 0;
    }
    double thickness =
        zone == Zone.TOP ? column.depthM() - column.upperM(0) : column.lowerM(size - 1);
    int hidden = 0;
    double height = 0;
    while (hidden < most && (hidden == 0 || height < thickness - 1e-9)) {
      height += column.heightM(zone == Zone.TOP ? hidden : size - 1 - hidden);
      hidden++;
    }
    return hidden;
  }

  private void addColumn(
      Column column, Column rest, int hidden, double[] exponent, double progress) {
    int size = column.size();
    int from = zone == Zone.TOP ? 0 : size - hidden;
    int to = from + hidden;
    rest.takePart(column, zone == Zone.TOP ? hidden : 0, zone == Zone.TOP ? size : from);
    double through = 0;
    for (int j = from; j < to; j++) {
      through += column.velocityMps(Component.NORMAL, j) * column.heightM(j);
    }
    measured += progress * through;
    for (int c = 0; c < exponent.length; c++) {
      double predicted = 0;
      int run = from;
      for (int j = from; j < to; j++) {
        if (j == to - 1 || !column.joined(j)) {
          predicted +=
              candidates
                  .get(c)
                  .velocityLaw()
                  .transport(
                      rest, Component.NORMAL, exponent[c], column.lowerM(j), column.upperM(run));
          run = j + 1;
        }
      }
      error[c] += progress * (predicted - through);
    }
    columns++;
  }

  private void closeBlock(int pass) {
    for (int c = 0; c < error.length; c++) {
      blocks.get(c).add(new Prediction.Block(pass, error[c], measured));
      error[c] = 0;
    }
    measured = 0;
    columns = 0;
  }
}
