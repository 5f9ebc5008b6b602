package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The schemas of recipes and of the truth are what the reader takes and the writer writes. */
class RecipeSchemaTest {

  private static final Agreement AGREEMENT =
      new Agreement(
          List.of("a river that can be", "stations that do not decrease", "a date and time"));

  static List<Path> recipes() throws IOException {
    try (Stream<Path> files = Files.list(Format.SAMPLES)) {
      return files.filter(each -> each.toString().endsWith(".recipe.json")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("recipes")
  void everySampleKeepsTheSchemas(Path recipe) {
    assertEquals(List.of(), Format.errors("recipe.schema.json", Format.json(Format.text(recipe))));
    String id = recipe.getFileName().toString().replace(".recipe.json", "");
    Path truth = Format.SAMPLES.resolve(id).resolve("truth.json");
    assertEquals(List.of(), Format.errors("truth.schema.json", Format.json(Format.text(truth))));
  }

  private static List<Problem> problems(String json) {
    try {
      RecipeFile.parse(json, "recipe.json");
      return List.of();
    } catch (UnusableInput unusable) {
      return unusable.problems();
    }
  }

  /** A recipe with every key, by the law of the vertical. */
  private static ObjectNode full(String vertical) {
    return (ObjectNode)
        Format.json(
            """
            {"format": "crossreach-recipe/1", "id": "full", "seed": 2, "decimals": 4,
             "river": {"section_azimuth_deg": 80,
              "bed": [{"station_m": 0, "depth_m": 0}, {"station_m": 60, "depth_m": 4}],
              "velocity": [{"station_m": 0, "mean_mps": 0.5}, {"station_m": 60, "mean_mps": 0.9}],
              "right_bank": {"shape": "wall", "width_m": 4, "coefficient": 0.9},
              "vertical": %s, "skew_deg": 3,
              "factor": {"start": 1, "per_hour": 0.1, "amplitude": 0.2, "period_s": 900,
               "phase_deg": 10}},
             "boat": {"ensemble_s": 1, "ensembles": 30, "hold_ensembles": 3, "speed_change": 0.1,
              "wobble_m": 0.5, "wobbles": 2, "left_edge_m": 3, "right_edge_m": 3},
             "passes": {"count": 2, "first_bank": "left", "start": "2031-04-18T09:30:00Z",
              "pause_s": 60},
             "attitude": {"heading_deg": 20, "heading_swing_deg": 5, "pitch_deg": 1, "roll_deg": 1,
              "period_s": 5},
             "profiler": {"frame": "earth", "blank_m": 0.2, "cell_m": 0.25, "cells": 20,
              "sound_speed_mps": 1480, "temperature_degc": 12, "vertical_beam": true,
              "quality_columns": false},
             "noise": {"water_mps": 0.1, "boat_mps": 0.01, "depth_share": 0.01,
              "turbulence_share": 0.05, "turbulence_s": 8},
             "faults": {"lost_boat": 0.01, "boat_jumps": 0.01, "lost_columns": 0.01, "weeds": 0.01,
              "bubbles": 0.01, "depth_spikes": 0.01, "lost_cells": 0.01, "spikes": 0.01,
              "spike_mps": 1, "side_lobes": true, "bad_beam": 0},
             "measurement": {"site": {"name": "Somewhere"}, "instrument": {"serial": "v",
              "frequency_khz": 600, "beam_angle_deg": 20, "draft_m": 0.3,
              "beam_azimuths_deg": [45, 135, 225, 315], "sound_speed_used_mps": 1490,
              "declination_deg": 1, "heading_offset_deg": 0.5}},
             "settings": {"top": "constant"}}
            """
                .formatted(vertical));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "{\"law\": \"power\", \"exponent\": 0.2, \"share\": 0.6}",
        "{\"law\": \"logarithmic\", \"roughness_m\": 0.01}",
        "{\"law\": \"wind-above\", \"surface_factor\": 0.7}",
        "{\"law\": \"rough-below\", \"bed_exponent\": 0.4}"
      })
  void theSchemaOfRecipesIsTheReader(String vertical) {
    AGREEMENT.check("recipe.schema.json", full(vertical), RecipeSchemaTest::problems);
  }

  @Test
  void thePageNamesEveryKey() {
    String page = Format.text("recipe.md");
    for (String schema : List.of("recipe.schema.json", "truth.schema.json")) {
      assertTrue(page.contains(schema), "no word on " + schema);
      for (String key : Format.keys(schema)) {
        assertTrue(page.contains(key), "no word on " + key);
      }
    }
  }
}
