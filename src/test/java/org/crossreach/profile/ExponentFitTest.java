package org.crossreach.profile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.crossreach.discharge.Reducer;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.simulate.Simulation;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The exponent of a power law is found without bias, its interval means what it says. */
class ExponentFitTest {

  private static final String NOISE =
      "{\"water_mps\": 0.15, \"boat_mps\": 0.015, \"depth_share\": 0.01,"
          + " \"turbulence_share\": 0.05, \"turbulence_s\": 9}";

  @ParameterizedTest
  @ValueSource(doubles = {3, 4, 5, 6, 7, 8, 10})
  void recoversExponentsWithoutNoise(double inverse) throws Exception {
    ExponentFit fit = fit(power(1 / inverse, "{}"));
    assertEquals(1 / inverse, fit.value(), 2e-5, "velocities and depths are rounded to 1e-6");
    assertTrue(fit.refusal().isEmpty());
  }

  @ParameterizedTest
  @ValueSource(doubles = {4, 9})
  void findsThemInNoise(double inverse) throws Exception {
    double error = 0;
    for (int seed = 0; seed < 10; seed++) {
      error += (fit(power(1 / inverse, NOISE).withSeed(seed)).value() - 1 / inverse) / 10;
    }
    assertEquals(0, error, 0.004, "four standard errors of the mean of ten");
  }

  @Test
  void outliersHardlyMoveIt() throws Exception {
    Recipe spiked =
        recipe(
            "{\"law\": \"power\", \"exponent\": 0.2}",
            NOISE,
            "{\"spikes\": 0.03, \"spike_mps\": 2}",
            1);
    assertEquals(0.2, fit(spiked).value(), 0.012);
  }

  /** Mean error over 200 seeds within 0.003; 95 % intervals of 400 cover in 93 to 97 %. */
  @ParameterizedTest
  @ValueSource(doubles = {4, 6, 9})
  @Tag("study")
  void intervalCoversTheTruth(double inverse) throws Exception {
    double truth = 1 / inverse;
    double error = 0;
    int covered = 0;
    for (int seed = 0; seed < 400; seed++) {
      ExponentFit fit = fit(power(truth, NOISE).withSeed(seed));
      error += seed < 200 ? (fit.value() - truth) / 200 : 0;
      covered += fit.low95() <= truth && truth <= fit.high95() ? 1 : 0;
    }
    assertEquals(0, error, 0.003);
    assertEquals(95, covered / 4.0, 2);
  }

  @Test
  void refusesWhenTheFlowTurnsInTheVertical() throws Exception {
    ExponentFit fit =
        fit(
            recipe(
                "{\"law\": \"wind-above\", \"exponent\": 0.2, \"share\": 0.3,"
                    + " \"surface_factor\": -1.2}",
                "{}",
                "{}",
                1));
    assertTrue(fit.refusal().orElse("").contains("turns within the vertical"), fit.toString());
  }

  @Test
  void refusesWhenNoiseDrownsTheProfile() throws Exception {
    ExponentFit fit = fit(recipe(POWER, "{\"water_mps\": 3}", "{}", 1));
    assertTrue(fit.refusal().isPresent(), fit.toString());
  }

  @Test
  void refusesFewCells() throws Exception {
    ExponentFit fit = fit(recipe(POWER, "{}", "{\"lost_cells\": 0.97}", 1));
    assertTrue(fit.refusal().orElse("").contains("columns with at least 4 usable cells"));
  }

  /**
   * Validation: NIST Statistical Reference Datasets, nonlinear regression, DanWood, {@code y = b1
   * x^b2}: certified b2 = 3.8604055871, b1 = 0.76886226176. The amplitude is linear for a given
   * exponent, as in the columns; accuracy is that of the search, a few 1e-7.
   */
  @Test
  void findsTheCertifiedExponentOfDanWood() {
    double[] y = {2.138, 3.421, 3.597, 4.340, 4.882, 5.660};
    double[] x = {1.309, 1.471, 1.490, 1.565, 1.611, 1.680};
    double exponent =
        ExponentSearch.top(b -> product(x, y, b) * product(x, y, b) / square(x, b), 1, 8);
    assertEquals(3.8604055871, exponent, 1e-6);
    assertEquals(0.76886226176, product(x, y, exponent) / square(x, exponent), 1e-6);
  }

  private static double product(double[] x, double[] y, double b) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += y[i] * Math.pow(x[i], b);
    }
    return sum;
  }

  private static double square(double[] x, double b) {
    double sum = 0;
    for (double each : x) {
      sum += Math.pow(each, 2 * b);
    }
    return sum;
  }

  private static final String POWER = "{\"law\": \"power\", \"exponent\": 0.2}";

  private static Recipe power(double exponent, String noise) throws Exception {
    return recipe("{\"law\": \"power\", \"exponent\": " + exponent + "}", noise, "{}", 1);
  }

  private static ExponentFit fit(Recipe recipe) throws Exception {
    Settings settings = Settings.defaults().withScreening(Screening.off());
    List<ColumnFit> columns =
        new Reducer(1)
            .lay(Simulation.run(recipe).measurement(), settings).passes().stream()
                .map(each -> ColumnFit.of(each.section()))
                .toList();
    return ExponentFit.of(columns);
  }

  static Recipe recipe(String vertical, String noise, String faults, int passes) throws Exception {
    return RecipeFile.parse(
        """
        {"format": "crossreach-recipe/1", "id": "virtual", "seed": 1, "decimals": 6,
         "river": {"section_azimuth_deg": 62,
          "bed": [{"station_m": 0, "depth_m": 0}, {"station_m": 12, "depth_m": 3},
                  {"station_m": 45, "depth_m": 5}, {"station_m": 80, "depth_m": 3.5},
                  {"station_m": 92, "depth_m": 2.5}],
          "velocity": [{"station_m": 0, "mean_mps": 0.8}, {"station_m": 12, "mean_mps": 0.8},
                       {"station_m": 50, "mean_mps": 1.3}, {"station_m": 92, "mean_mps": 1.0}],
          "left_bank": {"shape": "sloping", "width_m": 12},
          "right_bank": {"shape": "wall", "width_m": 6},
          "vertical": %s, "skew_deg": 5},
         "boat": {"ensemble_s": 1, "ensembles": 500, "hold_ensembles": 12, "wobble_m": 1,
                  "left_edge_m": 4, "right_edge_m": 2},
         "passes": {"count": %d}, "profiler": {"blank_m": 0.25, "cell_m": 0.25, "cells": 20},
         "noise": %s, "faults": %s,
         "measurement": {"instrument": {"beam_angle_deg": 20, "draft_m": 0.25}}}
        """
            .formatted(vertical, passes, noise, faults),
        "virtual.recipe.json");
  }
}
