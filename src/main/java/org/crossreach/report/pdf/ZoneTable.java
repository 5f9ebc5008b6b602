package org.crossreach.report.pdf;

import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;

/** Discharge by zone as a table with its sum. */
final class ZoneTable {

  private ZoneTable() {}

  static Block of(Subject subject, ZoneDischarge zones) {
    Table table =
        new Table(
            subject.style().tables(),
            java.util.List.of(
                Table.Heading.prose("Zone"),
                Table.Heading.numbers(subject.heading("Discharge", Quantity.DISCHARGE)),
                Table.Heading.numbers("Share (%)")));
    add(subject, table, zones, "Top, extrapolated", zones.top());
    add(subject, table, zones, "Measured", zones.measured());
    add(subject, table, zones, "Bottom, extrapolated", zones.bottom());
    add(subject, table, zones, "Left edge, estimated", zones.leftEdge());
    add(subject, table, zones, "Right edge, estimated", zones.rightEdge());
    add(subject, table, zones, "Total", zones.total());
    return table.withSum();
  }

  private static void add(
      Subject subject, Table table, ZoneDischarge zones, String name, double m3s) {
    double share = zones.total() == 0 ? Double.NaN : 100 * m3s / zones.total();
    table.row(name, subject.discharge(m3s), new Decimals(1).of(share));
  }
}
