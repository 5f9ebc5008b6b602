package org.crossreach.report;

import static org.crossreach.report.CsvTable.number;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.Locale;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.notation.TimeText;

/** The passes of a measurement as a table: one row for each pass, used or not. */
public final class PassesCsv {

  private PassesCsv() {}

  /**
   * Writes the table.
   *
   * @param result the result
   * @param target receives UTF-8; it is left open
   */
  public static void write(Result result, OutputStream target) throws IOException {
    new CsvTable<>(columns(result.summary().dischargeM3s()))
        .write(result.reduction().passes(), target);
  }

  private static List<CsvTable.Column<PassDischarge>> columns(Spread spread) {
    return List.of(
        new CsvTable.Column<>("pass", each -> each.pass().name()),
        new CsvTable.Column<>(
            "start_bank", each -> each.pass().startBank().name().toLowerCase(Locale.ROOT)),
        new CsvTable.Column<>("used", each -> Boolean.toString(each.pass().used())),
        new CsvTable.Column<>("start_time", each -> TimeText.of(each.pass().ensembles().start())),
        new CsvTable.Column<>(
            "ensembles", each -> Integer.toString(each.pass().ensembles().size())),
        number("duration_s", each -> each.geometry().durationS()),
        number("top_m3s", each -> each.zones().top()),
        number("measured_m3s", each -> each.zones().measured()),
        number("bottom_m3s", each -> each.zones().bottom()),
        number("left_edge_m3s", each -> each.zones().leftEdge()),
        number("right_edge_m3s", each -> each.zones().rightEdge()),
        number("total_m3s", PassDischarge::totalM3s),
        number("deviation_pct", each -> spread.deviationPct(each.totalM3s())),
        number("other_method_total_m3s", PassDischarge::otherMethodTotalM3s),
        number("width_m", each -> each.geometry().widthM()),
        number("area_m2", each -> each.geometry().areaM2()),
        number("mean_velocity_mps", PassDischarge::meanVelocityMps),
        number("mean_depth_m", each -> each.geometry().meanDepthM()),
        number("exponent", PassDischarge::exponent),
        number("section_azimuth_deg", each -> each.section().line().azimuthDeg()),
        number("flow_azimuth_deg", each -> each.geometry().flowAzimuthDeg()),
        number("boat_speed_mps", each -> each.geometry().boatSpeedMps()),
        number("usable_cells_pct", each -> each.geometry().usableCellsPct()),
        number("filled_discharge_pct", each -> each.geometry().filledDischargePct()));
  }
}
