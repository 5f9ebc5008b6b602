package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A person types a command line; whatever is wrong with it is told on standard error in a few lines
 * that name the nearest valid word, and the exit code says of what kind it was.
 */
class CrossreachTest {

  @Test
  void helpListsEveryCommandAndEveryExitCode() {
    Run help = Run.of("--help");
    assertEquals(ExitCode.DONE, help.code());
    for (String command : Crossreach.COMMANDS.keySet()) {
      assertTrue(help.out().contains("\n  " + command), command);
    }
    ExitCode.explained()
        .forEach((code, meaning) -> assertTrue(help.out().contains(code + "   " + meaning), code));
    assertEquals("", help.err());
  }

  @Test
  void everyCommandExplainsItselfAndItsExitCodes() {
    for (String command : Crossreach.COMMANDS.keySet()) {
      Run help = Run.of(command, "--help");
      assertEquals(ExitCode.DONE, help.code());
      assertTrue(help.out().startsWith("Usage: crossreach " + command + " "), help.out());
      assertTrue(help.out().contains("Exit codes:"), help.out());
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"--debug reduce gone", "reduce --debug gone", "reduce gone --debug"})
  void theStackTraceIsAskedForAnywhereOnTheLine(String words) {
    assertTrue(Run.of(words.split(" ")).err().contains("\tat "), words);
    assertFalse(Run.of("reduce", "gone").err().contains("\tat "));
  }

  @Test
  void versionIsThatOfTheBuild() {
    Run version = Run.of("--version");
    assertTrue(version.out().matches("crossreach \\d+\\.\\d+\\.\\d+\\S*\n"), version.out());
  }

  @Test
  void missingCommandIsWrongUsage() {
    Run run = Run.of();
    assertEquals(ExitCode.WRONG_USAGE, run.code());
    assertEquals("crossreach: A command is missing\nSee 'crossreach --help'.\n", run.err());
    assertEquals("", run.out());
  }

  @ParameterizedTest
  @CsvSource({"reduce,FOLDER", "compare,FOLDER", "check,FOLDER", "simulate,RECIPE.json"})
  void missingOperandIsWrongUsage(String command, String operand) {
    Run run = Run.of(command);
    assertEquals(ExitCode.WRONG_USAGE, run.code());
    assertEquals(
        "crossreach: Missing required parameter: '%s'\nSee 'crossreach %s --help'.\n"
            .formatted(operand, command),
        run.err());
  }

  @ParameterizedTest
  @ValueSource(strings = {"reduce a b", "check a b", "simulate a b"})
  void oneOperandTooManyIsWrongUsage(String words) {
    assertEquals(ExitCode.WRONG_USAGE, Run.of(words.split(" ")).code());
  }

  @Test
  void misspeltCommandNamesTheNearest() {
    Run run = Run.of("chekc", "folder");
    assertEquals(ExitCode.WRONG_USAGE, run.code());
    assertTrue(run.err().contains("'chekc'"), run.err());
    assertTrue(run.err().contains("crossreach check"), run.err());
  }

  @Test
  void misspeltOptionNamesTheNearest() {
    Run run = Run.of("check", "folder", "--jsn");
    assertEquals(ExitCode.WRONG_USAGE, run.code());
    assertTrue(run.err().contains("--json"), run.err());
  }

  @Test
  void aWordThatBeginsWithAnAtSignIsNoArgumentFile() {
    Run run = Run.of("check", "@there-is-no-such-file");
    assertFalse(run.code() == ExitCode.WRONG_USAGE, run.err());
  }
}
