package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** What the README prints is what the program prints. */
class ReadmeTest {

  @Test
  void showsTheTrueOutputOfItsFirstCommand() throws Exception {
    String readme = Files.readString(Path.of("README.md"));
    String command = "target/crossreach/bin/crossreach reduce ";
    int from = readme.indexOf(command) + command.length();
    String sample = readme.substring(from, readme.indexOf('\n', from)).strip();
    int block = readme.indexOf("```text\n") + "```text\n".length();
    String shown = readme.substring(block, readme.indexOf("```", block));
    Run run = Run.of("reduce", sample);
    assertEquals(shown, run.out());
    assertEquals(ExitCode.DONE, run.code());
  }

  @Test
  void listsEveryCommand() throws Exception {
    String readme = Files.readString(Path.of("README.md"));
    for (String name : Crossreach.COMMANDS.keySet()) {
      assertTrue(readme.contains("| `" + name + " "), name);
    }
  }
}
