package org.crossreach.report.pdf;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.EnsemblesCsv;
import org.crossreach.report.OutputFolder;
import org.crossreach.report.PassesCsv;
import org.crossreach.report.result.ResultJson;

/** The tables behind the pages, so that one file is enough to do the sums again. */
public final class Enclosures {

  private static final String JSON = "application/json";
  private static final String CSV = "text/csv";

  private Enclosures() {}

  /** The result, and the ensembles of one pass. */
  public static List<Attachment> of(Result result, PassDischarge pass) throws IOException {
    return List.of(
        result(result),
        new Attachment(
            pass.pass().name() + ".ensembles.csv",
            CSV,
            Attachment.Relation.DATA,
            "Every ensemble of the pass, from the record to its discharge",
            bytes(target -> EnsemblesCsv.write(pass, target))));
  }

  /** The result, and the table of its passes. */
  public static List<Attachment> of(Result result) throws IOException {
    return List.of(
        result(result),
        new Attachment(
            "passes.csv",
            CSV,
            Attachment.Relation.DATA,
            "The passes as a table",
            bytes(target -> PassesCsv.write(result, target))));
  }

  private static Attachment result(Result result) throws IOException {
    return new Attachment(
        OutputFolder.MARK,
        JSON,
        Attachment.Relation.DATA,
        "The whole result, with every effective setting",
        bytes(target -> ResultJson.write(result, target)));
  }

  private static byte[] bytes(OutputFolder.Product product) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    product.write(bytes);
    return bytes.toByteArray();
  }
}
