package org.crossreach.survey;

import java.util.List;
import java.util.stream.Collectors;

/** Thrown when an input cannot be used; carries every problem that was found. */
public final class UnusableInput extends Exception {

  private static final long serialVersionUID = 1L;

  private final transient List<Problem> problems;

  /**
   * Collects what was found.
   *
   * @param problems at least one
   */
  public UnusableInput(List<Problem> problems) {
    super(problems.stream().map(Problem::toString).collect(Collectors.joining("\n")));
    this.problems = List.copyOf(problems);
  }

  /** The problems, in the order in which they were found. */
  public List<Problem> problems() {
    return problems;
  }
}
