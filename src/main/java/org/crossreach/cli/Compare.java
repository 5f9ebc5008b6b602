package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.crossreach.discharge.Reducer;
import org.crossreach.evidence.Comparison;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.SettingsJson;
import org.crossreach.report.Units;
import org.crossreach.report.comparison.ComparisonCsv;
import org.crossreach.report.comparison.ComparisonJson;
import org.crossreach.report.comparison.ComparisonText;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Compares every choice of extrapolation, with the evidence for each. */
@Command(
    name = "compare",
    description =
        "Show every choice of extrapolation side by side, with the evidence for each; several"
            + " measurements of a site too.")
final class Compare implements Callable<Integer> {

  @Parameters(
      arity = "1..*",
      paramLabel = "FOLDER",
      description = "The folders of the measurements.")
  private List<Path> folders;

  @Mixin private ChoiceOptions choices;

  @Option(names = "--json", order = 90, description = "Print JSON, for machines.")
  private boolean json;

  @Option(names = "--csv", order = 91, description = "Print a CSV table, for machines.")
  private boolean csv;

  @Option(
      names = "--units",
      order = 92,
      paramLabel = "si|us",
      defaultValue = "si",
      description = "Units of the tables: SI or US customary (default: si).")
  private Units units;

  @Option(
      names = "--write-settings",
      order = 93,
      description =
          "Write what the evidence favours into the settings.json of each measurement; without"
              + " this nothing is ever changed.")
  private boolean writeSettings;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws UnusableInput, IOException {
    List<Comparison> comparisons = new ArrayList<>();
    for (Path folder : folders) {
      Measurement measurement = MeasurementFolder.read(folder);
      Settings settings = choices.applyTo(SettingsFile.read(folder));
      comparisons.add(Comparison.of(measurement, settings, Reducer.onAllProcessors()));
    }
    print(comparisons);
    for (int f = 0; writeSettings && f < folders.size(); f++) {
      writeSettings(folders.get(f).resolve("settings.json"), comparisons.get(f));
    }
    return ExitCode.DONE;
  }

  private void print(List<Comparison> comparisons) throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (json || csv) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      if (json) {
        ComparisonJson.write(comparisons, bytes);
      } else {
        ComparisonCsv.write(comparisons, bytes);
      }
      out.print(bytes.toString(StandardCharsets.UTF_8));
    } else {
      for (Comparison comparison : comparisons) {
        out.print(new ComparisonText(comparison, units).text());
        out.print(comparisons.size() > 1 ? "\n" : "");
      }
      if (comparisons.size() > 1) {
        out.print(ComparisonText.sideBySide(comparisons));
      }
    }
    out.flush();
  }

  private void writeSettings(Path file, Comparison comparison) throws CannotWrite {
    Settings favoured = comparison.favoured().settings();
    CannotWrite.unless(
        file,
        () -> {
          if (Files.exists(file) && !Files.readString(file).contains(SettingsJson.FORMAT)) {
            throw new FileSystemException(
                file.toString(), null, "this is not a settings.json of crossreach");
          }
          ByteArrayOutputStream bytes = new ByteArrayOutputStream();
          SettingsJson.write(favoured, bytes);
          Path unfinished =
              file.resolveSibling(".settings.json." + ProcessHandle.current().pid() + ".part");
          Files.write(unfinished, bytes.toByteArray());
          Files.move(
              unfinished,
              file,
              StandardCopyOption.ATOMIC_MOVE,
              StandardCopyOption.REPLACE_EXISTING);
        });
    spec.commandLine().getErr().println("written to " + file);
  }
}
