package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.report.chart.PassDots;

/** The discharge of the pass, its zones, and its place among the others. */
final class PassResultSection implements TransectSection {

  private static final double TALLEST = 104;

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    return List.of(
        new SideBySide(
            List.of(
                number(subject, pass),
                List.of(ZoneTable.of(subject, pass.zones())),
                List.of(
                    new Figure(
                        new PassDots(
                            subject.result(),
                            pass.pass().name(),
                            subject.units(),
                            subject.style().chart()),
                        subject.style().caption(),
                        TALLEST))),
            List.of(1.0, 1.45, 1.5),
            16));
  }

  private static List<Block> number(Subject subject, PassDischarge pass) {
    PageStyle style = subject.style();
    return List.of(
        new Text("P", style.caption(), "Discharge of this pass"),
        new Gap(2),
        new BigNumber(
            subject.discharge(pass.totalM3s()),
            Quantity.DISCHARGE.symbol(subject.units()),
            style.result(),
            style.unit()),
        new Gap(4),
        new Text("P", style.body(), standing(subject, pass)));
  }

  private static String standing(Subject subject, PassDischarge pass) {
    Spread spread = subject.result().summary().dischargeM3s();
    String unit = " " + Quantity.DISCHARGE.symbol(subject.units());
    if (spread.count() == 1 && pass.pass().used()) {
      return "The only used pass of the measurement.";
    }
    return new Decimals(1).signed(spread.deviationPct(pass.totalM3s()))
        + " % from "
        + subject.discharge(spread.mean())
        + unit
        + ", the mean of the "
        + spread.count()
        + (spread.count() == 1 ? " used pass." : " used passes.")
        + (pass.pass().used() ? "" : " This pass is not one of them.");
  }
}
