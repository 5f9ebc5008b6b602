package org.crossreach.archive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.settings.Settings;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The index says of any number of measurements what their manifests say. */
class IndexTest {

  @TempDir Path folder;

  @Test
  void namesEveryValueThatARowHas() throws Exception {
    IndexRows rows =
        IndexRows.of(
            Result.of(
                new Reducer(1)
                    .reduce(
                        MeasurementFolder.read(Path.of("formats/example")), Settings.defaults())));
    assertEquals(IndexRows.MEASUREMENT, List.copyOf(rows.measurement().keySet()));
    assertEquals(IndexRows.PASS, List.copyOf(rows.passes().get(0).keySet()));
  }

  /** 400 manifests of 100,000 characters are 80 MB in memory, and the machine has 24 MB. */
  @Test
  void needsNoMoreMemoryForManyMeasurements() throws Exception {
    for (int m = 0; m < 400; m++) {
      Path place = Files.createDirectories(folder.resolve("m" + m));
      Manifest manifest =
          new Manifest(
              "0",
              "m" + m,
              "json",
              "si",
              "",
              List.of(),
              List.of(),
              List.of("x".repeat(100_000)),
              Optional.empty());
      new Place(place).write(Manifest.NAME, manifest::write);
    }
    Process run =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-Xmx24m",
                "-cp",
                System.getProperty(
                    "surefire.test.class.path", System.getProperty("java.class.path")),
                "org.crossreach.cli.Crossreach",
                "archive",
                "--index-only",
                "--out",
                folder.toString())
            .redirectErrorStream(true)
            .start();
    String said = new String(run.getInputStream().readAllBytes());
    assertEquals(0, run.waitFor(), said);
    assertTrue(Files.size(folder.resolve("index.json")) > 40_000_000);
    assertEquals(401, Files.readAllLines(folder.resolve("index-measurements.csv")).size());
  }
}
