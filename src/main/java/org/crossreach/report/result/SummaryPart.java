package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Directions;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.agreement.Summary;
import org.crossreach.notation.JsonText;

/** The used passes taken together. */
final class SummaryPart implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    Summary summary = result.summary();
    Directions directions = summary.directions();
    json.object(
        "summary",
        () -> {
          json.whole("passes_used", summary.passesUsed());
          json.number("exposure_s", summary.exposureS());
          json.whole("reciprocal_pairs", directions.reciprocalPairs());
          spread("discharge_m3s", summary.dischargeM3s(), json);
          json.object("zones_m3s", () -> ZonesObject.members(summary.zones(), json));
          json.object(
              "directions",
              () -> {
                json.number("left_to_right_m3s", directions.leftToRightM3s());
                json.number("right_to_left_m3s", directions.rightToLeftM3s());
                json.number("difference_pct", directions.differencePct());
              });
          spread("width_m", summary.widthM(), json);
          spread("area_m2", summary.areaM2(), json);
          spread("mean_velocity_mps", summary.meanVelocityMps(), json);
          NotesArray.write(summary.notes(), json);
        });
  }

  private static void spread(String name, Spread spread, JsonText json) throws IOException {
    json.object(
        name,
        () -> {
          json.number("mean", spread.mean());
          json.number("sd", spread.sd());
          json.number("cov_pct", spread.covPct());
          json.number("range_pct", spread.rangePct());
          json.number("ci95_half", spread.ci95Half());
        });
  }
}
