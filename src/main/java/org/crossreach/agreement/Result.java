package org.crossreach.agreement;

import java.util.stream.Stream;
import org.crossreach.discharge.Reduction;
import org.crossreach.survey.Note;

/**
 * The result of a measurement: its reduction and how well the passes agree.
 *
 * @param reduction the discharge of each pass
 * @param summary the used passes taken together
 */
public record Result(Reduction reduction, Summary summary) {

  /** Completes a reduction. */
  public static Result of(Reduction reduction) {
    return new Result(reduction, Summary.of(reduction.used(), reduction.notes()));
  }

  /** Whether a used pass or the measurement carries a note of level fault. */
  public boolean hasFault() {
    return Stream.concat(
            reduction.used().stream().flatMap(pass -> pass.notes().stream()),
            summary.notes().stream())
        .anyMatch(note -> note.level() == Note.Level.FAULT);
  }
}
