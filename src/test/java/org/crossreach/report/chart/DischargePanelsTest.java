package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.profile.Zone;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What flows through the panels is what flows between the edges, zone by zone, for any count. */
class DischargePanelsTest {

  @ParameterizedTest
  @ValueSource(ints = {1, 7, 40, 1000})
  void addsUpToTheZones(int count) throws Exception {
    for (PassDischarge pass : River.usual().result().reduction().passes()) {
      DischargePanels panels = new DischargePanels(pass, new SectionShape(pass), count);
      // Sums of some hundred doubles.
      double tolerance = 1e-10 * pass.totalM3s();
      assertEquals(pass.zones().top(), sum(panels, Zone.TOP), tolerance);
      assertEquals(pass.zones().measured(), sum(panels, Zone.MEASURED), tolerance);
      assertEquals(pass.zones().bottom(), sum(panels, Zone.BOTTOM), tolerance);
    }
  }

  private static double sum(DischargePanels panels, Zone zone) {
    double sum = 0;
    for (int k = 0; k < panels.count(); k++) {
      sum += panels.perWidth(zone, k) * panels.widthM();
    }
    return sum;
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.1, 0.5, 0.9})
  void findsSharesInTheRightOrder(double share) throws Exception {
    PassDischarge pass = new River(200, 24, 0, 1).result().reduction().passes().get(0);
    SectionShape shape = new SectionShape(pass);
    CumulativeDischarge cumulative =
        new CumulativeDischarge(
            new DischargePanels(pass, shape, 40),
            shape.widthM(),
            pass.zones().leftEdge(),
            pass.zones().rightEdge());
    double place = cumulative.stationM(share);
    assertTrue(place > 0 && place < shape.widthM());
    assertTrue(cumulative.stationM(share / 2) < place);
    // The sum over the ensembles up to the place, to the discharge of one panel.
    double sum = pass.zones().leftEdge();
    for (int i = 0; i < shape.size() && shape.stationM(i) <= place; i++) {
      sum += pass.columns().total(i);
    }
    assertEquals(share, sum / pass.totalM3s(), 0.03);
  }
}
