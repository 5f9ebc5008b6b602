package org.crossreach.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import picocli.CommandLine.ParameterException;

/** The options that say which passes count. */
final class PassOptions {

  private final Usage usage;
  private final Given<Map<String, String>> leaveOut;
  private final Given<List<String>> use;

  PassOptions(Usage usage) {
    this.usage = usage;
    leaveOut =
        usage.pairs(
            "--leave-out", "PASS=REASON", "Leave a pass out, with the reason; may be repeated.");
    use =
        usage.options(
            "--use",
            "PASS",
            String.class,
            "Use a pass that the record leaves out; may be repeated.");
  }

  /**
   * The measurement with these passes left out and used.
   *
   * @throws ParameterException when there is no pass of that name, or a reason is missing
   */
  Measurement applyTo(Measurement measurement) {
    List<String> names = measurement.passes().stream().map(Pass::name).toList();
    List<String> asked = new ArrayList<>(leaveOut.value().keySet());
    asked.addAll(use.value());
    for (String name : asked) {
      if (!names.contains(name)) {
        throw usage.wrong("There is no pass '" + name + "'; there are " + String.join(", ", names));
      }
    }
    List<Pass> passes = new ArrayList<>();
    for (Pass pass : measurement.passes()) {
      String reason = leaveOut.value().get(pass.name());
      if (reason != null && reason.isBlank()) {
        throw usage.wrong("Say why '" + pass.name() + "' is left out: --leave-out PASS=REASON");
      }
      if (reason != null) {
        passes.add(pass.withUse(false, reason));
      } else if (use.value().contains(pass.name())) {
        passes.add(pass.withUse(true, pass.note()));
      } else {
        passes.add(pass);
      }
    }
    return measurement.withPasses(passes);
  }
}
