package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.discharge.PassDischarge;
import org.junit.jupiter.api.Test;

/** Stations count from the left bank whichever bank the boat started from. */
class SectionShapeTest {

  @Test
  void countsFromTheLeftBankForBothStarts() throws Exception {
    for (PassDischarge pass : River.usual().result().reduction().passes()) {
      SectionShape shape = new SectionShape(pass);
      int last = shape.size() - 1;
      boolean fromLeft = pass.pass().startBank() == org.crossreach.survey.Bank.LEFT;
      assertEquals(3.2, shape.stationM(fromLeft ? 0 : last), 1e-9);
      assertEquals(shape.widthM() - 2.1, shape.stationM(fromLeft ? last : 0), 1e-9);
    }
  }

  @Test
  void showsTheBedUnderTheStations() throws Exception {
    PassDischarge pass = new River(400, 24, 0, 1).result().reduction().passes().get(1);
    SectionShape shape = new SectionShape(pass);
    Verticals verticals = Verticals.of(shape, pass.transports(), 100);
    for (int k = 0; k < 100; k++) {
      // The boat's own track stretches the river of 84 m to its width as tracked; beams scatter 1
      // %.
      double station = verticals.stationM[k] * 84 / shape.widthM();
      assertEquals(River.depthM(station), verticals.bedM[k], 0.12, "station " + k);
      assertTrue(verticals.topM[k] < verticals.bottomM[k]);
      assertTrue(verticals.bottomM[k] < verticals.bedM[k]);
      assertTrue(verticals.sideLobeM[k] < verticals.bedM[k]);
    }
  }

  @Test
  void tellsASlopingEdgeFromAWall() throws Exception {
    SectionShape shape = new SectionShape(River.usual().result().reduction().passes().get(0));
    // The left edge slopes (area one half of depth times distance), the right one is a wall.
    assertEquals(0, shape.leftBankShare(), 1e-9);
    assertEquals(1, shape.rightBankShare(), 1e-9);
  }
}
