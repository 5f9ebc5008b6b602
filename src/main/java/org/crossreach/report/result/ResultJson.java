package org.crossreach.report.result;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;

/** Writes the result of a measurement as JSON. */
public final class ResultJson {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-result/1";

  /** The parts, in the order of the file; a new part of the result is one more line here. */
  private static final List<ResultPart> PARTS =
      List.of(
          new ProgramPart(),
          new MeasurementPart(),
          new SettingsPart(),
          new PassesPart(),
          new SummaryPart(),
          new LaterParts());

  private ResultJson() {}

  /**
   * Writes a result.
   *
   * @param result the result
   * @param target receives UTF-8; it is left open
   */
  public static void write(Result result, OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      json.object(
          () -> {
            json.text("format", FORMAT);
            for (ResultPart part : PARTS) {
              part.write(result, json);
            }
          });
    }
  }
}
