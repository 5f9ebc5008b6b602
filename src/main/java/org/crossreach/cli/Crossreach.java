package org.crossreach.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import org.crossreach.report.FileKind;
import org.crossreach.report.ProgramVersion;
import org.crossreach.report.Units;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** The program: finds the command that is asked for and runs it. */
@Command(
    name = ProgramVersion.NAME,
    description = "From moving-boat ADCP passes to one defensible river discharge.",
    versionProvider = Crossreach.Version.class,
    synopsisSubcommandLabel = "COMMAND",
    commandListHeading = "%nCommands:%n",
    footer = "%nHelp on a command: crossreach COMMAND --help")
public final class Crossreach implements Runnable {

  /** Every command: a class named as the command is typed, with a capital first letter. */
  static final List<Class<?>> COMMANDS =
      List.of(Reduce.class, Compare.class, Archive.class, Check.class, Simulate.class);

  @Option(
      names = "--version",
      versionHelp = true,
      order = 97,
      description = "Print the version of the program and end.")
  boolean version;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      scope = ScopeType.INHERIT,
      order = 98,
      description = "Print this help and end.")
  boolean help;

  @Option(
      names = "--debug",
      scope = ScopeType.INHERIT,
      order = 99,
      description = "When something fails, show the stack trace too.")
  boolean debug;

  @Spec CommandSpec spec;

  /**
   * Runs the program and ends the process with one of the exit codes that {@code --help} lists.
   *
   * @param words the command line
   */
  public static void main(String[] words) {
    StandardOutput standardOutput = new StandardOutput();
    PrintWriter out =
        new PrintWriter(new OutputStreamWriter(standardOutput, StandardCharsets.UTF_8));
    PrintWriter err =
        new PrintWriter(
            new OutputStreamWriter(
                new FileOutputStream(FileDescriptor.err), StandardCharsets.UTF_8),
            true);
    int code = run(words, out, err);
    try {
      out.flush();
      standardOutput.requireComplete();
    } catch (CannotWrite lost) {
      err.println(ProgramVersion.NAME + ": cannot write " + lost.getMessage());
      code = ExitCode.CANNOT_WRITE;
    }
    err.flush();
    System.exit(code);
  }

  /**
   * Runs one command.
   *
   * @param words the command line
   * @param out receives results
   * @param err receives everything else
   * @return the exit code
   */
  static int run(String[] words, PrintWriter out, PrintWriter err) {
    Failures failures = new Failures(err);
    try {
      return commandLine(words)
          .setOut(out)
          .setErr(err)
          .setParameterExceptionHandler(failures)
          .setExecutionExceptionHandler(failures)
          .execute(words);
    } catch (Error failure) {
      return failures.tell(failure, List.of(words).contains("--debug"));
    }
  }

  private static CommandLine commandLine(String[] words) {
    CommandLine program = new CommandLine(new Crossreach());
    for (Class<?> command : COMMANDS) {
      String name = command.getSimpleName().toLowerCase(Locale.ROOT);
      if (words.length > 0 && name.equals(words[0])) {
        return withShared(program.addSubcommand(name, command));
      }
    }
    for (Class<?> command : COMMANDS) {
      program.addSubcommand(command.getSimpleName().toLowerCase(Locale.ROOT), command);
    }
    return withShared(program);
  }

  /** Adds what holds for the program and all its commands alike. */
  private static CommandLine withShared(CommandLine program) {
    layOutHelp(program);
    program.getSubcommands().values().forEach(Crossreach::layOutHelp);
    return program
        .setExpandAtFiles(false)
        .registerConverter(Units.class, new ChoiceConverter<>(Units.class))
        .registerConverter(FileKind.class, new ChoiceConverter<>(FileKind.class));
  }

  private static void layOutHelp(CommandLine command) {
    command
        .getCommandSpec()
        .usageMessage()
        .sortOptions(false)
        .exitCodeListHeading("%nExit codes:%n")
        .exitCodeList(ExitCode.explained());
  }

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "A command is missing");
  }

  /** Reads the version only when it is asked for. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      return new String[] {ProgramVersion.NAME + " " + ProgramVersion.read()};
    }
  }
}
