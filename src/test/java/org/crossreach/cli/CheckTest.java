package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Everything that is wrong in a folder is listed at once, each with its place. */
class CheckTest {

  @TempDir Path folder;

  @BeforeEach
  void copyExample() throws IOException {
    try (var files = Files.newDirectoryStream(Path.of("formats", "example"))) {
      for (Path file : files) {
        Files.copy(file, folder.resolve(file.getFileName()));
      }
    }
  }

  private void replace(String file, String target, String replacement) throws IOException {
    Path path = folder.resolve(file);
    Files.writeString(path, Files.readString(path).replace(target, replacement));
  }

  @Test
  void countsWhatIsThereWhenNothingIsWrong() {
    assertEquals(
        new Run(ExitCode.DONE, "plover-ford-0611: 2 passes, 36 ensembles, 0 problems\n", ""),
        Run.of("check", folder.toString()));
  }

  @Test
  void listsTheProblemsOfAllFiles() throws IOException {
    replace("measurement.json", "\"draft_m\": 0.2", "\"draft_m\": \"0.2\"");
    replace("settings.json", "slant-mean", "slant");
    replace("pass-01.csv", "09:30:02", "09:29:02");
    Run run = Run.of("check", folder.toString());
    assertEquals(ExitCode.UNREADABLE_INPUT, run.code());
    assertEquals("", run.err());
    String[] lines = run.out().split("\n");
    assertEquals("measurement.json:", lines[0].substring(0, 17));
    assertEquals("settings.json:", lines[1].substring(0, 14));
    assertEquals("pass-01.csv:3, time:", lines[2].substring(0, 20));
    assertEquals("3 problems", lines[lines.length - 1]);
  }

  @Test
  void remarksOnWhatIsIgnored() throws IOException {
    replace("pass-02.csv", "temperature_degc", "temperature_degf");
    assertEquals(
        new Run(
            ExitCode.DONE,
            "pass-02.csv: caution: columns that are not known are ignored: \"temperature_degf\""
                + " (nearest known name: temperature_degc)\n"
                + "plover-ford-0611: 2 passes, 36 ensembles, 0 problems\n",
            ""),
        Run.of("check", folder.toString()));
  }

  @Test
  void writesTheSameListAsJson() throws IOException {
    replace("pass-02.csv", "temperature_degc", "temperature_degf");
    assertEquals(
        new Run(
            ExitCode.DONE,
            """
            {
              "format": "crossreach-check/1",
              "measurement": "plover-ford-0611",
              "problems": [ ],
              "notes": [
                {
                  "file": "pass-02.csv",
                  "level": "caution",
                  "code": "unknown-column",
                  "text": "columns that are not known are ignored: \\"temperature_degf\\" (nearest\
             known name: temperature_degc)"
                }
              ]
            }
            """,
            ""),
        Run.of("check", folder.toString(), "--json"));
    replace("pass-01.csv", "09:30:02", "09:29:02");
    Run run = Run.of("check", folder.toString(), "--json");
    assertEquals(ExitCode.UNREADABLE_INPUT, run.code());
    assertEquals(
        """
        {
          "format": "crossreach-check/1",
          "measurement": null,
          "problems": [
            {
              "file": "pass-01.csv",
              "line": 3,
              "place": "time",
        """,
        run.out().lines().limit(8).map(line -> line + "\n").reduce("", String::concat));
  }

  @Test
  void namesAFolderThatIsNotThere() {
    Path nowhere = folder.resolve("nowhere");
    assertEquals(
        new Run(
            ExitCode.UNREADABLE_INPUT,
            "",
            "crossreach: cannot read " + nowhere + ": there is no such file or folder\n"),
        Run.of("check", nowhere.toString()));
    Path file = folder.resolve("pass-01.csv");
    assertEquals(
        new Run(
            ExitCode.UNREADABLE_INPUT,
            "",
            "crossreach: cannot read " + file + ": this is not a folder\n"),
        Run.of("check", file.toString()));
  }
}
