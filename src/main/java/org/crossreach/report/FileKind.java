package org.crossreach.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.chart.Charts;
import org.crossreach.report.chart.Picture;
import org.crossreach.report.chart.PictureFile;
import org.crossreach.report.pdf.Enclosures;
import org.crossreach.report.pdf.MeasurementPdf;
import org.crossreach.report.pdf.PdfOptions;
import org.crossreach.report.pdf.TransectPdf;
import org.crossreach.report.result.ResultJson;
import org.crossreach.settings.Choice;

/** A kind of file that a result can be written to; a new kind is one more constant here. */
public enum FileKind implements Choice {
  /** The whole result. */
  JSON("json") {
    @Override
    public List<OutputFile> files(Result result, Units units) {
      return List.of(new OutputFile(OutputFolder.MARK, target -> ResultJson.write(result, target)));
    }
  },
  /** The passes as one table, and the ensembles of each pass as another. */
  CSV("csv") {
    @Override
    public List<OutputFile> files(Result result, Units units) {
      List<OutputFile> files = new ArrayList<>();
      files.add(new OutputFile("passes.csv", target -> PassesCsv.write(result, target)));
      for (PassDischarge pass : result.reduction().passes()) {
        files.add(
            new OutputFile(
                pass.pass().name() + ".ensembles.csv", target -> EnsemblesCsv.write(pass, target)));
      }
      return files;
    }
  },
  /** Pages to keep: one PDF for each pass and one for the measurement. */
  PDF("pdf") {
    @Override
    public List<OutputFile> files(Result result, Units units) {
      List<OutputFile> files = new ArrayList<>();
      PdfOptions options = PdfOptions.defaults().withUnits(units);
      files.add(
          new OutputFile(
              "measurement.pdf",
              target ->
                  MeasurementPdf.write(
                      result, options.withAttachments(Enclosures.of(result)), target)));
      for (PassDischarge pass : result.reduction().passes()) {
        files.add(
            new OutputFile(
                pass.pass().name() + ".pdf",
                target ->
                    TransectPdf.write(
                        result,
                        pass,
                        options.withAttachments(Enclosures.of(result, pass)),
                        target)));
      }
      return files;
    }
  },
  /** Every picture as pixels. */
  PNG("png") {
    @Override
    public List<OutputFile> files(Result result, Units units) {
      return pictures(result, units, "png", PictureFile::png);
    }
  },
  /** Every picture as lines. */
  SVG("svg") {
    @Override
    public List<OutputFile> files(Result result, Units units) {
      return pictures(result, units, "svg", PictureFile::svg);
    }
  };

  private static List<OutputFile> pictures(
      Result result, Units units, String ending, Function<PictureFile, byte[]> format) {
    List<OutputFile> files = new ArrayList<>();
    for (Picture each : Charts.ofMeasurement(result, units)) {
      files.add(picture("", each, ending, format));
    }
    for (PassDischarge pass : result.reduction().passes()) {
      for (Picture each : Charts.ofPass(result, pass, units)) {
        files.add(picture(pass.pass().name() + ".", each, ending, format));
      }
    }
    return files;
  }

  private static OutputFile picture(
      String prefix, Picture picture, String ending, Function<PictureFile, byte[]> format) {
    return new OutputFile(
        prefix + picture.name() + "." + ending,
        target -> target.write(format.apply(new PictureFile(picture))));
  }

  private final String key;

  FileKind(String key) {
    this.key = key;
  }

  /**
   * A file to be written.
   *
   * @param name its name
   * @param product what it holds
   */
  public record OutputFile(String name, OutputFolder.Product product) {}

  /** The files of this kind for a result; those for people are in the reader's units. */
  public abstract List<OutputFile> files(Result result, Units units);

  @Override
  public String key() {
    return key;
  }

  /**
   * Writes the files of this kind.
   *
   * @param result the result
   * @param units the reader's units
   * @param folder receives them
   */
  public void write(Result result, Units units, OutputFolder folder) throws IOException {
    for (OutputFile file : files(result, units)) {
      folder.write(file.name(), file.product());
    }
  }
}
