package org.crossreach.screen;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.crossreach.ingest.EnsembleCsv;
import org.crossreach.ingest.EnsembleFile;
import org.crossreach.settings.Settings;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.simulate.Simulation;
import org.crossreach.simulate.SimulationFolder;
import org.crossreach.survey.UnusableInput;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Screening one pass of 20,000 ensembles of 60 cells with everything on, frames included, against
 * reading it.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@State(Scope.Benchmark)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 2)
@Fork(
    value = 3,
    jvmArgs = {"-Xmx2g"})
public class ScreeningBenchmark {

  private static final String RECIPE =
      """
      {"format": "crossreach-recipe/1", "id": "bench", "decimals": 3,
       "river": {"bed": [{"station_m": 0, "depth_m": 14}, {"station_m": 900, "depth_m": 16}],
                 "velocity": [{"station_m": 0, "mean_mps": 1}, {"station_m": 900, "mean_mps": 1}]},
       "boat": {"ensembles": 20000, "left_edge_m": 4, "right_edge_m": 4},
       "passes": {"count": 1},
       "profiler": {"blank_m": 0.25, "cell_m": 0.25, "cells": 60,
                    "quality_columns": %s, "frame": "%s"},
       "noise": {"water_mps": 0.1, "boat_mps": 0.015, "depth_share": 0.01},
       "faults": {"spikes": 0.02, "lost_boat": 0.05},
       "measurement": {"instrument": {"beam_angle_deg": 20, "draft_m": 0.25,
                                      "beam_azimuths_deg": [45, 135, 225, 315]}}}
      """;

  /** Axes of the record, and whether it has correlation, intensity and good pings. */
  @Param({"earth", "earth with quality", "beam", "beam with quality"})
  public String record;

  private Path folder;
  private Path file;
  private Screen screen;
  private EnsembleFile read;

  @Setup
  public void make() throws IOException, UnusableInput {
    List<String> words = List.of(record.split(" ", 2));
    String recipe = RECIPE.formatted(words.size() > 1, words.get(0));
    Simulation simulation = Simulation.run(RecipeFile.parse(recipe, "bench.recipe.json"));
    folder = Files.createTempDirectory("screening");
    SimulationFolder.write(simulation, folder.resolve("bench"));
    file = folder.resolve("bench").resolve("pass-01.csv");
    screen =
        new Screen(
            simulation.measurement().instrument(),
            simulation.measurement().water(),
            Settings.defaults());
    read = baseline();
  }

  @TearDown
  public void delete() throws IOException {
    try (Stream<Path> files = Files.walk(folder)) {
      for (Path each : files.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(each);
      }
    }
  }

  /** Reading the file. */
  @Benchmark
  public EnsembleFile baseline() throws IOException, UnusableInput {
    return EnsembleCsv.read(file, "pass-01.csv");
  }

  @Benchmark
  public ScreenedPass screening() {
    return screen.apply("pass-01", read.ensembles());
  }
}
