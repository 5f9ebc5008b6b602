package org.crossreach.report;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.crossreach.notation.JsonText;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.MovingBedTest;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Problem;

/**
 * What reading a measurement's folder showed.
 *
 * @param measurement what was read, empty when there are problems
 * @param problems everything that is wrong, in the order in which it was found
 */
public record CheckReport(Optional<Measurement> measurement, List<Problem> problems) {

  /** Name and version of the JSON. */
  public static final String FORMAT = "crossreach-check/1";

  public CheckReport {
    problems = List.copyOf(problems);
  }

  /** A remark with the file that it is about. */
  private record Remark(String file, Note note) {}

  /** The list for a person, one line for each problem or remark and their count at the end. */
  public String text() {
    StringBuilder text = new StringBuilder();
    for (Problem problem : problems) {
      text.append(problem).append('\n');
    }
    for (Remark remark : remarks()) {
      text.append(remark.file())
          .append(": ")
          .append(level(remark.note()))
          .append(": ")
          .append(remark.note().text())
          .append('\n');
    }
    if (measurement.isPresent()) {
      text.append(measurement.get().id()).append(": ").append(contents()).append(", ");
    }
    return text.append(counted(problems.size(), "problem")).append('\n').toString();
  }

  private String contents() {
    int ensembles = 0;
    for (Pass pass : measurement.orElseThrow().passes()) {
      ensembles += pass.ensembles().size();
    }
    int tests = measurement.get().movingBedTests().size();
    return counted(measurement.get().passes().size(), "pass", "passes")
        + ", "
        + counted(ensembles, "ensemble")
        + (tests > 0 ? ", " + counted(tests, "moving-bed test") : "");
  }

  /** A number with its noun, for example {@code 1 problem} or {@code 3 problems}. */
  public static String counted(int count, String one) {
    return counted(count, one, one + "s");
  }

  private static String counted(int count, String one, String many) {
    return count + " " + (count == 1 ? one : many);
  }

  /**
   * Writes the same as JSON.
   *
   * @param target receives UTF-8; it is left open
   */
  public void writeJson(OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      json.object(
          () -> {
            json.text("format", FORMAT);
            if (measurement.isPresent()) {
              json.text("measurement", measurement.get().id());
            } else {
              json.nothing("measurement");
            }
            json.objects("problems", problems, problem -> members(problem, json));
            json.objects(
                "notes",
                remarks(),
                remark -> {
                  json.text("file", remark.file());
                  json.text("level", level(remark.note()));
                  json.text("code", remark.note().code());
                  json.text("text", remark.note().text());
                });
          });
    }
  }

  private static void members(Problem problem, JsonText json) throws IOException {
    json.text("file", problem.file());
    json.whole("line", problem.line());
    json.text("place", problem.place());
    json.text("found", problem.found());
    json.text("expected", problem.expected());
    json.text("remedy", problem.remedy());
  }

  private static String level(Note note) {
    return note.level().name().toLowerCase(Locale.ROOT);
  }

  private List<Remark> remarks() {
    List<Remark> remarks = new ArrayList<>();
    if (measurement.isPresent()) {
      for (Pass pass : measurement.get().passes()) {
        pass.notes().forEach(note -> remarks.add(new Remark(pass.file(), note)));
      }
      for (MovingBedTest test : measurement.get().movingBedTests()) {
        test.notes().forEach(note -> remarks.add(new Remark(test.file(), note)));
      }
    }
    return remarks;
  }
}
