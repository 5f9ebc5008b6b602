package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.chart.PassDots;
import org.crossreach.survey.Bank;

/** Every pass in a row, and all of them in a picture. */
final class PassesSection implements MeasurementSection {

  private static final double TALLEST = 240;

  @Override
  public List<Block> blocks(Subject subject) {
    List<Block> blocks = new ArrayList<>();
    blocks.add(subject.style().section("Passes"));
    blocks.add(table(subject));
    blocks.add(new Gap(8));
    blocks.add(
        new Figure(
            new PassDots(subject.result(), "", subject.units(), subject.style().chart()),
            subject.style().caption(),
            TALLEST));
    return blocks;
  }

  private static Table table(Subject subject) {
    Table table =
        new Table(
            subject.style().tables(),
            List.of(
                Table.Heading.words("Pass"),
                Table.Heading.words("Used"),
                Table.Heading.words("From"),
                Table.Heading.words("Start"),
                Table.Heading.numbers("Duration (s)"),
                Table.Heading.numbers("Ensembles"),
                Table.Heading.numbers(subject.heading("Width", Quantity.LENGTH)),
                Table.Heading.numbers(subject.heading("Area", Quantity.AREA)),
                Table.Heading.numbers(subject.heading("Velocity", Quantity.VELOCITY)),
                Table.Heading.numbers(subject.heading("Discharge", Quantity.DISCHARGE)),
                Table.Heading.numbers("From mean (%)")));
    for (PassDischarge pass : subject.result().reduction().passes()) {
      table.row(row(subject, pass));
    }
    return table;
  }

  private static List<String> row(Subject subject, PassDischarge pass) {
    return List.of(
        pass.pass().name(),
        pass.pass().used() ? "yes" : "no",
        pass.pass().startBank() == Bank.LEFT ? "left" : "right",
        Subject.clock(Subject.start(pass)),
        new Decimals(0).of(pass.geometry().durationS()),
        Integer.toString(pass.section().size()),
        number(subject, Quantity.LENGTH, pass.geometry().widthM(), 2),
        number(subject, Quantity.AREA, pass.geometry().areaM2(), 1),
        number(subject, Quantity.VELOCITY, pass.meanVelocityMps(), 3),
        subject.discharge(pass.totalM3s()),
        new Decimals(1)
            .signed(subject.result().summary().dischargeM3s().deviationPct(pass.totalM3s())));
  }

  private static String number(Subject subject, Quantity quantity, double si, int decimals) {
    return new Decimals(decimals).of(quantity.in(subject.units(), si));
  }
}
