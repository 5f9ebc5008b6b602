package org.crossreach.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import org.crossreach.report.FileKind;
import org.crossreach.report.ProgramVersion;
import org.crossreach.report.Units;
import picocli.CommandLine;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;

/** The program: finds the command that is asked for and runs it. */
public final class Crossreach {

  /** Every command, by the word that is typed. */
  static final Map<String, Supplier<Job>> COMMANDS = new LinkedHashMap<>();

  static {
    COMMANDS.put("reduce", Reduce::new);
    COMMANDS.put("compare", Compare::new);
    COMMANDS.put("archive", Archive::new);
    COMMANDS.put("check", Check::new);
    COMMANDS.put("simulate", Simulate::new);
  }

  private final Usage usage =
      new Usage(
          ProgramVersion.NAME,
          "From moving-boat ADCP passes to one defensible river discharge.",
          this::commandMissing);

  private final Given<Boolean> debug;

  private Crossreach() {
    usage.version("--version", "Print the version of the program and end.");
    usage.help("-h", "--help", "Print this help and end.");
    debug = usage.commonFlag("--debug", "When something fails, show the stack trace too.");
  }

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
    Crossreach program = new Crossreach();
    Failures failures = new Failures(err, program.debug::value);
    try {
      return program
          .commandLine(words)
          .setOut(out)
          .setErr(err)
          .setParameterExceptionHandler(failures)
          .setExecutionExceptionHandler(failures)
          .execute(words);
    } catch (Error failure) {
      return failures.tell(failure);
    }
  }

  /** The reader of the command line; it knows the asked command alone, or else all of them. */
  private CommandLine commandLine(String[] words) {
    CommandSpec spec = usage.spec().versionProvider(new Version());
    spec.usageMessage()
        .synopsisSubcommandLabel("COMMAND")
        .commandListHeading("%nCommands:%n")
        .footer("%nHelp on a command: crossreach COMMAND --help");
    CommandLine program = new CommandLine(spec, new Collected());
    Supplier<Job> asked = words.length == 0 ? null : COMMANDS.get(words[0]);
    if (asked != null) {
      program.addSubcommand(words[0], asked.get().usage().spec());
    } else {
      COMMANDS.forEach((word, job) -> program.addSubcommand(word, job.get().usage().spec()));
    }
    return program
        .setExpandAtFiles(false)
        .registerConverter(Path.class, new PathConverter())
        .registerConverter(Units.class, new ChoiceConverter<>(Units.class))
        .registerConverter(FileKind.class, new ChoiceConverter<>(FileKind.class));
  }

  private Integer commandMissing() {
    throw usage.wrong("A command is missing");
  }

  // Both are classes and no lambdas, since picocli's class files are so old that the archive of
  // classes can hold no lambda for them, nor what else implements the same interface.

  /** Reads the version only when it is asked for. */
  private static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      return new String[] {ProgramVersion.NAME + " " + ProgramVersion.read()};
    }
  }

  private static final class PathConverter implements ITypeConverter<Path> {
    @Override
    public Path convert(String path) {
      return Path.of(path);
    }
  }
}
