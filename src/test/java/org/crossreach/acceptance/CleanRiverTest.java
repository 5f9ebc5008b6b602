package org.crossreach.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.screen.Accounting;
import org.crossreach.screen.Reason;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.simulate.Simulation;
import org.crossreach.survey.Measurement;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The default screens do no harm to rivers without faults, however rough they are. */
class CleanRiverTest {

  /** Banks of 1:1.5 on which velocity falls to nothing within a few metres. */
  private static final String STEEP_BANKS =
      """
      "bed": [{"station_m": 0, "depth_m": 0}, {"station_m": 6, "depth_m": 4},
              {"station_m": 70, "depth_m": 5}, {"station_m": 80, "depth_m": 0}],
      "velocity": [{"station_m": 0, "mean_mps": 0.1}, {"station_m": 6, "mean_mps": 1},
                   {"station_m": 70, "mean_mps": 1.2}, {"station_m": 80, "mean_mps": 0.1}],
      "left_bank": {"shape": "sloping", "width_m": 4},
      "right_bank": {"shape": "sloping", "width_m": 2}""";

  /** A step of 3 m, a notch 8 m deep with a wall on one side, and water that flows both ways. */
  private static final String STEPS_AND_TWO_WAYS =
      """
      "bed": [{"station_m": 0, "depth_m": 2}, {"station_m": 20, "depth_m": 2},
              {"station_m": 20, "depth_m": 5}, {"station_m": 40, "depth_m": 5},
              {"station_m": 60, "depth_m": 8}, {"station_m": 61, "depth_m": 3},
              {"station_m": 90, "depth_m": 2}],
      "velocity": [{"station_m": 0, "mean_mps": 0.6}, {"station_m": 30, "mean_mps": 1.2},
                   {"station_m": 60, "mean_mps": 0.9}, {"station_m": 90, "mean_mps": -0.5}],
      "left_bank": {"shape": "wall", "width_m": 4},
      "right_bank": {"shape": "wall", "width_m": 2}""";

  private static final List<String> LAWS =
      List.of("{\"law\": \"power\"}", "{\"law\": \"logarithmic\", \"roughness_m\": 0.01}");

  /** Without noise and faults no sample is rejected, whatever the law. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "{\"law\": \"power\"}",
        "{\"law\": \"power\", \"exponent\": 0.33}",
        "{\"law\": \"logarithmic\", \"roughness_m\": 0.02}",
        "{\"law\": \"wind-above\", \"share\": 0.6}",
        "{\"law\": \"rough-below\", \"share\": 0.3}"
      })
  void losesNothingUnderAnyLaw(String vertical) throws Exception {
    assertNothingLost(new Rivers().vertical(vertical).wobble(4).skew(20));
    assertNothingLost(new Rivers().vertical(vertical).canal().wobble(1));
  }

  @Test
  void losesNothingOnSteepBanks() throws Exception {
    for (String law : LAWS) {
      assertNothingLost(new Rivers().channel(STEEP_BANKS).vertical(law).wobble(2));
    }
  }

  private static void assertNothingLost(Rivers rivers) throws Exception {
    for (PassDischarge pass : reduce(rivers, Screening.defaults())) {
      Accounting accounting = pass.section().pass().accounting();
      assertEquals(0, accounting.bottomTrack().rejected());
      assertEquals(0, accounting.depths().rejected());
      assertEquals(0, accounting.depthBeamsLeftOut());
      assertEquals(accounting.cells().of(Reason.SIDE_LOBE), accounting.cells().rejected());
    }
  }

  /**
   * At a step, or with an ensemble every metre, a few cells look like spikes; it does not matter.
   */
  @ParameterizedTest
  @CsvSource({"80", "150", "300", "600"})
  void keepsTheDischargeOfCoarsePassesAndOverSteps(int ensembles) throws Exception {
    for (String channel : List.of(STEEP_BANKS, STEPS_AND_TWO_WAYS)) {
      for (String law : LAWS) {
        Rivers rivers = new Rivers().channel(channel).vertical(law).ensembles(ensembles);
        List<PassDischarge> screened = reduce(rivers, Screening.defaults());
        List<PassDischarge> unscreened = reduce(rivers, Screening.off());
        for (int p = 0; p < screened.size(); p++) {
          double total = unscreened.get(p).totalM3s();
          assertEquals(total, screened.get(p).totalM3s(), 0.0005 * total, channel + law);
        }
      }
    }
  }

  private static List<PassDischarge> reduce(Rivers rivers, Screening screening) throws Exception {
    Measurement measurement = Simulation.run(rivers.recipe()).measurement();
    return new Reducer(1)
        .reduce(measurement, Settings.defaults().withScreening(screening))
        .passes();
  }
}
