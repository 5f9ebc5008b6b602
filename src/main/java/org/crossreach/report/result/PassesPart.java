package org.crossreach.report.result;

import java.io.IOException;
import java.util.Locale;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Summary;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.notation.JsonText;
import org.crossreach.notation.TimeText;
import org.crossreach.settings.BoatVelocity;
import org.crossreach.survey.Pass;

/** One object for each pass. */
final class PassesPart implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    json.objects(
        "passes", result.reduction().passes(), (PassDischarge each) -> pass(each, result, json));
  }

  private static void pass(PassDischarge each, Result result, JsonText json) throws IOException {
    Pass pass = each.pass();
    Summary summary = result.summary();
    json.text("name", pass.name());
    json.text("start_bank", pass.startBank().name().toLowerCase(Locale.ROOT));
    json.flag("used", pass.used());
    json.text("note", pass.note());
    json.whole("ensembles", pass.ensembles().size());
    json.text("start_time", TimeText.of(pass.ensembles().start()));
    json.number("duration_s", each.geometry().durationS());
    json.object(
        "discharge_m3s",
        () -> {
          ZonesObject.members(each.zones(), json);
          json.number("total", each.totalM3s());
        });
    json.number("other_method_total_m3s", each.otherMethodTotalM3s());
    json.number("width_m", each.geometry().widthM());
    json.number("area_m2", each.geometry().areaM2());
    json.number("mean_velocity_mps", each.meanVelocityMps());
    json.number("mean_depth_m", each.geometry().meanDepthM());
    json.number("exponent", each.exponent());
    if (each.fit().isPresent()) {
      json.numbers("exponent_ci95", each.fit().get().low95(), each.fit().get().high95());
    } else {
      json.nothing("exponent_ci95");
    }
    json.object(
        "by_reference_m3s", () -> json.number(BoatVelocity.BOTTOM_TRACK.key(), each.totalM3s()));
    json.nothing("uncorrected_total_m3s");
    json.number("section_azimuth_deg", each.section().line().azimuthDeg());
    json.number("flow_azimuth_deg", each.geometry().flowAzimuthDeg());
    json.number("boat_speed_mps", each.geometry().boatSpeedMps());
    json.number("usable_cells_pct", each.geometry().usableCellsPct());
    json.number("filled_discharge_pct", each.geometry().filledDischargePct());
    json.number("deviation_pct", summary.dischargeM3s().deviationPct(each.totalM3s()));
    AccountingObject.write(each, json);
    NotesArray.write(each.notes(), json);
  }
}
