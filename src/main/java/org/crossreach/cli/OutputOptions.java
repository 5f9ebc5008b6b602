package org.crossreach.cli;

import java.nio.file.Path;
import org.crossreach.report.Units;

/** The options of commands that print a result or write it to files. */
final class OutputOptions {

  private final Given<Boolean> json;
  private final Given<Units> units;
  private final Given<Path> out;
  private final Given<Boolean> quiet;

  OutputOptions(Usage usage) {
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

  /** The folder for files, or null. */
  Path out() {
    return out.value();
  }

  boolean quiet() {
    return quiet.value();
  }
}
