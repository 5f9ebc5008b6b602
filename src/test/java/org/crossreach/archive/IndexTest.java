package org.crossreach.archive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
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

  /** A run that has its turn late sees what was kept while it waited. */
  @Test
  void waitsForTheRunThatIsMakingTheIndexAndThenSeesAll() throws Exception {
    keep("m1", "");
    ExecutorService other = Executors.newSingleThreadExecutor();
    try {
      Future<?> waiting;
      IndexTurn turn = IndexTurn.await(folder);
      try {
        waiting =
            other.submit(
                () -> {
                  Index.write(folder);
                  return null;
                });
        assertThrows(TimeoutException.class, () -> waiting.get(300, TimeUnit.MILLISECONDS));
        assertFalse(Files.exists(folder.resolve("index.json")));
        keep("m2", "");
      } finally {
        turn.end();
      }
      waiting.get();
    } finally {
      other.shutdownNow();
    }
    assertEquals(3, Files.readAllLines(folder.resolve("index-measurements.csv")).size());
    assertFalse(Files.exists(folder.resolve(IndexTurn.NAME)));
  }

  /** The same between processes: the other one holds the lock of a file that it then removes. */
  @Test
  void waitsForAnotherProcess() throws Exception {
    keep("m1", "");
    Process run;
    IndexTurn turn = IndexTurn.await(folder);
    try {
      run = indexing("-Xmx64m");
      assertFalse(run.waitFor(2, TimeUnit.SECONDS), "it did not wait");
      assertFalse(Files.exists(folder.resolve("index.json")));
      keep("m2", "");
    } finally {
      turn.end();
    }
    String said = new String(run.getInputStream().readAllBytes());
    assertEquals(0, run.waitFor(), said);
    assertEquals(3, Files.readAllLines(folder.resolve("index-measurements.csv")).size());
    assertFalse(Files.exists(folder.resolve(IndexTurn.NAME)));
  }

  private void keep(String name, String problem) throws Exception {
    Path place = Files.createDirectories(folder.resolve(name));
    Manifest manifest =
        new Manifest(
            "0", name, "json", "si", "", List.of(), List.of(), List.of(problem), Optional.empty());
    new Place(place).write(Manifest.NAME, manifest::write);
  }

  private Process indexing(String memory) throws Exception {
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            memory,
            "-cp",
            System.getProperty("surefire.test.class.path", System.getProperty("java.class.path")),
            "org.crossreach.cli.Crossreach",
            "archive",
            "--index-only",
            "--out",
            folder.toString())
        .redirectErrorStream(true)
        .start();
  }

  /** 400 manifests of 100,000 characters are 80 MB in memory, and the machine has 24 MB. */
  @Test
  void needsNoMoreMemoryForManyMeasurements() throws Exception {
    for (int m = 0; m < 400; m++) {
      keep("m" + m, "x".repeat(100_000));
    }
    Process run = indexing("-Xmx24m");
    String said = new String(run.getInputStream().readAllBytes());
    assertEquals(0, run.waitFor(), said);
    assertTrue(Files.size(folder.resolve("index.json")) > 40_000_000);
    assertEquals(401, Files.readAllLines(folder.resolve("index-measurements.csv")).size());
  }
}
