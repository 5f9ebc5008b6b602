package org.crossreach.archive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Base64;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A run that is killed at any moment is taken up by the next one, and in the end the archive is the
 * same, byte for byte, as if nothing had happened.
 */
class KilledRunTest {

  @TempDir Path folder;

  @Test
  void goesOnAfterAFewKills() throws Exception {
    killAndResume(12, 5);
  }

  @Test
  @Tag("study")
  void goesOnAfterAHundredKills() throws Exception {
    killAndResume(200, 100);
  }

  private void killAndResume(int measurements, int kills) throws Exception {
    Path tree = folder.resolve("tree");
    for (int m = 0; m < measurements; m++) {
      Path copy = tree.resolve("m" + m);
      Files.createDirectories(copy);
      try (Stream<Path> files = Files.list(Path.of("formats/example"))) {
        for (Path each : files.toList()) {
          Files.copy(each, copy.resolve(each.getFileName()));
        }
      }
    }
    Path undisturbed = folder.resolve("undisturbed");
    long start = System.nanoTime();
    assertEquals(0, start(tree, undisturbed).waitFor());
    long whole = TimeUnit.NANOSECONDS.toMillis(System.nanoTime() - start);
    Path disturbed = folder.resolve("disturbed");
    Random random = new Random(418);
    for (int k = 0; k < kills; k++) {
      Process run = start(tree, disturbed);
      // Early enough to leave work for the next kill, late enough to have begun.
      long patience = 150 + random.nextInt((int) Math.max(1, whole - 150));
      if (!run.waitFor(
          Math.min(patience, 150 + 4 * whole / kills + random.nextInt(200)),
          TimeUnit.MILLISECONDS)) {
        run.destroyForcibly();
        run.waitFor();
      }
      assertNothingHalfWritten(undisturbed, disturbed);
    }
    assertEquals(0, start(tree, disturbed).waitFor());
    assertTrue(bytes(undisturbed).equals(bytes(disturbed)), "the archives differ");
  }

  /** Every file under a final name is complete; only the index may not be there yet. */
  private static void assertNothingHalfWritten(Path whole, Path now) throws IOException {
    if (!Files.exists(now)) {
      return;
    }
    try (Stream<Path> files = Files.walk(now)) {
      for (Path each : files.filter(Files::isRegularFile).toList()) {
        String name = each.getFileName().toString();
        if (!name.startsWith(".") && !name.startsWith("index")) {
          Path twin = whole.resolve(now.relativize(each).toString());
          assertTrue(Arrays.equals(Files.readAllBytes(twin), Files.readAllBytes(each)), name);
        }
      }
    }
  }

  private static Process start(Path tree, Path target) throws IOException {
    String classes =
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-XX:+UseSerialGC",
            "-cp",
            classes,
            "org.crossreach.cli.Crossreach",
            "archive",
            tree.toString(),
            "--out",
            target.toString(),
            "--write",
            "json,csv",
            "--quiet")
        .redirectErrorStream(true)
        .redirectOutput(ProcessBuilder.Redirect.DISCARD)
        .start();
  }

  private static Map<String, String> bytes(Path root) throws IOException {
    Map<String, String> all = new TreeMap<>();
    try (Stream<Path> files = Files.walk(root)) {
      for (Path each : files.filter(Files::isRegularFile).toList()) {
        all.put(
            root.relativize(each).toString(),
            Base64.getEncoder().encodeToString(Files.readAllBytes(each)));
      }
    }
    return all;
  }
}
