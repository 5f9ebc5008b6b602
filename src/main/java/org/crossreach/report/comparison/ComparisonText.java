package org.crossreach.report.comparison;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.CandidateEvidence;
import org.crossreach.evidence.Combination;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparison;
import org.crossreach.evidence.PassEvidence;
import org.crossreach.evidence.ZoneEvidence;
import org.crossreach.profile.ExponentFit;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.TextTable;
import org.crossreach.report.TextWrap;
import org.crossreach.report.Units;

/**
 * A comparison of laws on a terminal of 80 columns: the verdict first, every combination, then the
 * evidence by zone and by pass.
 *
 * @param comparison what is shown
 * @param units the reader's units
 */
public record ComparisonText(Comparison comparison, Units units) {

  private static final int WIDTH = 80;
  private static final Decimals ONE = new Decimals(1);
  private static final Decimals TWO = new Decimals(2);
  private static final Decimals FOUR = new Decimals(4);

  /** The text, lines ending with LF. */
  public String text() {
    List<String> lines = new ArrayList<>();
    lines.add(
        comparison.chosen().reduction().measurement().id()
            + ": every choice for the unmeasured water, discharge in "
            + Quantity.DISCHARGE.symbol(units));
    lines.add("");
    lines.addAll(combinations());
    lines.add("");
    lines.addAll(evidence());
    lines.add("");
    lines.addAll(passes());
    lines.add("");
    lines.addAll(TextWrap.lines(comparison.verdict().sentence(), WIDTH, ""));
    return String.join("\n", lines) + "\n";
  }

  private List<String> combinations() {
    double[] means =
        comparison.combinations().stream()
            .mapToDouble(each -> Quantity.DISCHARGE.in(units, each.dischargeM3s().mean()))
            .toArray();
    Decimals decimals = Decimals.showing(4, means);
    TextTable table = new TextTable(3, 1);
    table.row(
        "  top",
        "bottom",
        "exponent",
        "mean",
        "change%",
        "sd%",
        "top%",
        "hidden%",
        "bed%",
        "hidden%");
    table.rule();
    for (CombinationResult each : comparison.combinations()) {
      Combination combination = each.combination();
      table.row(
          mark(combination) + " " + combination.top().key(),
          combination.bottom().key(),
          combination.rule().key(),
          decimals.of(Quantity.DISCHARGE.in(units, each.dischargeM3s().mean())),
          TWO.signed(each.changePct()),
          TWO.of(each.dischargeM3s().covPct()),
          ONE.of(each.topPct()),
          bias(comparison.evidenceAtTop(combination)),
          ONE.of(each.bottomPct()),
          bias(comparison.evidenceAtBottom(combination)));
    }
    List<String> lines = new ArrayList<>(table.lines());
    lines.add("* chosen, > favoured. top%, bed%: shares of the discharge; hidden%: see below");
    return lines;
  }

  private static String bias(CandidateEvidence evidence) {
    return Double.isFinite(evidence.biasPct())
        ? ONE.signed(evidence.biasPct()) + "±" + ONE.of(evidence.half95Pct())
        : Decimals.NONE;
  }

  private String mark(Combination combination) {
    boolean chosen = combination.equals(comparison.chosenCombination());
    return switch (comparison.verdict().kind()) {
      case CHANGE -> combination.equals(comparison.verdict().combination()) ? ">" : star(chosen);
      case KEEP, CANNOT_TELL -> star(chosen);
    };
  }

  private static String star(boolean chosen) {
    return chosen ? "*" : " ";
  }

  private List<String> evidence() {
    List<String> lines = new ArrayList<>();
    lines.addAll(
        TextWrap.lines(
            "Cells hidden from the laws in "
                + comparison.columns()
                + " columns: prediction minus measurement, ± 95 %, scatter of a column, in % of"
                + " what was measured there; = cannot be told from the best",
            WIDTH,
            ""));
    lines.add(beside("near the surface", "near the bed"));
    List<CandidateEvidence> top = comparison.top().ranked();
    List<CandidateEvidence> bottom = comparison.bottom().ranked();
    for (int r = 0; r < Math.max(top.size(), bottom.size()); r++) {
      lines.add(beside(entry(top, r), entry(bottom, r)));
    }
    return lines;
  }

  private static String beside(String left, String right) {
    return (left + " ".repeat(Math.max(1, WIDTH / 2 - left.length())) + right).stripTrailing();
  }

  private static String entry(List<CandidateEvidence> ranked, int r) {
    if (r >= ranked.size()) {
      return "";
    }
    CandidateEvidence each = ranked.get(r);
    String name = (each.equal() ? "= " : "  ") + each.candidate().text();
    return name
        + " ".repeat(Math.max(1, 19 - name.length()))
        + right(bias(each), 10)
        + right(ONE.of(each.scatterPct()), 7);
  }

  private static String right(String text, int width) {
    return " ".repeat(Math.max(0, width - text.length())) + text;
  }

  private List<String> passes() {
    TextTable table = new TextTable(1);
    table.row("pass", "exponent", "95 % interval", "columns", "top", "bottom");
    table.rule();
    for (PassEvidence each : comparison.passes()) {
      table.row(
          each.pass() + (each.used() ? "" : " (not used)"),
          value(each.exponent()),
          interval(each.exponent()),
          Integer.toString(each.columns()),
          law(each.top()),
          law(each.bottom()));
    }
    table.rule();
    ExponentFit all = comparison.exponent();
    table.row(
        "together",
        value(all),
        interval(all),
        Integer.toString(comparison.columns()),
        law(comparison.top()),
        law(comparison.bottom()));
    List<String> lines = new ArrayList<>(table.lines());
    all.refusal()
        .ifPresent(
            why ->
                lines.addAll(
                    TextWrap.lines("The exponent cannot be fitted: " + why + ".", WIDTH, "")));
    return lines;
  }

  private static String interval(ExponentFit fit) {
    return fit.refusal().isEmpty()
        ? FOUR.of(fit.low95()) + " to " + FOUR.of(fit.high95())
        : Decimals.NONE;
  }

  private static String value(ExponentFit fit) {
    return fit.refusal().isEmpty() ? FOUR.of(fit.value()) : "cannot tell";
  }

  private static String law(ZoneEvidence zone) {
    return zone.law().orElse("cannot tell");
  }
}
