package org.crossreach.archive;

import java.util.List;

/**
 * What became of one measurement.
 *
 * @param place its place in the archive
 * @param kind whether it was reduced, was there already, or failed
 * @param passes number of its passes that were reduced
 * @param problems why it failed, one line each
 */
public record Outcome(String place, Kind kind, int passes, List<String> problems) {

  public Outcome {
    problems = List.copyOf(problems);
  }

  /** What became of it. */
  public enum Kind {
    /** Its results were made. */
    DONE,
    /** Its results were there, made from the same bytes by the same plan and program. */
    UNCHANGED,
    /** Nothing could be made of it. */
    FAILED
  }
}
