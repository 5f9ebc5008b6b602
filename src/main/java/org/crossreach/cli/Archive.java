package org.crossreach.cli;

import java.io.BufferedReader;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import org.crossreach.archive.ArchiveRun;
import org.crossreach.archive.CannotKeep;
import org.crossreach.archive.Finder;
import org.crossreach.archive.Found;
import org.crossreach.archive.Index;
import org.crossreach.archive.Plan;
import org.crossreach.archive.Shard;
import org.crossreach.notation.JsonText;
import org.crossreach.report.FileKind;
import org.crossreach.report.Units;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;

/** Keeps every measurement it finds: reports, tables, manifests and one index. */
final class Archive implements Job {

  private final Usage usage =
      new Usage(
          "archive",
          "Find measurements, keep the reports and tables of each, and an index of all; what is"
              + " kept already is not done again.",
          this);

  private final Given<List<Path>> roots =
      usage.operands(0, "ROOT", Path.class, "Folders to look through for measurements.");

  private final Given<String> from =
      usage.option(
          "--from",
          "FILE",
          String.class,
          null,
          "Take the measurement folders from a list, one in a line; - is standard input.");

  private final Given<Path> target =
      usage.option(
          "--out",
          "DIR",
          Path.class,
          Path.of("reports"),
          "Folder of the archive (default: reports).");

  private final Given<List<FileKind>> kinds =
      usage.list(
          "--write",
          "KIND",
          FileKind.class,
          List.of(FileKind.CSV, FileKind.PDF),
          "Kinds of files, with commas between them: json, csv, pdf, png, svg (default:"
              + " json,csv,pdf).");

  private final Given<Integer> jobs =
      usage.option(
          "--jobs",
          "N",
          Integer.class,
          Runtime.getRuntime().availableProcessors(),
          "Measurements worked on side by side (default: one for each processor).");

  private final Given<String> shard =
      usage.option(
          "--shard",
          "K/N",
          String.class,
          null,
          "Do the K-th of N parts of the work only; the index is then left alone.");

  private final Given<Boolean> indexOnly =
      usage.flag("--index-only", "Only make the index anew from what is in the archive.");

  private final ChoiceOptions choices = new ChoiceOptions(usage);

  private final Given<Units> units =
      usage.option(
          "--units",
          "si|us",
          Units.class,
          Units.SI,
          "Units of the pages: SI or US customary (default: si).");

  private final Given<Boolean> json = usage.flag("--json", "Print the summary as JSON.");

  private final Given<Boolean> quiet = usage.flag("--quiet", "No progress; failures still appear.");

  @Override
  public Usage usage() {
    return usage;
  }

  @Override
  public Integer call() throws UnusableInput, IOException {
    choices.applyTo(Settings.defaults());
    Plan plan = plan();
    Shard part = part();
    try {
      if (indexOnly.value()) {
        Index.write(target.value());
        return ExitCode.DONE;
      }
      Finder finder = find();
      List<Found> found = part.of(finder.found());
      ArchiveProgress progress = new ArchiveProgress(found, quiet.value(), usage.err());
      try (progress) {
        finder.troubles().forEach(progress::trouble);
        new ArchiveRun(plan, progress).keep(found);
        if (shard.value() == null) {
          Index.write(target.value());
        }
      }
      print(progress);
      return progress.failed() > 0 ? ExitCode.FAULTS_FOUND : ExitCode.DONE;
    } catch (CannotKeep trouble) {
      throw new CannotWrite(target.value().toString(), trouble.getMessage());
    }
  }

  private Shard part() {
    try {
      return shard.value() == null ? Shard.WHOLE : Shard.parse(shard.value());
    } catch (IllegalArgumentException wrong) {
      throw usage.wrong(wrong.getMessage());
    }
  }

  private Plan plan() {
    try {
      return new Plan(
          target.value(),
          EnumSet.copyOf(kinds.value()),
          units.value(),
          jobs.value(),
          choices.asJson());
    } catch (IllegalArgumentException wrong) {
      throw usage.wrong(wrong.getMessage());
    }
  }

  private Finder find() throws IOException {
    if (roots.value().isEmpty() == (from.value() == null)) {
      throw usage.wrong("Give folders to look through, or a list with --from");
    }
    Finder finder = new Finder();
    if (from.value() == null) {
      finder.look(roots.value());
    } else {
      finder.take(list());
    }
    return finder;
  }

  private List<String> list() throws IOException {
    List<String> folders = new ArrayList<>();
    try (BufferedReader lines =
        from.value().equals("-")
            ? new BufferedReader(new InputStreamReader(System.in, StandardCharsets.UTF_8))
            : Files.newBufferedReader(Path.of(from.value()))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        if (!line.isBlank()) {
          folders.add(line);
        }
      }
    }
    return folders;
  }

  private void print(ArchiveProgress progress) throws IOException {
    PrintWriter out = usage.out();
    if (json.value()) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      try (JsonText text = new JsonText(bytes)) {
        text.object(
            () -> {
              text.text("format", "crossreach-archive/1");
              text.text("target", target.value().toString());
              text.whole("done", progress.done());
              text.whole("unchanged", progress.unchanged());
              text.whole("failed", progress.failed());
              text.whole("passes", progress.passes());
              text.texts("failures", progress.failures());
            });
      }
      out.print(bytes.toString(StandardCharsets.UTF_8));
    } else {
      out.println(
          progress.done()
              + " done, "
              + progress.unchanged()
              + " unchanged, "
              + progress.failed()
              + " failed; "
              + progress.passes()
              + " passes in "
              + target.value());
    }
    out.flush();
  }
}
