package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.agreement.Directions;
import org.crossreach.agreement.Spread;
import org.crossreach.agreement.Summary;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.chart.PassesAcross;

/** Whether the passes agree along the section, in both directions, and in size. */
final class AgreementSection implements MeasurementSection {

  private static final double TALLEST = 150;

  @Override
  public List<Block> blocks(Subject subject) {
    List<Block> blocks = new ArrayList<>();
    blocks.add(new Gap(8));
    blocks.add(
        new Figure(
            new PassesAcross(subject.result(), subject.units(), subject.style().chart()),
            subject.style().caption(),
            TALLEST));
    blocks.add(new Gap(6));
    blocks.add(
        new SideBySide(
            List.of(List.of(directions(subject)), List.of(sizes(subject))), List.of(1.0, 1.0), 16));
    return blocks;
  }

  private static Table directions(Subject subject) {
    Directions directions = subject.result().summary().directions();
    return new Table(
            subject.style().tables(),
            List.of(
                Table.Heading.prose("Direction"),
                Table.Heading.numbers("Passes"),
                Table.Heading.numbers(subject.heading("Mean discharge", Quantity.DISCHARGE))))
        .row(
            "From the left bank",
            Integer.toString(directions.leftToRight()),
            subject.discharge(directions.leftToRightM3s()))
        .row(
            "From the right bank",
            Integer.toString(directions.rightToLeft()),
            subject.discharge(directions.rightToLeftM3s()))
        .row("Difference (% of the mean)", "", new Decimals(1).signed(directions.differencePct()));
  }

  private static Table sizes(Subject subject) {
    Summary summary = subject.result().summary();
    Table table =
        new Table(
            subject.style().tables(),
            List.of(
                Table.Heading.prose("Mean over used passes"),
                Table.Heading.numbers("Mean"),
                Table.Heading.numbers("Variation (%)")));
    row(subject, table, "Width", Quantity.LENGTH, summary.widthM(), 2);
    row(subject, table, "Area", Quantity.AREA, summary.areaM2(), 1);
    row(subject, table, "Mean velocity", Quantity.VELOCITY, summary.meanVelocityMps(), 3);
    return table;
  }

  private static void row(
      Subject subject, Table table, String name, Quantity quantity, Spread spread, int decimals) {
    table.row(
        name, subject.with(quantity, spread.mean(), decimals), new Decimals(1).of(spread.covPct()));
  }
}
