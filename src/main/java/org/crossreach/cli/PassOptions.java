package org.crossreach.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import picocli.CommandLine;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** The options that say which passes count. */
final class PassOptions {

  @Option(
      names = "--leave-out",
      order = 50,
      paramLabel = "PASS=REASON",
      description = "Leave a pass out, with the reason; may be repeated.")
  private Map<String, String> leaveOut = new LinkedHashMap<>();

  @Option(
      names = "--use",
      order = 51,
      paramLabel = "PASS",
      description = "Use a pass that the record leaves out; may be repeated.")
  private List<String> use = new ArrayList<>();

  /**
   * The measurement with these passes left out and used.
   *
   * @throws ParameterException when there is no pass of that name, or a reason is missing
   */
  Measurement applyTo(Measurement measurement, CommandLine command) {
    List<String> names = measurement.passes().stream().map(Pass::name).toList();
    List<String> asked = new ArrayList<>(leaveOut.keySet());
    asked.addAll(use);
    for (String name : asked) {
      if (!names.contains(name)) {
        throw new ParameterException(
            command, "There is no pass '" + name + "'; there are " + String.join(", ", names));
      }
    }
    List<Pass> passes = new ArrayList<>();
    for (Pass pass : measurement.passes()) {
      String reason = leaveOut.get(pass.name());
      if (reason != null && reason.isBlank()) {
        throw new ParameterException(
            command, "Say why '" + pass.name() + "' is left out: --leave-out PASS=REASON");
      }
      if (reason != null) {
        passes.add(pass.withUse(false, reason));
      } else if (use.contains(pass.name())) {
        passes.add(pass.withUse(true, pass.note()));
      } else {
        passes.add(pass);
      }
    }
    return measurement.withPasses(passes);
  }
}
