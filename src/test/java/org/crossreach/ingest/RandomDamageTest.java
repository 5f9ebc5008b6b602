package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Random;
import java.util.Set;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Whatever bytes stand in a file, the outcome is a result or a list of problems; never another
 * exception. Seeds are fixed, so that a failure comes again.
 */
class RandomDamageTest {

  private static final String SETTINGS =
      """
      {"format": "crossreach-settings/1", "method": "path-flux",
       "section": {"line": {"azimuth_deg": 123.0}}, "depth": {"source": "vertical"},
       "top": "constant", "exponent": {"rule": "fixed", "value": 0.2}, "edge_ensembles": 5,
       "screening": {"error_velocity_mps": "off", "spikes_mps": 0.5, "three_beam": false,
         "exclusions": [{"pass": "pass-01", "from_ensemble": 1, "to_ensemble": 2, "reason": "x"}]},
       "sound_speed": {"formula": "auto"}, "uncertainty": {}}
      """;

  /** Pieces that mean something to a parser. */
  private static final String[] PIECES = {
    ",",
    "\n",
    "\r",
    "\r\n",
    "\"",
    "\"\"",
    "\u0000",
    "-",
    ".",
    "e",
    "1e999",
    "NaN",
    "NA",
    "\t",
    " ",
    "\ufeff",
    "\ud83d\ude00",
    "{",
    "}",
    "[",
    "]",
    ":",
    "null",
    "true",
    "\\u0000",
    "\\ud800",
    "\\",
    "east_mps_1",
    "time",
    "-32768",
    "9999999999999999999999",
    "/*",
    "#",
    "\u001f\u008b",
    "../"
  };

  @TempDir Path folder;

  private static byte[] damaged(byte[] valid, Random random) {
    byte[] bytes = valid.clone();
    for (int hits = 1 + random.nextInt(4); hits > 0 && bytes.length > 0; hits--) {
      int at = random.nextInt(bytes.length);
      switch (random.nextInt(6)) {
        case 0 -> bytes[at] = (byte) random.nextInt(256);
        case 1 -> bytes[at] ^= (byte) (1 << random.nextInt(8));
        case 2 -> bytes = Arrays.copyOf(bytes, at);
        case 3 ->
            bytes =
                spliced(
                    bytes,
                    at,
                    0,
                    PIECES[random.nextInt(PIECES.length)].getBytes(StandardCharsets.UTF_8));
        case 4 -> bytes = spliced(bytes, at, random.nextInt(20), new byte[0]);
        default -> {
          int from = random.nextInt(bytes.length);
          int to = Math.min(bytes.length, from + random.nextInt(200));
          bytes = spliced(bytes, at, random.nextInt(3), Arrays.copyOfRange(bytes, from, to));
        }
      }
    }
    return bytes;
  }

  private static byte[] spliced(byte[] bytes, int at, int removed, byte[] inserted) {
    int rest = Math.min(bytes.length, at + removed);
    byte[] result = Arrays.copyOf(bytes, at + inserted.length + bytes.length - rest);
    System.arraycopy(inserted, 0, result, at, inserted.length);
    System.arraycopy(bytes, rest, result, at + inserted.length, bytes.length - rest);
    return result;
  }

  /** Reads; only the declared outcomes are let through. */
  private interface Reading {
    void run(byte[] bytes) throws UnusableInput, IOException;
  }

  private static void damage(byte[] valid, long seed, int trials, Reading reading)
      throws IOException {
    Random random = new Random(seed);
    for (int trial = 0; trial < trials; trial++) {
      byte[] bytes = damaged(valid, random);
      try {
        reading.run(bytes);
      } catch (UnusableInput e) {
        assertFalse(e.problems().isEmpty());
        e.problems().forEach(RandomDamageTest::assertIsFitToShow);
      } catch (RuntimeException | Error e) {
        throw new AssertionError("seed " + seed + ", trial " + trial, e);
      }
    }
  }

  private static void assertIsFitToShow(org.crossreach.survey.Problem problem) {
    String text = problem.toString();
    assertFalse(problem.found().isBlank() || problem.expected().isBlank(), text);
    assertFalse(text.chars().anyMatch(Character::isISOControl), text);
  }

  private static void readTable(byte[] bytes, boolean packed) throws UnusableInput, IOException {
    EnsembleCsv.read(new ByteArrayInputStream(bytes), packed, new FileProblems("pass-01"));
  }

  @Test
  void readsOrRefusesDamagedTables() throws IOException {
    damage(TableText.valid().bytes(), 1, 10_000, bytes -> readTable(bytes, false));
  }

  @Test
  void readsOrRefusesDamagedPackedTables() throws IOException {
    byte[] packed = TableText.packed(TableText.valid().bytes());
    damage(packed, 2, 5_000, bytes -> readTable(bytes, true));
  }

  @Test
  void readsOrRefusesDamagedMeasurements() throws IOException {
    TableText.write(folder, "pass-01.csv", TableText.valid().bytes());
    Path file = folder.resolve("measurement.json");
    damage(
        MeasurementFolderTest.MEASUREMENT.getBytes(StandardCharsets.UTF_8),
        3,
        1_000,
        bytes -> {
          Files.write(file, bytes);
          MeasurementFolder.read(folder);
        });
  }

  @Test
  void readsOrRefusesDamagedSettings() throws IOException {
    damage(
        SETTINGS.getBytes(StandardCharsets.UTF_8),
        4,
        20_000,
        bytes -> {
          FileProblems problems = new FileProblems("settings.json");
          SettingsFile.of(
              JsonTree.parse(bytes, problems), problems, Settings.defaults(), Set.of("pass-01"));
          problems.throwIfAny();
        });
  }
}
