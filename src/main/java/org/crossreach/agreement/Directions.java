package org.crossreach.agreement;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.survey.Bank;

/**
 * The passes of each direction against each other.
 *
 * @param leftToRight number of passes that started at the left bank
 * @param rightToLeft number of passes that started at the right bank
 * @param leftToRightM3s their mean discharge (m³/s), NaN when there is none
 * @param rightToLeftM3s their mean discharge (m³/s), NaN when there is none
 * @param differencePct left to right minus right to left, in percent of the mean over all passes
 */
public record Directions(
    int leftToRight,
    int rightToLeft,
    double leftToRightM3s,
    double rightToLeftM3s,
    double differencePct) {

  static Directions of(List<PassDischarge> passes, double mean) {
    Spread left = spread(passes, Bank.LEFT);
    Spread right = spread(passes, Bank.RIGHT);
    return new Directions(
        left.count(),
        right.count(),
        left.mean(),
        right.mean(),
        Spread.percent(left.mean() - right.mean(), mean));
  }

  private static Spread spread(List<PassDischarge> passes, Bank bank) {
    return Spread.of(
        passes.stream()
            .filter(each -> each.pass().startBank() == bank)
            .mapToDouble(PassDischarge::totalM3s)
            .toArray());
  }

  /** Number of passes that have a partner in the other direction, counted in pairs. */
  public int reciprocalPairs() {
    return Math.min(leftToRight, rightToLeft);
  }
}
