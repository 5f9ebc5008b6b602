package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.CandidateEvidence;
import org.crossreach.evidence.Combination;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparer;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.chart.HiddenCellErrors;

/** What every other choice for the unmeasured water would give, and what speaks for each. */
final class ExtrapolationsSection implements MeasurementSection {

  private static final double TALLEST = 240;
  private static final Decimals ONE = new Decimals(1);
  private static final Decimals TWO = new Decimals(2);

  @Override
  public List<Block> blocks(Subject subject) {
    PageStyle style = subject.style();
    Comparison comparison = new Comparer(1).compare(subject.result().reduction());
    List<Block> blocks = new ArrayList<>();
    blocks.add(style.section("Choices for the unmeasured water"));
    // side by side with nothing: no page ends within it
    blocks.add(
        new SideBySide(
            List.of(
                List.of(
                    Text.paragraph(style.body(), comparison.verdict().sentence()),
                    new Gap(6),
                    table(subject, comparison),
                    new Gap(3),
                    Text.paragraph(
                        style.remark(),
                        "Hidden: what a law predicts for cells that were measured and hidden from"
                            + " it, minus the measurement, in percent of it, with the 95 %"
                            + " interval; from "
                            + comparison.columns()
                            + " columns."))),
            List.of(1.0),
            0));
    blocks.add(new Gap(8));
    blocks.add(
        new Figure(new HiddenCellErrors(comparison, style.chart()), style.caption(), TALLEST));
    return blocks;
  }

  private static Table table(Subject subject, Comparison comparison) {
    Table table =
        new Table(
            subject.style().tables(),
            List.of(
                Table.Heading.words("Standing"),
                Table.Heading.words("Near the surface"),
                Table.Heading.words("Near the bed"),
                Table.Heading.words("Exponent"),
                Table.Heading.numbers(subject.heading("Mean", Quantity.DISCHARGE)),
                Table.Heading.numbers("Change (%)"),
                Table.Heading.numbers("Variation (%)"),
                Table.Heading.numbers("Top (%)"),
                Table.Heading.numbers("Hidden (%)"),
                Table.Heading.numbers("Bed (%)"),
                Table.Heading.numbers("Hidden (%)")));
    for (CombinationResult each : comparison.combinations()) {
      Combination combination = each.combination();
      table.row(
          standing(comparison, combination),
          combination.top().key(),
          combination.bottom().key(),
          combination.rule().key(),
          subject.discharge(each.dischargeM3s().mean()),
          TWO.signed(each.changePct()),
          TWO.of(each.dischargeM3s().covPct()),
          ONE.of(each.topPct()),
          hidden(comparison.evidenceAtTop(combination)),
          ONE.of(each.bottomPct()),
          hidden(comparison.evidenceAtBottom(combination)));
    }
    return table;
  }

  private static String standing(Comparison comparison, Combination combination) {
    if (combination.equals(comparison.chosenCombination())) {
      return "chosen";
    }
    return combination.equals(comparison.verdict().combination()) ? "favoured" : "";
  }

  private static String hidden(CandidateEvidence evidence) {
    return Double.isFinite(evidence.biasPct())
        ? ONE.signed(evidence.biasPct()) + " ± " + ONE.of(evidence.half95Pct())
        : Decimals.NONE;
  }
}
