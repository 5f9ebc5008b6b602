package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.concurrent.Callable;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.ConsoleReport;
import org.crossreach.report.FileKind;
import org.crossreach.report.OutputFolder;
import org.crossreach.report.result.ResultJson;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Reduces a set of passes to one discharge: the main job. */
@Command(
    name = "reduce",
    description = "Reduce a folder of passes to one discharge, with its spread.")
final class Reduce implements Callable<Integer> {

  private static final Path DEFAULT_OUT = Path.of("reports");

  @Parameters(paramLabel = "FOLDER", description = "The folder of the measurement.")
  private Path folder;

  @Mixin private ChoiceOptions choices;

  @Mixin private PassOptions passes;

  @Option(
      names = "--write",
      order = 80,
      split = ",",
      paramLabel = "KIND",
      description =
          "Write files of these kinds, with commas between them; result.json always comes with"
              + " them. Without --out they go to reports/. (with --out alone: json,csv)")
  private List<FileKind> kinds = List.of();

  @Mixin private OutputOptions output;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws UnusableInput, IOException {
    Measurement measurement = passes.applyTo(MeasurementFolder.read(folder), spec.commandLine());
    Settings settings = choices.applyTo(SettingsFile.read(folder));
    Result result = Result.of(Reducer.onAllProcessors().reduce(measurement, settings));
    if (output.out != null || !kinds.isEmpty()) {
      write(result);
    }
    print(result);
    return result.hasFault() ? ExitCode.FAULTS_FOUND : ExitCode.DONE;
  }

  private void print(Result result) throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (output.json) {
      ByteArrayOutputStream json = new ByteArrayOutputStream();
      ResultJson.write(result, json);
      out.print(json.toString(StandardCharsets.UTF_8));
    } else {
      out.print(new ConsoleReport(result, output.units).text());
    }
    out.flush();
  }

  private void write(Result result) throws CannotWrite {
    Path root = output.out == null ? DEFAULT_OUT : output.out;
    Path target = root.resolve(result.reduction().measurement().id());
    EnumSet<FileKind> wanted = EnumSet.of(FileKind.JSON);
    wanted.addAll(kinds.isEmpty() ? List.of(FileKind.CSV) : kinds);
    CannotWrite.unless(
        target,
        () -> {
          OutputFolder files = OutputFolder.claim(target);
          for (FileKind kind : wanted) {
            kind.write(result, output.units, files);
          }
        });
    if (!output.quiet) {
      spec.commandLine().getErr().println("written to " + target);
    }
  }
}
