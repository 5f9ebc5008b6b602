package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;

/**
 * Parts of the format that this version does not compute: moving-bed tests, uncertainty budget,
 * rating check. Each is {@code null}, as {@code formats/result.md} says.
 */
final class LaterParts implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    json.nothing("moving_bed");
    json.nothing("uncertainty");
    json.nothing("rating");
  }
}
