package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.report.CheckReport;
import org.crossreach.survey.UnusableInput;
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

  @Option(names = "--json", order = 90, description = "Print the list as JSON, for machines.")
  private boolean json;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    CheckReport report = read();
    print(report);
    return report.problems().isEmpty() ? ExitCode.DONE : ExitCode.UNREADABLE_INPUT;
  }

  private CheckReport read() throws IOException {
    try {
      return new CheckReport(Optional.of(MeasurementFolder.read(folder)), List.of());
    } catch (UnusableInput unusable) {
      return new CheckReport(Optional.empty(), unusable.problems());
    }
  }

  private void print(CheckReport report) throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (json) {
      ByteArrayOutputStream text = new ByteArrayOutputStream();
      report.writeJson(text);
      out.print(text.toString(StandardCharsets.UTF_8));
    } else {
      out.print(report.text());
    }
    out.flush();
  }
}
