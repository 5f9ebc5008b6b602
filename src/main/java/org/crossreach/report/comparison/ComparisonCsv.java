package org.crossreach.report.comparison;

import static org.crossreach.report.CsvTable.number;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.Choice;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.CsvTable;

/** Comparisons as a table: one row for each measurement and choice. */
public final class ComparisonCsv {

  private ComparisonCsv() {}

  private record Row(Comparison comparison, Choice choice) {}

  /**
   * Writes the table.
   *
   * @param comparisons one for each measurement
   * @param target receives UTF-8; it is left open
   */
  public static void write(List<Comparison> comparisons, OutputStream target) throws IOException {
    List<Row> rows = new ArrayList<>();
    for (Comparison comparison : comparisons) {
      for (Choice choice : comparison.choices()) {
        rows.add(new Row(comparison, choice));
      }
    }
    new CsvTable<>(columns()).write(rows, target);
  }

  private static List<CsvTable.Column<Row>> columns() {
    return List.of(
        new CsvTable.Column<>("measurement", row -> row.comparison().measurement().id()),
        new CsvTable.Column<>("top", row -> row.choice().settings().top().key()),
        new CsvTable.Column<>("bottom", row -> row.choice().settings().bottom().key()),
        new CsvTable.Column<>(
            "exponent_rule", row -> row.choice().settings().exponent().rule().key()),
        new CsvTable.Column<>(
            "chosen",
            row -> Boolean.toString(row.choice().settings().equals(row.comparison().settings()))),
        number("mean_m3s", row -> row.choice().discharge().mean()),
        number("change_pct", row -> row.choice().changePct()),
        number("sd_m3s", row -> row.choice().discharge().sd()),
        number("top_share_pct", row -> row.choice().topSharePct()),
        number("bottom_share_pct", row -> row.choice().bottomSharePct()),
        number("top_hidden_bias_pct", row -> row.choice().top().biasPct()),
        number("top_hidden_standard_error_pct", row -> row.choice().top().standardErrorPct()),
        number("top_hidden_scatter_pct", row -> row.choice().top().scatterPct()),
        number("bottom_hidden_bias_pct", row -> row.choice().bottom().biasPct()),
        number("bottom_hidden_standard_error_pct", row -> row.choice().bottom().standardErrorPct()),
        number("bottom_hidden_scatter_pct", row -> row.choice().bottom().scatterPct()));
  }
}
