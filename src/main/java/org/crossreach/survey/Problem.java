package org.crossreach.survey;

/**
 * One thing wrong with an input, with its place and what to do.
 *
 * @param file the file, as the user knows it
 * @param line line in the file, from 1; 0 when the problem has no line
 * @param place column name of a table or path in a JSON file, for example {@code
 *     passes[0].start_bank}; empty when the problem has none
 * @param found what was found, as a phrase, for example {@code "0,25"}
 * @param expected what was expected, as a phrase, for example {@code a number}
 * @param remedy what to do, as an imperative phrase; may be empty
 */
public record Problem(
    String file, int line, String place, String found, String expected, String remedy) {

  /**
   * The problem as one line, for example {@code pass-01.csv:118, cell_size_m: found "0,25",
   * expected a number; use a decimal point}.
   */
  @Override
  public String toString() {
    return file
        + (line > 0 ? ":" + line : "")
        + (place.isEmpty() ? "" : ", " + place)
        + ": found "
        + found
        + ", expected "
        + expected
        + (remedy.isEmpty() ? "" : "; " + remedy);
  }
}
