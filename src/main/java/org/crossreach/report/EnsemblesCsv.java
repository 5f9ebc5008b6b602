package org.crossreach.report;

import static org.crossreach.report.CsvTable.number;

import java.io.IOException;
import java.io.OutputStream;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import org.crossreach.discharge.ColumnDischarge;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.profile.Transports;
import org.crossreach.profile.Zone;
import org.crossreach.screen.Reason;
import org.crossreach.screen.ScreenedPass;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.survey.Ensembles;

/**
 * One pass as a table with a row for each ensemble and every value between the record and the
 * discharge, so that the sum can be done again in a spreadsheet: the three zone discharges of all
 * rows and the two edges make the total of the pass.
 */
public final class EnsemblesCsv {

  private EnsemblesCsv() {}

  /**
   * Writes the table.
   *
   * @param pass the pass
   * @param target receives UTF-8; it is left open
   */
  public static void write(PassDischarge pass, OutputStream target) throws IOException {
    List<CsvTable.Column<Integer>> columns = new ArrayList<>();
    addRecord(columns, pass.section());
    addCells(columns, pass.section().pass());
    addTransports(columns, pass.section(), pass.transports());
    addDischarge(columns, pass.columns());
    new CsvTable<>(columns)
        .write(IntStream.range(0, pass.section().size()).boxed()::iterator, target);
  }

  private static void addRecord(List<CsvTable.Column<Integer>> columns, Section section) {
    Ensembles ensembles = section.pass().ensembles();
    columns.add(new CsvTable.Column<>("ensemble", i -> Long.toString(ensembles.number(i))));
    columns.add(new CsvTable.Column<>("time", i -> time(ensembles, i)));
    columns.add(number("elapsed_s", ensembles::elapsedS));
    columns.add(number("boat_east_mps", i -> section.track().boatEastMps(i)));
    columns.add(number("boat_north_mps", i -> section.track().boatNorthMps(i)));
    columns.add(flag("boat_filled", i -> section.track().filled(i)));
    columns.add(number("position_east_m", i -> section.track().eastM(i)));
    columns.add(number("position_north_m", i -> section.track().northM(i)));
    columns.add(number("distance_m", section::distanceM));
    columns.add(number("progress_m", section::progressM));
    columns.add(number("sideways_m", section::sidewaysM));
    columns.add(number("depth_m", section::depthM));
    columns.add(flag("depth_filled", section::depthFilled));
  }

  private static void addCells(List<CsvTable.Column<Integer>> columns, ScreenedPass pass) {
    columns.add(new CsvTable.Column<>("cells", i -> Integer.toString(pass.ensembles().cells(i))));
    for (Reason reason : Reason.values()) {
      if (reason != Reason.NO_CELL && reason.ofCells()) {
        String name = reason == Reason.NONE ? "usable" : reason.key().replace('-', '_');
        columns.add(
            new CsvTable.Column<>("cells_" + name, i -> Integer.toString(pass.cells(i, reason))));
      }
    }
  }

  private static void addTransports(
      List<CsvTable.Column<Integer>> columns, Section section, Transports transports) {
    columns.add(flag("column_filled", i -> !transports.own(i)));
    columns.add(
        number(
            "mean_normal_velocity_mps",
            i -> transports.total(Component.NORMAL, i) / section.depthM(i)));
    for (Component component : Component.values()) {
      for (Zone zone : Zone.values()) {
        columns.add(
            number(
                key(zone) + "_" + key(component) + "_m2s",
                i -> transports.zone(zone, component, i)));
      }
    }
  }

  private static void addDischarge(
      List<CsvTable.Column<Integer>> columns, ColumnDischarge discharge) {
    for (Zone zone : Zone.values()) {
      columns.add(number(key(zone) + "_m3s", i -> discharge.of(zone, i)));
    }
    columns.add(number("gaps_m3s", discharge::ofGaps));
  }

  private interface Flag {
    boolean of(int ensemble);
  }

  private static CsvTable.Column<Integer> flag(String name, Flag flag) {
    return new CsvTable.Column<>(name, i -> flag.of(i) ? "1" : "0");
  }

  private static String key(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT);
  }

  private static String time(Ensembles ensembles, int i) {
    return DateTimeFormatter.ISO_OFFSET_DATE_TIME.format(
        ensembles.start().plusNanos(Math.round(1e9 * ensembles.elapsedS(i))));
  }
}
