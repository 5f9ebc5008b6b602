package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Quantity;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensembles;

/** Identity of site, measurement, pass and instrument. */
final class PassFactsSection implements TransectSection {

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    Ensembles ensembles = pass.pass().ensembles();
    int last = ensembles.size() - 1;
    Facts facts = Facts.under(subject.style().label(), subject.style().body(), 4);
    MeasurementFacts.addSite(facts, subject);
    facts
        .add(
            "Time",
            Subject.clock(Subject.start(pass)) + " – " + Subject.clockWithOffset(Subject.end(pass)))
        .add(
            "Record",
            pass.pass().file()
                + ", ensembles "
                + ensembles.number(0)
                + " – "
                + ensembles.number(last))
        .add("Left edge", edge(subject, pass.pass().leftEdge()))
        .add("Right edge", edge(subject, pass.pass().rightEdge()));
    MeasurementFacts.addInstrument(facts, subject);
    return List.of(new Gap(8), facts);
  }

  private static String edge(Subject subject, Edge edge) {
    String distance = subject.with(Quantity.LENGTH, edge.distanceM(), 2);
    return Double.isNaN(edge.coefficient())
        ? distance + ", discharge as given"
        : distance + ", coefficient " + Plain.number(edge.coefficient());
  }
}
