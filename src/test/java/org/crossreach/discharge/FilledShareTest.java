package org.crossreach.discharge;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;

/**
 * What rests on filled values is told by how it was filled, each ensemble once.
 *
 * <p>A boat crosses 10 m of uniform water in ten steps of 1 m, so that each ensemble but the first
 * carries 10 %.
 */
class FilledShareTest {

  private static final double EXACT = 1e-9;

  @Test
  void everythingMeasured() throws UnusableInput {
    assertEquals(0, filled(-1, -1, -1, -1).totalPct());
  }

  @Test
  void columnsBoatVelocitiesAndDepths() throws UnusableInput {
    FilledShare filled = filled(3, 5, 7, -1);
    assertEquals(10, filled.columnsPct(), EXACT);
    assertEquals(10, filled.boatVelocitiesPct(), EXACT);
    assertEquals(10, filled.depthsPct(), EXACT);
    assertEquals(0, filled.gapsPct(), EXACT);
    assertEquals(30, filled.totalPct(), EXACT);
  }

  @Test
  void eachEnsembleCountsOnce() throws UnusableInput {
    FilledShare filled = filled(4, 4, 4, 4);
    assertEquals(10, filled.columnsPct(), EXACT);
    assertEquals(10, filled.totalPct(), EXACT);
  }

  @Test
  void gapsCountByWhatFlowsThroughThem() throws UnusableInput {
    // One cell of 0.25 m in 4.75 m of uniform water, of which the laws make a power law's share.
    FilledShare filled = filled(-1, -1, -1, 6);
    assertEquals(filled.gapsPct(), filled.totalPct());
    assertEquals(10 * 0.25 / 4.75, filled.gapsPct(), 0.05);
  }

  private static FilledShare filled(int column, int boat, int depth, int gap) throws UnusableInput {
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i <= 10; i++) {
      Ensemble each =
          Ensemble.uniform(
              i,
              i == boat ? Double.NaN : i == 0 ? 0 : 1,
              0,
              i == depth ? Double.NaN : 4.5,
              /* waterEast= */ 0,
              /* waterNorth= */ 1);
      for (int k = 0; k < each.waterNorth().length; k++) {
        if (i == column || i == gap && k == 6) {
          each.waterNorth()[k] = Double.NaN;
        }
      }
      all.add(each);
    }
    return Crossing.reduce(
            Ensemble.record(all),
            Bank.LEFT,
            Crossing.edge(1, 0.35),
            Crossing.edge(1, 0.35),
            Settings.defaults().withScreening(Screening.off()))
        .geometry()
        .filled();
  }
}
