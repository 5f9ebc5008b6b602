package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import org.crossreach.report.FileKind;
import org.crossreach.report.OutputFolder;
import org.crossreach.report.Units;

/** The options of commands that print a result or write it to files. */
final class OutputOptions {

  private static final Path DEFAULT_OUT = Path.of("reports");

  private final Usage usage;
  private final Given<Boolean> json;
  private final Given<Units> units;
  private final Given<Path> out;
  private final Given<Boolean> quiet;

  /** Writes a result as files of one kind. */
  interface KindWriter {
    void write(FileKind kind, OutputFolder files) throws IOException;
  }

  OutputOptions(Usage usage) {
    this.usage = usage;
    json = usage.flag("--json", "Print the result as JSON, for machines; always in SI units.");
    units =
        usage.option(
            "--units",
            "si|us",
            Units.class,
            Units.SI,
            "Units of tables and reports: SI or US customary (default: si).");
    out =
        usage.option(
            "--out", "DIR", Path.class, null, "Write the files of the result into this folder.");
    quiet =
        usage.flag("--quiet", "No progress and no remarks on standard error; errors still appear.");
  }

  boolean json() {
    return json.value();
  }

  Units units() {
    return units.value();
  }

  /** Whether files are asked for, by their kinds or by a folder. */
  boolean wantsFiles(List<FileKind> kinds) {
    return out.value() != null || !kinds.isEmpty();
  }

  /**
   * Writes the files of a result into its own folder, and says so.
   *
   * @param id names the folder
   * @param kinds what is asked for beside JSON; none stands for CSV
   * @param writer writes them
   */
  void write(String id, List<FileKind> kinds, KindWriter writer) throws CannotWrite {
    Path root = out.value() == null ? DEFAULT_OUT : out.value();
    Path target = root.resolve(id);
    EnumSet<FileKind> wanted = EnumSet.of(FileKind.JSON);
    wanted.addAll(kinds.isEmpty() ? List.of(FileKind.CSV) : kinds);
    CannotWrite.unless(
        target,
        () -> {
          OutputFolder files = OutputFolder.claim(target);
          for (FileKind kind : wanted) {
            writer.write(kind, files);
          }
        });
    remark("written to " + target);
  }

  /** Says something beside the result, unless it should be quiet. */
  void remark(String text) {
    if (!quiet.value()) {
      usage.err().println(text);
    }
  }
}
