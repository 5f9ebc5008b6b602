package org.crossreach.report.comparison;

import java.io.IOException;
import java.util.List;
import java.util.Set;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.FileKind;
import org.crossreach.report.OutputFolder;
import org.crossreach.report.Units;
import org.crossreach.report.chart.Charts;
import org.crossreach.report.chart.Picture;
import org.crossreach.report.chart.PictureFile;

/** Writes a comparison of laws as files of the kinds that are asked for. */
public final class ComparisonFiles {

  /** The kinds of file there are; there are no pages of a comparison. */
  public static final Set<FileKind> KINDS =
      Set.of(FileKind.JSON, FileKind.CSV, FileKind.PNG, FileKind.SVG);

  private ComparisonFiles() {}

  /**
   * Writes the files of one kind.
   *
   * @param comparison what is written
   * @param kind one of {@link #KINDS}
   * @param units the reader's units
   * @param folder receives them
   */
  public static void write(Comparison comparison, FileKind kind, Units units, OutputFolder folder)
      throws IOException {
    switch (kind) {
      case JSON ->
          folder.write(
              ComparisonJson.FILE, target -> ComparisonJson.write(List.of(comparison), target));
      case CSV ->
          folder.write(
              ComparisonCsv.FILE, target -> ComparisonCsv.write(List.of(comparison), target));
      case PNG -> {
        for (Picture each : Charts.ofComparison(comparison, units)) {
          folder.write(each.name() + ".png", target -> target.write(new PictureFile(each).png()));
        }
      }
      case SVG -> {
        for (Picture each : Charts.ofComparison(comparison, units)) {
          folder.write(each.name() + ".svg", target -> target.write(new PictureFile(each).svg()));
        }
      }
      case PDF -> throw new IllegalArgumentException("kind: a comparison has no pdf");
    }
  }
}
