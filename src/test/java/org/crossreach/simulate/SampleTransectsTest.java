package org.crossreach.simulate;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Measurement;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The samples are what their recipes make, byte for byte, and read back as they were made. */
class SampleTransectsTest {

  private static final Path SAMPLES = Path.of("sample-transects");

  @TempDir Path folder;

  static Stream<Path> recipes() throws IOException {
    try (Stream<Path> files = Files.list(SAMPLES)) {
      List<Path> recipes =
          files.filter(each -> each.toString().endsWith(".recipe.json")).sorted().toList();
      assertTrue(recipes.size() >= 3);
      return recipes.stream();
    }
  }

  @ParameterizedTest
  @MethodSource("recipes")
  void recipeMakesTheSample(Path file) throws Exception {
    Simulation simulation = Simulation.run(RecipeFile.read(file));
    String id = simulation.recipe().id();
    SimulationFolder.write(simulation, folder.resolve(id));
    try (Stream<Path> made = Files.list(folder.resolve(id));
        Stream<Path> kept = Files.list(SAMPLES.resolve(id))) {
      List<Path> files = made.sorted().toList();
      assertEquals(
          kept.map(each -> each.getFileName().toString()).sorted().toList(),
          files.stream().map(each -> each.getFileName().toString()).toList());
      for (Path each : files) {
        assertArrayEquals(
            Files.readAllBytes(SAMPLES.resolve(id).resolve(each.getFileName())),
            Files.readAllBytes(each),
            each + " differs from the sample");
      }
    }
  }

  @ParameterizedTest
  @MethodSource("recipes")
  void readsBackAsItWasMade(Path file) throws Exception {
    Simulation simulation = Simulation.run(RecipeFile.read(file));
    Measurement read = MeasurementFolder.read(SAMPLES.resolve(simulation.recipe().id()));
    assertEquals(simulation.measurement().instrument(), read.instrument());
    for (int p = 0; p < read.passes().size(); p++) {
      Ensembles made = simulation.measurement().passes().get(p).ensembles();
      Ensembles back = read.passes().get(p).ensembles();
      assertEquals(made.size(), back.size());
      assertEquals(made.start().toInstant(), back.start().toInstant());
      assertEquals(
          simulation.measurement().passes().get(p).startBank(), read.passes().get(p).startBank());
      CellGrid wanted = made.grid(CellQuantity.WATER_2);
      CellGrid found = back.grid(CellQuantity.WATER_2);
      for (int i = 0; i < made.size(); i++) {
        assertEquals(made.elapsedS(i), back.elapsedS(i));
        for (int k = 0; k < made.maxCells(); k++) {
          assertEquals(wanted.get(i, k), found.get(i, k));
        }
      }
    }
  }
}
