package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;

/** One or more members of the outermost object of the result JSON. */
interface ResultPart {
  void write(Result result, JsonText json) throws IOException;
}
