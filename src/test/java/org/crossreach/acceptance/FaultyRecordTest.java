package org.crossreach.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.BitSet;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.screen.Reason;
import org.crossreach.screen.ScreenedPass;
import org.crossreach.settings.Settings;
import org.crossreach.simulate.Fault;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.Simulation;
import org.junit.jupiter.api.Test;

/**
 * Lost columns, spikes, lost bottom track and worse hardly move the discharge, and what is rejected
 * is what was spoilt.
 */
class FaultyRecordTest {

  private static final String NOISE =
      "{\"water_mps\": 0.1, \"boat_mps\": 0.015, \"depth_share\": 0.01}";

  /** 10 % lost columns, 5 % spikes of ten standard deviations, 10 % lost bottom track. */
  private static final String LOST_AND_SPIKED =
      "{\"lost_columns\": 0.1, \"spikes\": 0.05, \"spike_mps\": 1.0, \"lost_boat\": 0.1}";

  private static final String EVERYTHING =
      "{\"lost_boat\": 0.05, \"boat_jumps\": 0.01, \"lost_columns\": 0.05, \"lost_cells\": 0.03,"
          + " \"spikes\": 0.03, \"spike_mps\": 2.0, \"weeds\": 0.03, \"bubbles\": 0.03,"
          + " \"depth_spikes\": 0.03, \"side_lobes\": true}";

  private record Study(double meanErrorPct, double largestErrorPct) {}

  @Test
  void lostColumnsSpikesAndLostBottomTrackHardlyMatter() throws Exception {
    Study study = study(LOST_AND_SPIKED, 100);
    assertEquals(0, study.meanErrorPct, 0.5, study.toString());
    assertTrue(study.largestErrorPct < 2, study.toString());
  }

  @Test
  void everythingTogetherHardlyMatters() throws Exception {
    Study study = study(EVERYTHING, 30);
    assertEquals(0, study.meanErrorPct, 0.5, study.toString());
    assertTrue(study.largestErrorPct < 2, study.toString());
  }

  private static Study study(String faults, int seeds) throws Exception {
    Recipe recipe = new Rivers().wobble(2).frame("earth").noise(NOISE).faults(faults).recipe();
    double sum = 0;
    double largest = 0;
    int count = 0;
    for (int seed = 0; seed < seeds; seed++) {
      Simulation simulation = Simulation.run(recipe.withSeed(seed));
      double exact = simulation.truth().dischargeM3s();
      for (PassDischarge pass :
          new Reducer(1).reduce(simulation.measurement(), Settings.defaults()).passes()) {
        double error = 100 * (pass.totalM3s() / exact - 1);
        sum += error;
        largest = Math.max(largest, Math.abs(error));
        count++;
      }
    }
    return new Study(sum / count, largest);
  }

  @Test
  void rejectsTheSpikesAndSparesTheRest() throws Exception {
    long struck = 0;
    long caught = 0;
    long good = 0;
    long lost = 0;
    for (int seed = 0; seed < 10; seed++) {
      Simulation simulation =
          Simulation.run(
              new Rivers()
                  .wobble(2)
                  .frame("earth")
                  .noise(NOISE)
                  .faults("{\"spikes\": 0.05, \"spike_mps\": 1.0}")
                  .recipe()
                  .withSeed(seed));
      PassDischarge reduced =
          new Reducer(1).reduce(simulation.measurement(), Settings.defaults()).passes().get(0);
      ScreenedPass pass = reduced.section().pass();
      BitSet spikes = simulation.truth().passes().get(0).struck().get(Fault.SPIKE);
      for (int i = 0; i < pass.size(); i++) {
        for (int k = 0; k < pass.maxCells(); k++) {
          Reason reason = pass.reason(i, k);
          if (reason == Reason.SIDE_LOBE || reason == Reason.MISSING) {
            continue;
          }
          boolean spiked = spikes.get(i * pass.maxCells() + k);
          struck += spiked ? 1 : 0;
          caught += spiked && reason != Reason.NONE ? 1 : 0;
          good += spiked ? 0 : 1;
          lost += !spiked && reason != Reason.NONE ? 1 : 0;
        }
      }
    }
    assertTrue(100.0 * caught / struck >= 99, caught + " of " + struck);
    assertTrue(100.0 * lost / good < 0.5, lost + " of " + good);
  }
}
