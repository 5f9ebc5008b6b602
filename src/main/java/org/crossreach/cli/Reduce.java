package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.ConsoleReport;
import org.crossreach.report.FileKind;
import org.crossreach.report.result.ResultJson;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;

/** Reduces a set of passes to one discharge: the main job. */
final class Reduce implements Job {

  private final Usage usage =
      new Usage("reduce", "Reduce a folder of passes to one discharge, with its spread.", this);

  private final Given<Path> folder =
      usage.operand("FOLDER", Path.class, "The folder of the measurement.");

  private final ChoiceOptions choices = new ChoiceOptions(usage);
  private final PassOptions passes = new PassOptions(usage);

  private final Given<List<FileKind>> kinds =
      usage.list(
          "--write",
          "KIND",
          FileKind.class,
          List.of(),
          "Write files of these kinds, with commas between them; result.json always comes with"
              + " them. Without --out they go to reports/. (with --out alone: json,csv)");

  private final OutputOptions output = new OutputOptions(usage);

  @Override
  public Usage usage() {
    return usage;
  }

  @Override
  public Integer call() throws UnusableInput, IOException {
    Measurement measurement = passes.applyTo(MeasurementFolder.read(folder.value()));
    Settings settings = choices.applyTo(SettingsFile.read(folder.value()));
    Result result = Result.of(Reducer.onAllProcessors().reduce(measurement, settings));
    if (output.wantsFiles(kinds.value())) {
      output.write(
          measurement.id(),
          kinds.value(),
          (kind, files) -> kind.write(result, output.units(), files));
    }
    print(result);
    return result.hasFault() ? ExitCode.FAULTS_FOUND : ExitCode.DONE;
  }

  private void print(Result result) throws IOException {
    PrintWriter out = usage.out();
    if (output.json()) {
      ByteArrayOutputStream json = new ByteArrayOutputStream();
      ResultJson.write(result, json);
      out.print(json.toString(StandardCharsets.UTF_8));
    } else {
      out.print(new ConsoleReport(result, output.units()).text());
    }
    out.flush();
  }
}
