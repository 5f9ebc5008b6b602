package org.crossreach.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.evidence.Comparer;
import org.crossreach.evidence.Comparison;
import org.crossreach.evidence.Verdict;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.FileKind;
import org.crossreach.report.SettingsFolder;
import org.crossreach.report.comparison.ComparisonCsv;
import org.crossreach.report.comparison.ComparisonFiles;
import org.crossreach.report.comparison.ComparisonJson;
import org.crossreach.report.comparison.ComparisonText;
import org.crossreach.report.comparison.SiteText;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;

/** Compares every choice of laws and exponent for the unmeasured water, with the evidence. */
final class Compare implements Job {

  private final Usage usage =
      new Usage(
          "compare",
          "Compare every choice of laws and exponent for the unmeasured water, with what the"
              + " measured cells say about each.",
          this);

  private final Given<List<Path>> folders =
      usage.operands(
          1, "FOLDER", Path.class, "The folder of a measurement; several are set side by side.");

  private final ChoiceOptions choices = new ChoiceOptions(usage);
  private final PassOptions passes = new PassOptions(usage);

  private final Given<List<FileKind>> kinds =
      usage.list(
          "--write",
          "KIND",
          FileKind.class,
          List.of(),
          "Write files of these kinds, with commas between them: json, csv, png, svg;"
              + " comparison.json always comes with them. Without --out they go to reports/."
              + " (with --out alone: json,csv)");

  private final Given<Boolean> writeSettings =
      usage.flag(
          "--write-settings",
          "Where the evidence favours another choice, write it into the measurement's"
              + " settings.json. Without this nothing changes.");

  private final Given<Boolean> csv = usage.flag("--csv", "Print every combination as a CSV table.");

  private final OutputOptions output = new OutputOptions(usage);

  @Override
  public Usage usage() {
    return usage;
  }

  @Override
  public Integer call() throws UnusableInput, IOException {
    for (FileKind kind : kinds.value()) {
      if (!ComparisonFiles.KINDS.contains(kind)) {
        throw usage.wrong("A comparison cannot be written as " + kind.key());
      }
    }
    List<Comparison> comparisons = new ArrayList<>();
    for (Path folder : folders.value()) {
      Measurement measurement = passes.applyTo(MeasurementFolder.read(folder));
      Settings settings = choices.applyTo(SettingsFile.read(folder));
      comparisons.add(Comparer.onAllProcessors().compare(measurement, settings));
    }
    if (output.wantsFiles(kinds.value())) {
      for (Comparison each : comparisons) {
        output.write(
            each.chosen().reduction().measurement().id(),
            kinds.value(),
            (kind, files) -> ComparisonFiles.write(each, kind, output.units(), files));
      }
    }
    print(comparisons);
    if (writeSettings.value()) {
      for (int m = 0; m < folders.value().size(); m++) {
        writeSettings(comparisons.get(m), folders.value().get(m));
      }
    }
    return ExitCode.DONE;
  }

  private void print(List<Comparison> comparisons) throws IOException {
    PrintWriter out = usage.out();
    if (output.json() || csv.value()) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      if (output.json()) {
        ComparisonJson.write(comparisons, bytes);
      } else {
        ComparisonCsv.write(comparisons, bytes);
      }
      out.print(bytes.toString(StandardCharsets.UTF_8));
    } else {
      List<String> texts = new ArrayList<>();
      for (Comparison each : comparisons) {
        texts.add(new ComparisonText(each, output.units()).text());
      }
      if (comparisons.size() > 1) {
        texts.add(new SiteText(comparisons).text());
      }
      out.print(String.join("\n", texts));
    }
    out.flush();
  }

  private void writeSettings(Comparison comparison, Path folder) throws CannotWrite {
    Verdict verdict = comparison.verdict();
    if (verdict.kind() != Verdict.Kind.CHANGE) {
      output.remark("settings of " + folder + " stay as they are");
      return;
    }
    Settings settings = verdict.combination().in(comparison.chosen().reduction().settings());
    CannotWrite.unless(folder, () -> SettingsFolder.write(settings, folder));
    output.remark("settings of " + folder + " changed to " + verdict.combination().text());
  }
}
