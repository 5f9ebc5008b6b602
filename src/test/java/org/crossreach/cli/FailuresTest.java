package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;

/** Every failure becomes lines without a stack trace, and the exit code of its kind. */
class FailuresTest {

  private static final Problem COMMA =
      new Problem("pass-01.csv", 118, "cell_size_m", "\"0,25\"", "a number", "use a decimal point");

  @Test
  void unusableInputIsEveryProblemAndTheirCount() {
    assertTold(
        ExitCode.UNREADABLE_INPUT,
        "pass-01.csv:118, cell_size_m: found \"0,25\", expected a number; use a decimal point\n"
            + "pass-01.csv:118, cell_size_m: found \"0,25\", expected a number; use a decimal point\n"
            + "crossreach: 2 problems; nothing was written\n",
        new UnusableInput(List.of(COMMA, COMMA)));
  }

  @Test
  void failingReadIsUnreadableInput() {
    assertTold(
        ExitCode.UNREADABLE_INPUT,
        "crossreach: cannot read tern/measurement.json: there is no such file or folder\n",
        new NoSuchFileException("tern/measurement.json"));
    assertTold(
        ExitCode.UNREADABLE_INPUT,
        "crossreach: cannot read pass-01.csv: access is denied; check the permissions\n",
        new UncheckedIOException(new AccessDeniedException("pass-01.csv")));
    assertTold(
        ExitCode.UNREADABLE_INPUT,
        "crossreach: cannot read pass-01.csv (Is a directory)\n",
        new FileNotFoundException("pass-01.csv (Is a directory)"));
  }

  @Test
  void failingWriteIsCannotWrite() {
    CannotWrite named =
        failureOf(
            () -> {
              throw new FileSystemException("out/tern.json", null, "No space left on device");
            });
    assertTold(
        ExitCode.CANNOT_WRITE,
        "crossreach: cannot write out/tern.json: No space left on device\n",
        named);
    CannotWrite unnamed =
        failureOf(
            () -> {
              throw new IOException("No space left on device");
            });
    assertTold(
        ExitCode.CANNOT_WRITE, "crossreach: cannot write out: No space left on device\n", unnamed);
  }

  @Test
  void tooLittleMemorySaysWhatToDoHoweverDeepItLies() {
    String told =
        "crossreach: the memory is too small for this input; give the program more, for example"
            + " CROSSREACH_JAVA_OPTS=-Xmx4g\n";
    assertTold(ExitCode.UNREADABLE_INPUT, told, new OutOfMemoryError("Java heap space"));
    assertTold(
        ExitCode.UNREADABLE_INPUT,
        told,
        new IllegalStateException(new RuntimeException(new OutOfMemoryError())));
  }

  @Test
  void anythingElseIsAFaultOfTheProgram() {
    assertTold(
        ExitCode.PROGRAM_FAULT,
        "crossreach: the program itself failed (java.lang.IllegalStateException: impossible); run"
            + " it again with --debug and send what it prints to its keepers\n",
        new IllegalStateException("impossible"));
  }

  @Test
  void debugShowsTheStackTrace() {
    StringWriter err = new StringWriter();
    new Failures(new PrintWriter(err), () -> true).tell(new IllegalStateException("impossible"));
    assertTrue(err.toString().contains("at org.crossreach.cli.FailuresTest"), err.toString());
  }

  private static void assertTold(int code, String told, Throwable failure) {
    StringWriter err = new StringWriter();
    assertEquals(code, new Failures(new PrintWriter(err), () -> false).tell(failure));
    assertEquals(told, err.toString());
  }

  private static CannotWrite failureOf(CannotWrite.Writing writing) {
    try {
      CannotWrite.unless(Path.of("out"), writing);
    } catch (CannotWrite failure) {
      return failure;
    }
    throw new AssertionError("nothing failed");
  }
}
