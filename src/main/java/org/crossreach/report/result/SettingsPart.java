package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;
import org.crossreach.report.SettingsJson;

/** Every effective choice. */
final class SettingsPart implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    json.object("settings", () -> SettingsJson.members(result.reduction().settings(), json));
  }
}
