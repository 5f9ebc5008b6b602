package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.FieldSource;
import picocli.CommandLine.Command;

/**
 * A person types a command line; whatever is wrong with it is told on standard error in a few lines
 * that name the nearest valid word, and the exit code says of what kind it was.
 */
class CrossreachTest {

  @Test
  void helpListsEveryCommandAndEveryExitCode() {
    Run help = Run.of("--help");
    assertEquals(ExitCode.DONE, help.code());
    for (Class<?> command : Crossreach.COMMANDS) {
      assertTrue(help.out().contains("\n  " + typed(command)), typed(command));
    }
    ExitCode.explained()
        .forEach((code, meaning) -> assertTrue(help.out().contains(code + "   " + meaning), code));
    assertEquals("", help.err());
  }

  @ParameterizedTest
  @FieldSource("org.crossreach.cli.Crossreach#COMMANDS")
  void commandIsTypedAsItsClassIsNamed(Class<?> command) {
    assertEquals(typed(command), command.getAnnotation(Command.class).name());
  }

  @ParameterizedTest
  @FieldSource("org.crossreach.cli.Crossreach#COMMANDS")
  void everyCommandExplainsItselfAndItsExitCodes(Class<?> command) {
    Run help = Run.of(typed(command), "--help");
    assertEquals(ExitCode.DONE, help.code());
    assertTrue(help.out().startsWith("Usage: crossreach " + typed(command)), help.out());
    assertTrue(help.out().contains("Exit codes:"), help.out());
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

  private static String typed(Class<?> command) {
    return command.getSimpleName().toLowerCase(Locale.ROOT);
  }
}
