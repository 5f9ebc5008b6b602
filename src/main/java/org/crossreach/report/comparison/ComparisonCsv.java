package org.crossreach.report.comparison;

import static org.crossreach.report.CsvTable.number;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.CandidateEvidence;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.CsvTable;

/** Comparisons as a table: one row for each measurement and combination. */
public final class ComparisonCsv {

  /** Name of the file. */
  public static final String FILE = "combinations.csv";

  private ComparisonCsv() {}

  /** A combination with the comparison it stands in. */
  private record Row(Comparison comparison, CombinationResult result) {

    CandidateEvidence top() {
      return comparison.evidenceAtTop(result.combination());
    }

    CandidateEvidence bottom() {
      return comparison.evidenceAtBottom(result.combination());
    }
  }

  /**
   * Writes the table.
   *
   * @param comparisons one for each measurement
   * @param target receives UTF-8; it is left open
   */
  public static void write(List<Comparison> comparisons, OutputStream target) throws IOException {
    List<Row> rows = new ArrayList<>();
    for (Comparison comparison : comparisons) {
      for (CombinationResult each : comparison.combinations()) {
        rows.add(new Row(comparison, each));
      }
    }
    new CsvTable<>(columns()).write(rows, target);
  }

  private static List<CsvTable.Column<Row>> columns() {
    return List.of(
        new CsvTable.Column<>(
            "measurement", row -> row.comparison.chosen().reduction().measurement().id()),
        new CsvTable.Column<>("top", row -> row.result.combination().top().key()),
        new CsvTable.Column<>("bottom", row -> row.result.combination().bottom().key()),
        new CsvTable.Column<>("exponent_rule", row -> row.result.combination().rule().key()),
        new CsvTable.Column<>(
            "chosen",
            row ->
                Boolean.toString(
                    row.result.combination().equals(row.comparison.chosenCombination()))),
        new CsvTable.Column<>(
            "favoured",
            row ->
                Boolean.toString(
                    row.result.combination().equals(row.comparison.verdict().combination()))),
        number("mean_m3s", row -> row.result.dischargeM3s().mean()),
        number("change_pct", row -> row.result.changePct()),
        number("sd_m3s", row -> row.result.dischargeM3s().sd()),
        number("cov_pct", row -> row.result.dischargeM3s().covPct()),
        number("top_share_pct", row -> row.result.topPct()),
        number("bottom_share_pct", row -> row.result.bottomPct()),
        number("top_bias_pct", row -> row.top().biasPct()),
        number("top_half95_pct", row -> row.top().half95Pct()),
        number("top_scatter_pct", row -> row.top().scatterPct()),
        number("bottom_bias_pct", row -> row.bottom().biasPct()),
        number("bottom_half95_pct", row -> row.bottom().half95Pct()),
        number("bottom_scatter_pct", row -> row.bottom().scatterPct()),
        number("expected_error_pct", row -> row.result.expectedErrorPct()));
  }
}
