package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.PassGeometry;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.chart.VerticalProfile;
import org.crossreach.screen.Accounting;
import org.crossreach.screen.Reason;
import org.crossreach.screen.Tally;
import org.crossreach.section.Section;

/** The vertical profile beside what was measured, rejected and filled in. */
final class PassProfileSection implements TransectSection {

  private static final double TALLEST = 290;

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    PageStyle style = subject.style();
    return List.of(
        new SideBySide(
            List.of(
                List.of(
                    new Figure(
                        new VerticalProfile(
                            pass, subject.result().reduction().settings(), style.chart()),
                        style.caption(),
                        TALLEST)),
                List.of(
                    new Text("H2", style.heading(), "The pass in figures"),
                    new Gap(2.5),
                    figures(subject, pass),
                    style.section("Rejected and filled"),
                    rejected(subject, pass))),
            List.of(1.0, 1.0),
            16));
  }

  private static Table figures(Subject subject, PassDischarge pass) {
    PassGeometry geometry = pass.geometry();
    Decimals whole = new Decimals(0);
    return new Table(
            subject.style().tables(),
            List.of(Table.Heading.prose("Quantity"), Table.Heading.numbers("Value")))
        .row("Width, edges included", subject.with(Quantity.LENGTH, geometry.widthM(), 2))
        .row("Area, edges included", subject.with(Quantity.AREA, geometry.areaM2(), 2))
        .row("Mean velocity", subject.with(Quantity.VELOCITY, pass.meanVelocityMps(), 3))
        .row("Mean depth", subject.with(Quantity.LENGTH, geometry.meanDepthM(), 2))
        .row("Section, left to right, towards", whole.of(pass.section().line().azimuthDeg()) + "°")
        .row("Flow towards", whole.of(geometry.flowAzimuthDeg()) + "°")
        .row("Boat speed", subject.with(Quantity.VELOCITY, geometry.boatSpeedMps(), 3))
        .row("Duration", whole.of(geometry.durationS()) + " s")
        .row("Exponent of the power law", new Decimals(4).of(pass.exponent()))
        .row(
            "Total by the other method",
            subject.discharge(pass.otherMethodTotalM3s())
                + " "
                + Quantity.DISCHARGE.symbol(subject.units()));
  }

  private static Table rejected(Subject subject, PassDischarge pass) {
    Section section = pass.section();
    Accounting accounting = section.pass().accounting();
    Table table =
        new Table(
            subject.style().tables(),
            List.of(
                Table.Heading.prose("What"),
                Table.Heading.numbers("Count"),
                Table.Heading.numbers("Share (%)")));
    row(table, "Cells used", accounting.cells().used(), accounting.cells().recorded());
    rows(table, "Cells rejected: ", accounting.cells());
    rows(table, "Bottom track rejected: ", accounting.bottomTrack());
    rows(table, "Depths rejected: ", accounting.depths());
    int columns = 0;
    int boats = 0;
    for (int i = 0; i < section.size(); i++) {
      columns += pass.transports().own(i) ? 0 : 1;
      boats += section.track().filled(i) ? 1 : 0;
    }
    row(table, "Ensembles filled: velocities", columns, section.size());
    row(table, "Ensembles filled: boat velocity", boats, section.size());
    row(table, "Ensembles filled: depth", accounting.depthsFilled(), section.size());
    row(
        table,
        "Depths from other than the chosen beams",
        accounting.depthsReplaced(),
        section.size());
    table.row(
        "Discharge that rests on filled values",
        "",
        new Decimals(1).of(pass.geometry().filledDischargePct()));
    return table;
  }

  /** A row for each reason that a sample carries. */
  private static void rows(Table table, String prefix, Tally tally) {
    for (Reason reason : Reason.values()) {
      if (reason != Reason.NONE && tally.of(reason) > 0) {
        row(table, prefix + reason.key().replace('-', ' '), tally.of(reason), tally.recorded());
      }
    }
  }

  private static void row(Table table, String name, long count, long of) {
    double share = of == 0 ? Double.NaN : 100.0 * count / of;
    table.row(name, Long.toString(count), new Decimals(1).of(share));
  }
}
