package org.crossreach.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Reads everything of a measurement, computes nothing, and lists every problem with its place. */
@Command(
    name = "check",
    description = "Read everything, compute nothing, and list every problem with its place.")
final class Check implements Callable<Integer> {

  @Parameters(paramLabel = "FOLDER", description = "The folder of the measurement.")
  private Path folder;

  @Option(names = "--json", description = "Print the list as JSON, for machines.")
  private boolean json;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() {
    spec.commandLine().getOut().println(folder);
    return ExitCode.DONE;
  }
}
