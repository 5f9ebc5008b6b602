package org.crossreach.acceptance;

import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.survey.UnusableInput;

/** Virtual rivers for whole-way tests, written as recipes with some members replaced. */
public final class Rivers {

  private static final String RECIPE =
      """
      {"format": "crossreach-recipe/1", "id": "virtual", "seed": 1, "decimals": 9,
       "river": {"section_azimuth_deg": 62,
        %CHANNEL%,
        "vertical": %VERTICAL%, "skew_deg": %SKEW%},
       "boat": {"ensemble_s": 1, "ensembles": %ENSEMBLES%, "hold_ensembles": 12, "speed_change": 0.2,
                "wobble_m": %WOBBLE%, "wobbles": 2.5, "left_edge_m": 4, "right_edge_m": 2},
       "attitude": {"heading_deg": 200, "heading_swing_deg": 10, %TILT%},
       "passes": {"count": %PASSES%, "first_bank": "left"},
       "profiler": {"blank_m": 0.25, "cell_m": 0.25, "cells": 20%PROFILER%},
       "noise": %NOISE%, "faults": %FAULTS%,
       "measurement": {"instrument": {"beam_angle_deg": 20, "draft_m": %DRAFT%%INSTRUMENT%,
                                      "declination_deg": -3, "heading_offset_deg": 1.5}}}
      """;

  private static final String NATURAL_CHANNEL =
      """
      "bed": [{"station_m": 0, "depth_m": 0}, {"station_m": 12, "depth_m": 3},
              {"station_m": 45, "depth_m": 5}, {"station_m": 80, "depth_m": 3.5},
              {"station_m": 92, "depth_m": 2.5}],
      "velocity": [{"station_m": 0, "mean_mps": 0.8}, {"station_m": 12, "mean_mps": 0.8},
                   {"station_m": 50, "mean_mps": 1.3}, {"station_m": 92, "mean_mps": 1.0}],
      "left_bank": {"shape": "sloping", "width_m": 12},
      "right_bank": {"shape": "wall", "width_m": 6}""";

  private static final String CANAL =
      """
      "bed": [{"station_m": 0, "depth_m": 5}, {"station_m": 100, "depth_m": 5}],
      "velocity": [{"station_m": 0, "mean_mps": 1}, {"station_m": 100, "mean_mps": 1}],
      "left_bank": {"shape": "wall", "width_m": 5},
      "right_bank": {"shape": "wall", "width_m": 5}""";

  private String channel = NATURAL_CHANNEL;
  private String vertical = "{\"law\": \"power\", \"exponent\": 0.16666666666666667}";
  private double skewDeg;
  private double wobbleM;
  private int passes = 2;
  private int ensembles = 600;
  private String noise = "{}";
  private String faults = "{}";
  private String tilt = "\"pitch_deg\": 0, \"roll_deg\": 0";
  private String profiler = "";
  private String instrument = "";
  private double draftM = 0.25;

  public Rivers vertical(String json) {
    vertical = json;
    return this;
  }

  /** A canal of 100 m by 5 m with vertical walls, in place of the natural channel. */
  public Rivers canal() {
    channel = CANAL;
    return this;
  }

  /** Another channel: bed, velocity and banks as members of a recipe's river. */
  Rivers channel(String members) {
    channel = members;
    return this;
  }

  /** Number of ensembles while the boat moves. */
  Rivers ensembles(int count) {
    ensembles = count;
    return this;
  }

  public Rivers skew(double deg) {
    skewDeg = deg;
    return this;
  }

  public Rivers wobble(double metres) {
    wobbleM = metres;
    return this;
  }

  public Rivers passes(int count) {
    passes = count;
    return this;
  }

  public Rivers noise(String json) {
    noise = json;
    return this;
  }

  public Rivers faults(String json) {
    faults = json;
    return this;
  }

  /** Largest pitch and roll of the swaying boat (deg). */
  Rivers tilt(double pitchDeg, double rollDeg) {
    tilt = "\"pitch_deg\": " + pitchDeg + ", \"roll_deg\": " + rollDeg;
    return this;
  }

  /** Axes of the recorded velocities; beams point 40, 130, 220 and 310 degrees from forward. */
  Rivers frame(String name) {
    profiler += ", \"quality_columns\": true, \"frame\": \"" + name + '"';
    instrument += ", \"beam_azimuths_deg\": [40, 130, 220, 310]";
    return this;
  }

  /** A record made with one speed of sound in water that has another (m/s). */
  Rivers soundSpeed(double usedMps, double trueMps, double temperatureDegC) {
    profiler += ", \"sound_speed_mps\": " + trueMps + ", \"temperature_degc\": " + temperatureDegC;
    instrument += ", \"sound_speed_used_mps\": " + usedMps;
    return this;
  }

  Rivers draft(double metres) {
    draftM = metres;
    return this;
  }

  public Recipe recipe() throws UnusableInput {
    return RecipeFile.parse(
        RECIPE
            .replace("%CHANNEL%", channel)
            .replace("%VERTICAL%", vertical)
            .replace("%SKEW%", Double.toString(skewDeg))
            .replace("%WOBBLE%", Double.toString(wobbleM))
            .replace("%ENSEMBLES%", Integer.toString(ensembles))
            .replace("%PASSES%", Integer.toString(passes))
            .replace("%NOISE%", noise)
            .replace("%FAULTS%", faults)
            .replace("%TILT%", tilt)
            .replace("%PROFILER%", profiler)
            .replace("%INSTRUMENT%", instrument)
            .replace("%DRAFT%", Double.toString(draftM)),
        "virtual.recipe.json");
  }
}
