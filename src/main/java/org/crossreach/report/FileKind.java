package org.crossreach.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.result.ResultJson;
import org.crossreach.settings.Choice;

/** A kind of file that a result can be written to; a new kind is one more constant here. */
public enum FileKind implements Choice {
  /** The whole result. */
  JSON("json") {
    @Override
    List<OutputFile> files(Result result) {
      return List.of(new OutputFile(OutputFolder.MARK, target -> ResultJson.write(result, target)));
    }
  },
  /** The passes as one table, and the ensembles of each pass as another. */
  CSV("csv") {
    @Override
    List<OutputFile> files(Result result) {
      List<OutputFile> files = new ArrayList<>();
      files.add(new OutputFile("passes.csv", target -> PassesCsv.write(result, target)));
      for (PassDischarge pass : result.reduction().passes()) {
        files.add(
            new OutputFile(
                pass.pass().name() + ".ensembles.csv", target -> EnsemblesCsv.write(pass, target)));
      }
      return files;
    }
  };

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
  record OutputFile(String name, OutputFolder.Product product) {}

  /** The files of this kind for a result. */
  abstract List<OutputFile> files(Result result);

  @Override
  public String key() {
    return key;
  }

  /**
   * Writes the files of this kind.
   *
   * @param result the result
   * @param folder receives them
   */
  public void write(Result result, OutputFolder folder) throws IOException {
    for (OutputFile file : files(result)) {
      folder.write(file.name(), file.product());
    }
  }
}
