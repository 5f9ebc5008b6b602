package org.crossreach.report.comparison;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Decimals;
import org.crossreach.report.TextTable;
import org.crossreach.report.TextWrap;

/**
 * Several measurements side by side: whether they need the same laws.
 *
 * @param comparisons at least two
 */
public record SiteText(List<Comparison> comparisons) {

  private static final int WIDTH = 80;

  public SiteText {
    comparisons = List.copyOf(comparisons);
  }

  /** The text, lines ending with LF. */
  public String text() {
    TextTable table = new TextTable(1);
    table.row("measurement", "exponent", "top", "bottom", "verdict", "change");
    table.rule();
    for (Comparison each : comparisons) {
      table.row(
          each.chosen().reduction().measurement().id(),
          new Decimals(4).of(each.exponent().value()),
          each.top().law().orElse("cannot tell"),
          each.bottom().law().orElse("cannot tell"),
          each.verdict().kind().key(),
          new Decimals(2).signed(each.verdict().changePct()) + " %");
    }
    List<String> lines = new ArrayList<>(table.lines());
    lines.addAll(TextWrap.lines(sentence(), WIDTH, ""));
    return String.join("\n", lines) + "\n";
  }

  private String sentence() {
    TreeSet<String> tops = new TreeSet<>();
    TreeSet<String> bottoms = new TreeSet<>();
    for (Comparison each : comparisons) {
      each.top().law().ifPresent(tops::add);
      each.bottom().law().ifPresent(bottoms::add);
    }
    return "Near the surface " + need(tops) + "; near the bed " + need(bottoms) + ".";
  }

  private static String need(TreeSet<String> laws) {
    return switch (laws.size()) {
      case 0 -> "no measurement can tell which law it needs";
      case 1 -> "all that can tell need the same law, " + laws.first();
      default -> "they need different laws: " + String.join(", ", laws);
    };
  }
}
