package org.crossreach.agreement;

import org.crossreach.discharge.Reduction;

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
}
