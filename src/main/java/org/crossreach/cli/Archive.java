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
import java.util.concurrent.Callable;
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
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Keeps every measurement it finds: reports, tables, manifests and one index. */
@Command(
    name = "archive",
    description =
        "Find measurements, keep the reports and tables of each, and an index of all; what is kept"
            + " already is not done again.")
final class Archive implements Callable<Integer> {

  @Parameters(
      arity = "0..*",
      paramLabel = "ROOT",
      description = "Folders to look through for measurements.")
  private List<Path> roots = List.of();

  @Option(
      names = "--from",
      order = 1,
      paramLabel = "FILE",
      description = "Take the measurement folders from a list, one in a line; - is standard input.")
  private String from;

  @Option(
      names = "--out",
      order = 2,
      paramLabel = "DIR",
      defaultValue = "reports",
      description = "Folder of the archive (default: reports).")
  private Path target;

  @Option(
      names = "--write",
      order = 3,
      split = ",",
      paramLabel = "KIND",
      description =
          "Kinds of files, with commas between them: json, csv, pdf, png, svg (default:"
              + " json,csv,pdf).")
  private List<FileKind> kinds = List.of(FileKind.CSV, FileKind.PDF);

  @Option(
      names = "--jobs",
      order = 4,
      paramLabel = "N",
      description = "Measurements worked on side by side (default: one for each processor).")
  private int jobs = Runtime.getRuntime().availableProcessors();

  @Option(
      names = "--shard",
      order = 5,
      paramLabel = "K/N",
      description = "Do the K-th of N parts of the work only; the index is then left alone.")
  private String shard;

  @Option(
      names = "--index-only",
      order = 6,
      description = "Only make the index anew from what is in the archive.")
  private boolean indexOnly;

  @Mixin private ChoiceOptions choices;

  @Option(
      names = "--units",
      order = 80,
      paramLabel = "si|us",
      defaultValue = "si",
      description = "Units of the pages: SI or US customary (default: si).")
  private Units units;

  @Option(names = "--json", order = 90, description = "Print the summary as JSON.")
  private boolean json;

  @Option(names = "--quiet", order = 93, description = "No progress; failures still appear.")
  private boolean quiet;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws UnusableInput, IOException {
    choices.applyTo(Settings.defaults());
    Plan plan = plan();
    Shard part = part();
    try {
      if (indexOnly) {
        Index.write(target);
        return ExitCode.DONE;
      }
      Finder finder = find();
      List<Found> found = part.of(finder.found());
      ArchiveProgress progress = new ArchiveProgress(found, quiet, spec.commandLine().getErr());
      try (progress) {
        finder.troubles().forEach(progress::trouble);
        new ArchiveRun(plan, progress).keep(found);
        if (shard == null) {
          Index.write(target);
        }
      }
      print(progress);
      return progress.failed() > 0 ? ExitCode.FAULTS_FOUND : ExitCode.DONE;
    } catch (CannotKeep trouble) {
      throw new CannotWrite(target.toString(), trouble.getMessage());
    }
  }

  private Shard part() {
    try {
      return shard == null ? Shard.WHOLE : Shard.parse(shard);
    } catch (IllegalArgumentException wrong) {
      throw new ParameterException(spec.commandLine(), wrong.getMessage());
    }
  }

  private Plan plan() {
    try {
      return new Plan(target, EnumSet.copyOf(kinds), units, jobs, choices.asJson());
    } catch (IllegalArgumentException wrong) {
      throw new ParameterException(spec.commandLine(), wrong.getMessage());
    }
  }

  private Finder find() throws IOException {
    if (roots.isEmpty() == (from == null)) {
      throw new ParameterException(
          spec.commandLine(), "Give folders to look through, or a list with --from");
    }
    Finder finder = new Finder();
    if (from == null) {
      finder.look(roots);
    } else {
      finder.take(list());
    }
    return finder;
  }

  private List<String> list() throws IOException {
    List<String> folders = new ArrayList<>();
    try (BufferedReader lines =
        from.equals("-")
            ? new BufferedReader(new InputStreamReader(System.in, StandardCharsets.UTF_8))
            : Files.newBufferedReader(Path.of(from))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        if (!line.isBlank()) {
          folders.add(line);
        }
      }
    }
    return folders;
  }

  private void print(ArchiveProgress progress) throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (json) {
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      try (JsonText text = new JsonText(bytes)) {
        text.object(
            () -> {
              text.text("format", "crossreach-archive/1");
              text.text("target", target.toString());
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
              + target);
    }
    out.flush();
  }
}
