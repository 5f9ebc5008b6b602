package org.crossreach.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.util.function.BooleanSupplier;
import org.crossreach.report.CheckReport;
import org.crossreach.report.FileTrouble;
import org.crossreach.report.ProgramVersion;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/**
 * Turns whatever ends a command early into lines for a person and an {@linkplain ExitCode exit
 * code}; a stack trace is shown with {@code --debug} only.
 */
final class Failures implements IParameterExceptionHandler, IExecutionExceptionHandler {

  private static final String PROGRAM = ProgramVersion.NAME + ": ";

  private final PrintWriter err;
  private final BooleanSupplier debug;

  Failures(PrintWriter err, BooleanSupplier debug) {
    this.err = err;
    this.debug = debug;
  }

  @Override
  public int handleParseException(ParameterException failure, String[] words) {
    CommandLine command = failure.getCommandLine();
    err.println(PROGRAM + failure.getMessage());
    UnmatchedArgumentException.printSuggestions(failure, err);
    err.println("See '" + command.getCommandSpec().qualifiedName() + " --help'.");
    return ExitCode.WRONG_USAGE;
  }

  @Override
  public int handleExecutionException(
      Exception failure, CommandLine command, ParseResult parseResult) {
    if (failure instanceof ParameterException wrongUsage) {
      return handleParseException(wrongUsage, new String[0]);
    }
    return tell(failure);
  }

  /**
   * Tells a failure.
   *
   * @param failure what ended the command
   * @return the exit code
   */
  int tell(Throwable failure) {
    if (debug.getAsBoolean()) {
      failure.printStackTrace(err);
    }
    for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
      if (cause instanceof OutOfMemoryError) {
        err.println(
            PROGRAM
                + "the memory is too small for this input; give the program more, for example"
                + " CROSSREACH_JAVA_OPTS=-Xmx4g");
        return ExitCode.UNREADABLE_INPUT;
      }
    }
    Throwable cause =
        failure instanceof UncheckedIOException wrapper ? wrapper.getCause() : failure;
    if (cause instanceof UnusableInput unusable) {
      return tellProblems(unusable);
    }
    if (cause instanceof CannotWrite lost) {
      err.println(PROGRAM + "cannot write " + lost.getMessage());
      return ExitCode.CANNOT_WRITE;
    }
    if (cause instanceof IOException trouble) {
      err.println(PROGRAM + "cannot read " + FileTrouble.describe("", trouble));
      return ExitCode.UNREADABLE_INPUT;
    }
    err.println(
        PROGRAM
            + "the program itself failed ("
            + cause
            + "); run it again with --debug and send what it prints to its keepers");
    return ExitCode.PROGRAM_FAULT;
  }

  private int tellProblems(UnusableInput unusable) {
    for (Problem problem : unusable.problems()) {
      err.println(problem);
    }
    err.println(
        PROGRAM
            + CheckReport.counted(unusable.problems().size(), "problem")
            + "; nothing was written");
    return ExitCode.UNREADABLE_INPUT;
  }
}
