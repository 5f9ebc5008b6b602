package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;

/** Identity of site, measurement and instrument. */
final class MeasurementFactsSection implements MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject) {
    List<PassDischarge> passes = subject.result().reduction().passes();
    Facts facts = Facts.under(subject.style().label(), subject.style().body(), 4);
    MeasurementFacts.addSite(facts, subject);
    facts.add(
        "Time",
        Subject.clock(Subject.start(passes.get(0)))
            + " – "
            + Subject.clockWithOffset(Subject.end(passes.get(passes.size() - 1))));
    MeasurementFacts.addInstrument(facts, subject);
    return List.of(new Gap(8), facts);
  }
}
