package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;
import org.crossreach.report.ProgramVersion;
import org.crossreach.survey.InputFile;

/** What made the result, and out of which files. */
final class ProgramPart implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    ProgramVersion.write(ProgramVersion.read(), json);
    json.objects(
        "inputs",
        result.reduction().measurement().inputs(),
        (InputFile input) -> {
          json.text("file", input.file());
          json.text("sha256", input.sha256());
        });
  }
}
