package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.report.CheckReport;
import org.crossreach.survey.UnusableInput;

/** Reads everything of a measurement, computes nothing, and lists every problem with its place. */
final class Check implements Job {

  private final Usage usage =
      new Usage(
          "check",
          "Read everything, compute nothing, and list every problem with its place.",
          this);

  private final Given<Path> folder =
      usage.operand("FOLDER", Path.class, "The folder of the measurement.");

  private final Given<Boolean> json = usage.flag("--json", "Print the list as JSON, for machines.");

  @Override
  public Usage usage() {
    return usage;
  }

  @Override
  public Integer call() throws IOException {
    CheckReport report = read();
    print(report);
    return report.problems().isEmpty() ? ExitCode.DONE : ExitCode.UNREADABLE_INPUT;
  }

  private CheckReport read() throws IOException {
    try {
      return new CheckReport(Optional.of(MeasurementFolder.read(folder.value())), List.of());
    } catch (UnusableInput unusable) {
      return new CheckReport(Optional.empty(), unusable.problems());
    }
  }

  private void print(CheckReport report) throws IOException {
    PrintWriter out = usage.out();
    if (json.value()) {
      ByteArrayOutputStream text = new ByteArrayOutputStream();
      report.writeJson(text);
      out.print(text.toString(StandardCharsets.UTF_8));
    } else {
      out.print(report.text());
    }
    out.flush();
  }
}
