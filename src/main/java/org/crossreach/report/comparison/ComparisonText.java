package org.crossreach.report.comparison;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.crossreach.discharge.Exponents;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.evidence.Choice;
import org.crossreach.evidence.Comparison;
import org.crossreach.evidence.Prediction;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.TextTable;
import org.crossreach.report.TextWrap;
import org.crossreach.report.Units;
import org.crossreach.settings.ExponentRule;

/**
 * Every choice on one screen of 80 columns, with the evidence for each and what follows.
 *
 * @param comparison the comparison
 * @param units the reader's units
 */
public record ComparisonText(Comparison comparison, Units units) {

  private static final int WIDTH = 80;

  /** The text, lines ending with LF. */
  public String text() {
    List<String> lines = new ArrayList<>();
    lines.add(
        comparison.measurement().id()
            + ": mean discharge in "
            + Quantity.DISCHARGE.symbol(units)
            + " under every choice of extrapolation");
    lines.add("");
    lines.addAll(choices());
    lines.add("");
    lines.addAll(
        TextWrap.lines(
            "> is the choice of the settings. top% and bottom% are shares of the discharge; hidden% is"
                + " the error of the law, bias ± standard error, in % of what was"
                + " measured through cells that were hidden from it.",
            WIDTH, ""));
    lines.add("");
    lines.addAll(passes());
    lines.add("");
    for (String sentence :
        List.of(
            comparison.top().sentence(), comparison.bottom().sentence(), comparison.conclusion())) {
      lines.addAll(TextWrap.lines(sentence, WIDTH, "  "));
    }
    return String.join("\n", lines) + "\n";
  }

  private List<String> choices() {
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
        "bottom%",
        "hidden%");
    table.rule();
    double[] means =
        comparison.choices().stream().mapToDouble(each -> each.discharge().mean()).toArray();
    Decimals decimals = Decimals.showing(4, means);
    for (Choice each : comparison.choices()) {
      table.row(
          (each.settings().equals(comparison.settings()) ? "> " : "  ")
              + each.settings().top().key(),
          each.settings().bottom().key(),
          each.settings().exponent().rule().key(),
          decimals.of(Quantity.DISCHARGE.in(units, each.discharge().mean())),
          new Decimals(2).signed(each.changePct()),
          new Decimals(1).of(each.discharge().covPct()),
          new Decimals(0).of(each.topSharePct()),
          error(each.top()),
          new Decimals(0).of(each.bottomSharePct()),
          error(each.bottom()));
    }
    return table.lines();
  }

  private static String error(Prediction prediction) {
    return Double.isFinite(prediction.biasPct())
        ? new Decimals(1).signed(prediction.biasPct())
            + "±"
            + new Decimals(1).of(prediction.standardErrorPct())
        : Decimals.NONE;
  }

  /** For each pass the fitted exponent and how the chosen laws predict its hidden cells. */
  private List<String> passes() {
    TextTable table = new TextTable(1);
    table.row("pass", "total", "fitted exponent", "top hidden", "bottom hidden");
    table.rule();
    Choice chosen = comparison.chosen();
    List<PassDischarge> passes = chosen.result().reduction().passes();
    double[] totals = passes.stream().mapToDouble(PassDischarge::totalM3s).toArray();
    Decimals decimals = Decimals.showing(4, totals);
    for (int p = 0; p < passes.size(); p++) {
      table.row(
          passes.get(p).pass().name(),
          decimals.of(Quantity.DISCHARGE.in(units, passes.get(p).totalM3s())),
          exponent(comparison.exponents().get(ExponentRule.FIT_PASS).passes().get(p)),
          bias(chosen.top().passBiasPct().get(p)),
          bias(chosen.bottom().passBiasPct().get(p)));
    }
    table.row(
        "all used",
        decimals.of(Quantity.DISCHARGE.in(units, chosen.discharge().mean())),
        exponent(comparison.exponents().get(ExponentRule.FIT_ALL).passes().get(0)),
        bias(chosen.top().biasPct()),
        bias(chosen.bottom().biasPct()));
    return table.lines();
  }

  private static String bias(double percent) {
    return Double.isFinite(percent) ? new Decimals(1).signed(percent) + " %" : Decimals.NONE;
  }

  private static String exponent(Exponents.Chosen chosen) {
    return chosen
        .fit()
        .map(
            fit ->
                String.format(
                    Locale.ROOT, "%.4f ± %.4f", fit.value(), (fit.high95() - fit.low95()) / 2))
        .orElse("cannot tell");
  }

  /** Several measurements side by side: the choice that the evidence favours for each. */
  public static String sideBySide(List<Comparison> comparisons) {
    TextTable table = new TextTable(5);
    table.row("measurement", "top", "bottom", "exponent", "evidence", "change");
    table.rule();
    List<String> laws = new ArrayList<>();
    for (Comparison each : comparisons) {
      Choice favoured = each.favoured();
      String law = favoured.settings().top().key() + "/" + favoured.settings().bottom().key();
      if (!laws.contains(law)) {
        laws.add(law);
      }
      table.row(
          each.measurement().id(),
          favoured.settings().top().key(),
          favoured.settings().bottom().key(),
          favoured.settings().exponent().rule().key(),
          each.top().finding().name().toLowerCase(Locale.ROOT).replace('_', '-'),
          new Decimals(2).signed(favoured.changePct()) + " %");
    }
    String conclusion =
        laws.size() == 1
            ? "All of them take the same laws, top/bottom " + laws.get(0) + "."
            : "They do not all take the same laws, top/bottom: " + String.join(", ", laws) + ".";
    return String.join("\n", table.lines()) + "\n\n" + conclusion + "\n";
  }
}
