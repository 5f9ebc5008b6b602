package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.agreement.Spread;
import org.crossreach.agreement.Summary;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;

/** The mean discharge, its zones, and the spread of the passes. */
final class MeanSection implements MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject) {
    Summary summary = subject.result().summary();
    return List.of(
        new SideBySide(
            List.of(
                number(subject, summary),
                List.of(ZoneTable.of(subject, summary.zones())),
                List.of(spread(subject, summary))),
            List.of(1.05, 1.45, 1.45),
            16));
  }

  private static List<Block> number(Subject subject, Summary summary) {
    PageStyle style = subject.style();
    return List.of(
        new Text("P", style.caption(), "Discharge"),
        new Gap(2),
        new BigNumber(
            subject.discharge(summary.dischargeM3s().mean()),
            Quantity.DISCHARGE.symbol(subject.units()),
            style.result(),
            style.unit()),
        new Gap(4),
        new Text("P", style.body(), basis(subject, summary)));
  }

  private static String basis(Subject subject, Summary summary) {
    Spread spread = summary.dischargeM3s();
    if (spread.count() < 2) {
      return "From one pass: its spread is unknown.";
    }
    return "Mean of "
        + spread.count()
        + " passes; 95 % interval of the mean from their spread alone: "
        + subject.discharge(spread.mean() - spread.ci95Half())
        + " to "
        + subject.discharge(spread.mean() + spread.ci95Half())
        + " "
        + Quantity.DISCHARGE.symbol(subject.units())
        + ".";
  }

  private static Table spread(Subject subject, Summary summary) {
    Spread discharge = summary.dischargeM3s();
    Decimals one = new Decimals(1);
    return new Table(
            subject.style().tables(),
            List.of(Table.Heading.prose("Spread of the passes"), Table.Heading.numbers("Value")))
        .row("Passes used", Integer.toString(summary.passesUsed()))
        .row("Exposure", new Decimals(0).of(summary.exposureS()) + " s")
        .row("Standard deviation", withUnit(subject, discharge.sd()))
        .row("Coefficient of variation", percent(one, discharge.covPct()))
        .row("Range", percent(one, discharge.rangePct()))
        .row("Half of the 95 % interval", withUnit(subject, discharge.ci95Half()));
  }

  private static String withUnit(Subject subject, double m3s) {
    String number = subject.discharge(m3s);
    return number.equals(Decimals.NONE)
        ? number
        : number + " " + Quantity.DISCHARGE.symbol(subject.units());
  }

  private static String percent(Decimals decimals, double value) {
    return Double.isFinite(value) ? decimals.of(value) + " %" : Decimals.NONE;
  }
}
