package org.crossreach.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.crossreach.agreement.Directions;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.agreement.Summary;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;

/**
 * The result on a terminal of 80 columns: passes as rows, zones as columns, spread below, notes
 * last.
 *
 * @param result the result
 * @param units the reader's units
 */
public record ConsoleReport(Result result, Units units) {

  private static final int WIDTH = 80;

  /** The text, lines ending with LF. */
  public String text() {
    List<String> lines = new ArrayList<>(heading());
    lines.add("");
    lines.addAll(table());
    lines.add("");
    lines.addAll(spread());
    List<String> notes = notes();
    if (!notes.isEmpty()) {
      lines.add("");
      lines.addAll(notes);
    }
    return String.join("\n", lines) + "\n";
  }

  private List<String> heading() {
    Measurement measurement = result.reduction().measurement();
    Settings settings = result.reduction().settings();
    List<String> place = new ArrayList<>();
    place.add(measurement.id());
    for (String part : List.of(measurement.site().name(), measurement.site().river())) {
      if (!part.isEmpty()) {
        place.add(part);
      }
    }
    String choices =
        "Discharge in "
            + Quantity.DISCHARGE.symbol(units)
            + " by "
            + settings.method().key()
            + "; boat velocity "
            + settings.boatVelocity().key()
            + "; top "
            + settings.top().key()
            + ", bottom "
            + settings.bottom().key()
            + ", exponent "
            + exponents();
    List<String> lines = new ArrayList<>(TextWrap.lines(String.join(", ", place), WIDTH, ""));
    lines.addAll(TextWrap.lines(choices, WIDTH, ""));
    return lines;
  }

  private String exponents() {
    Decimals four = new Decimals(4);
    List<String> all = new ArrayList<>();
    for (PassDischarge each : result.reduction().used()) {
      String text = four.of(each.exponent());
      if (!all.contains(text)) {
        all.add(text);
      }
    }
    return String.join(" ", all)
        + " ("
        + result.reduction().settings().exponent().rule().key()
        + ")";
  }

  private List<String> table() {
    List<PassDischarge> passes = result.reduction().passes();
    Spread spread = result.summary().dischargeM3s();
    double[] totals = passes.stream().mapToDouble(each -> discharge(each.totalM3s())).toArray();
    Decimals decimals = Decimals.showing(4, totals);
    TextTable table = new TextTable(2);
    table.row("pass", "from", "top", "measured", "bottom", "left", "right", "total", "departs");
    table.rule();
    for (PassDischarge each : passes) {
      table.row(
          cells(
              each.pass().name(),
              bank(each),
              each.zones(),
              decimals,
              each.pass().used()
                  ? new Decimals(2).signed(spread.deviationPct(each.totalM3s())) + " %"
                  : "not used"));
    }
    table.rule();
    table.row(
        cells(
            "mean of " + result.summary().passesUsed(),
            "",
            result.summary().zones(),
            decimals,
            ""));
    return table.lines();
  }

  private static String bank(PassDischarge pass) {
    return pass.pass().startBank().name().toLowerCase(Locale.ROOT);
  }

  private String[] cells(
      String name, String from, ZoneDischarge zones, Decimals decimals, String last) {
    return new String[] {
      name,
      from,
      decimals.of(discharge(zones.top())),
      decimals.of(discharge(zones.measured())),
      decimals.of(discharge(zones.bottom())),
      decimals.of(discharge(zones.leftEdge())),
      decimals.of(discharge(zones.rightEdge())),
      decimals.of(discharge(zones.total())),
      last
    };
  }

  private double discharge(double m3s) {
    return Quantity.DISCHARGE.in(units, m3s);
  }

  private List<String> spread() {
    Summary summary = result.summary();
    Spread q = summary.dischargeM3s();
    Directions directions = summary.directions();
    TextTable table = new TextTable(2);
    table.row(
        "discharge",
        value(Quantity.DISCHARGE, q.mean()),
        "sd " + percent(q.covPct()),
        "range " + percent(q.rangePct()),
        "95 % half-width " + percent(100 * q.ci95Half() / Math.abs(q.mean())));
    row(table, "width", Quantity.LENGTH, summary.widthM());
    row(table, "area", Quantity.AREA, summary.areaM2());
    row(table, "mean velocity", Quantity.VELOCITY, summary.meanVelocityMps());
    List<String> lines = new ArrayList<>(table.lines());
    lines.add(
        "from left "
            + value(Quantity.DISCHARGE, directions.leftToRightM3s())
            + ", from right "
            + value(Quantity.DISCHARGE, directions.rightToLeftM3s())
            + ", difference "
            + percent(directions.differencePct()));
    lines.add(
        summary.passesUsed()
            + " passes, "
            + directions.reciprocalPairs()
            + " reciprocal pairs, exposure "
            + new Decimals(0).of(summary.exposureS())
            + " s");
    lines.add(samples());
    return lines;
  }

  /** Rejected cells and filled discharge of the used passes, the largest of each. */
  private String samples() {
    double usable = Double.NaN;
    double filled = 0;
    for (PassDischarge each : result.reduction().used()) {
      usable = Math.min(Double.isNaN(usable) ? 100 : usable, each.geometry().usableCellsPct());
      filled = Math.max(filled, each.geometry().filledDischargePct());
    }
    return "in every pass at least "
        + new Decimals(1).of(usable)
        + " % of the cells usable, at most "
        + new Decimals(1).of(filled)
        + " % filled in";
  }

  private void row(TextTable table, String name, Quantity quantity, Spread spread) {
    table.row(
        name,
        value(quantity, spread.mean()),
        "sd " + percent(spread.covPct()),
        "range " + percent(spread.rangePct()),
        "");
  }

  private String value(Quantity quantity, double si) {
    double value = quantity.in(units, si);
    return Decimals.showing(4, value).of(value) + " " + quantity.symbol(units);
  }

  private static String percent(double value) {
    return new Decimals(2).of(value) + " %";
  }

  private List<String> notes() {
    List<String> lines = new ArrayList<>();
    for (PassDischarge each : result.reduction().passes()) {
      if (!each.pass().used() && !each.pass().note().isEmpty()) {
        add(lines, "note", each.pass().name() + ": not used: " + each.pass().note());
      }
      for (Note note : each.notes()) {
        add(lines, level(note), each.pass().name() + ": " + note.text());
      }
    }
    for (Note note : result.summary().notes()) {
      add(lines, level(note), note.text());
    }
    return lines;
  }

  private static String level(Note note) {
    return note.level().name().toLowerCase(Locale.ROOT);
  }

  private static void add(List<String> lines, String level, String text) {
    lines.addAll(TextWrap.lines(level + ": " + text, WIDTH, "  "));
  }
}
