package org.crossreach.survey;

/**
 * A remark of the program about a pass or a measurement.
 *
 * @param level how much it matters
 * @param code short name of the kind of remark, lower case with hyphens, for example {@code
 *     lost-bottom-track}
 * @param text one sentence for a person, with the figures
 */
public record Note(Level level, String code, String text) {

  /** How much a remark matters. */
  public enum Level {
    /** Worth knowing. */
    NOTE,
    /** Look before the result is used. */
    CAUTION,
    /** The result, or a part of it, should not be used as it is. */
    FAULT
  }
}
