package org.crossreach.archive;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Summary;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.ingest.JsonFields;
import org.crossreach.ingest.JsonNode;
import org.crossreach.notation.JsonText;
import org.crossreach.notation.TimeText;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;

/**
 * What the index says about a measurement and its passes: texts and numbers by name, in order.
 *
 * @param measurement values of the measurement
 * @param passes values of each pass
 */
record IndexRows(Map<String, Object> measurement, List<Map<String, Object>> passes) {

  /** Names of the values of a measurement, in order. */
  static final List<String> MEASUREMENT =
      List.of(
          "id",
          "site",
          "river",
          "start_time",
          "passes_used",
          "discharge_m3s",
          "sd_m3s",
          "cov_pct",
          "ci95_half_m3s",
          "width_m",
          "area_m2",
          "mean_velocity_mps",
          "exposure_s",
          "cautions",
          "faults");

  /** Names of the values of a pass, in order. */
  static final List<String> PASS =
      List.of(
          "pass",
          "start_bank",
          "used",
          "start_time",
          "duration_s",
          "discharge_m3s",
          "deviation_pct",
          "width_m",
          "area_m2",
          "mean_velocity_mps",
          "filled_discharge_pct");

  static IndexRows of(Result result) {
    Measurement facts = result.reduction().measurement();
    Summary summary = result.summary();
    Map<String, Object> row = new LinkedHashMap<>();
    row.put("id", facts.id());
    row.put("site", facts.site().name());
    row.put("river", facts.site().river());
    row.put("start_time", time(result.reduction().passes().get(0)));
    row.put("passes_used", (double) summary.passesUsed());
    row.put("discharge_m3s", summary.dischargeM3s().mean());
    row.put("sd_m3s", summary.dischargeM3s().sd());
    row.put("cov_pct", summary.dischargeM3s().covPct());
    row.put("ci95_half_m3s", summary.dischargeM3s().ci95Half());
    row.put("width_m", summary.widthM().mean());
    row.put("area_m2", summary.areaM2().mean());
    row.put("mean_velocity_mps", summary.meanVelocityMps().mean());
    row.put("exposure_s", summary.exposureS());
    row.put("cautions", (double) count(result, Note.Level.CAUTION));
    row.put("faults", (double) count(result, Note.Level.FAULT));
    List<Map<String, Object>> passes = new ArrayList<>();
    for (PassDischarge each : result.reduction().passes()) {
      passes.add(pass(each, summary));
    }
    return new IndexRows(row, passes);
  }

  private static Map<String, Object> pass(PassDischarge each, Summary summary) {
    Map<String, Object> row = new LinkedHashMap<>();
    row.put("pass", each.pass().name());
    row.put("start_bank", each.pass().startBank().name().toLowerCase(Locale.ROOT));
    row.put("used", each.pass().used() ? "true" : "false");
    row.put("start_time", time(each));
    row.put("duration_s", each.geometry().durationS());
    row.put("discharge_m3s", each.totalM3s());
    row.put("deviation_pct", summary.dischargeM3s().deviationPct(each.totalM3s()));
    row.put("width_m", each.geometry().widthM());
    row.put("area_m2", each.geometry().areaM2());
    row.put("mean_velocity_mps", each.meanVelocityMps());
    row.put("filled_discharge_pct", each.geometry().filledDischargePct());
    return row;
  }

  private static String time(PassDischarge pass) {
    return TimeText.of(pass.pass().ensembles().start());
  }

  private static long count(Result result, Note.Level level) {
    long count = result.summary().notes().stream().filter(n -> n.level() == level).count();
    for (PassDischarge each : result.reduction().passes()) {
      count += each.notes().stream().filter(n -> n.level() == level).count();
    }
    return count;
  }

  /** The rows as two members of a JSON object. */
  void write(JsonText json) throws IOException {
    json.object("measurement", () -> members(measurement, json));
    json.objects("passes", passes, each -> members(each, json));
  }

  private static void members(Map<String, Object> row, JsonText json) throws IOException {
    for (Map.Entry<String, Object> each : row.entrySet()) {
      if (each.getValue() instanceof Double number) {
        json.number(each.getKey(), number);
      } else {
        json.text(each.getKey(), each.getValue().toString());
      }
    }
  }

  /** The rows as they stand in a manifest. */
  static IndexRows of(JsonFields measurement, List<JsonFields> passes) {
    return new IndexRows(row(measurement), passes.stream().map(IndexRows::row).toList());
  }

  private static Map<String, Object> row(JsonFields fields) {
    Map<String, Object> row = new LinkedHashMap<>();
    fields
        .members()
        .forEach(
            (key, node) ->
                row.put(
                    key,
                    node instanceof JsonNode.Number number
                        ? (Object) number.value()
                        : node instanceof JsonNode.Text text ? text.text() : Double.NaN));
    return row;
  }
}
