package org.crossreach.cli;

import java.nio.file.Path;
import org.crossreach.report.Units;
import picocli.CommandLine.Option;

/** The options that every command shares; a command takes them in with {@code @Mixin}. */
final class OutputOptions {

  @Option(
      names = "--json",
      order = 90,
      description = "Print the result as JSON, for machines; always in SI units.")
  boolean json;

  @Option(
      names = "--units",
      order = 91,
      paramLabel = "si|us",
      defaultValue = "si",
      description = "Units of tables and reports: SI or US customary (default: si).")
  Units units;

  @Option(
      names = "--out",
      order = 92,
      paramLabel = "DIR",
      description = "Write the files of the result into this folder.")
  Path out;

  @Option(
      names = "--quiet",
      order = 93,
      description = "No progress and no remarks on standard error; errors still appear.")
  boolean quiet;
}
