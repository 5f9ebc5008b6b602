package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A reviewer sees every choice on one screen, and nothing is changed without being asked for. */
class CompareTest {

  private static final Path SAMPLE = Path.of("sample-transects/heron-weir-0903");

  @TempDir Path folder;

  private Path copy() throws Exception {
    try (Stream<Path> files = Files.list(SAMPLE)) {
      for (Path each : files.toList()) {
        Files.copy(each, folder.resolve(each.getFileName()));
      }
    }
    return folder;
  }

  @Test
  void fitsAScreenOfEightyColumns() {
    Run run = Run.of("compare", SAMPLE.toString());
    assertEquals(ExitCode.DONE, run.code());
    List<String> lines = run.out().lines().toList();
    assertTrue(lines.size() <= 48, lines.size() + " lines");
    for (String line : lines) {
      assertTrue(line.length() <= 80, line);
    }
    assertEquals(1, lines.stream().filter(line -> line.startsWith("* power")).count());
  }

  @Test
  void changesNothingUnlessAsked() throws Exception {
    Path settings = copy().resolve("settings.json");
    String before = Files.readString(settings);
    Run.of("compare", folder.toString());
    assertEquals(before, Files.readString(settings));
    Run run = Run.of("compare", folder.toString(), "--write-settings");
    assertEquals(ExitCode.DONE, run.code());
    String after = Files.readString(settings);
    assertTrue(after.contains("\"rule\": \"fit-all\""), after);
    assertTrue(after.contains("\"correlation\": 0.6"), "other choices stay");
    assertEquals(ExitCode.DONE, Run.of("check", folder.toString()).code());
  }

  @Test
  void printsForMachines() {
    Run json = Run.of("compare", SAMPLE.toString(), "--json");
    assertTrue(json.out().contains("\"format\": \"crossreach-comparison/1\""));
    assertFalse(json.out().contains("NaN"));
    Run csv = Run.of("compare", SAMPLE.toString(), "--csv");
    assertEquals(19, csv.out().lines().count());
  }

  @Test
  void putsSeveralMeasurementsSideBySide() {
    Run run = Run.of("compare", SAMPLE.toString(), "sample-transects/tern-landing-0418");
    assertTrue(run.out().contains("all that can tell need the same law, power"));
  }

  @Test
  void leavesASettingsFileAloneThatIsNotOurs() throws Exception {
    Path settings = copy().resolve("settings.json");
    Run first = Run.of("compare", folder.toString(), "--write-settings");
    assertEquals(ExitCode.DONE, first.code(), first.err());
    Files.writeString(settings, "{\"mine\": true}");
    Run run = Run.of("compare", folder.toString(), "--write-settings");
    assertEquals(ExitCode.UNREADABLE_INPUT, run.code());
    assertEquals("{\"mine\": true}", Files.readString(settings));
  }

  @Test
  void writesFilesWhereAsked() {
    Path out = folder.resolve("out");
    Run run =
        Run.of("compare", SAMPLE.toString(), "--write", "csv,png,svg", "--out", out.toString());
    assertEquals(ExitCode.DONE, run.code(), run.err());
    Path target = out.resolve("heron-weir-0903");
    for (String name :
        List.of(
            "comparison.json",
            "combinations.csv",
            "profile-density.png",
            "hidden-cells.svg",
            "combinations.png")) {
      assertTrue(Files.exists(target.resolve(name)), name);
    }
    assertEquals(
        ExitCode.DONE, Run.of("compare", SAMPLE.toString(), "--out", out.toString()).code());
    Run pdf = Run.of("compare", SAMPLE.toString(), "--write", "pdf");
    assertEquals(ExitCode.WRONG_USAGE, pdf.code());
  }
}
