package org.crossreach.survey;

import java.util.List;

/**
 * One crossing of the river.
 *
 * @param name name of the pass: its file's name without folder and endings, for example {@code
 *     pass-01}
 * @param file file that holds its ensembles, relative to the measurement's folder
 * @param startBank bank from which the boat started
 * @param used whether the pass counts in the measurement's discharge
 * @param note why it does not count, or any remark; may be empty
 * @param leftEdge unmeasured water at the left bank
 * @param rightEdge unmeasured water at the right bank
 * @param ensembles what the instrument recorded
 * @param notes what the importer had to say about the file, may be empty
 */
public record Pass(
    String name,
    String file,
    Bank startBank,
    boolean used,
    String note,
    Edge leftEdge,
    Edge rightEdge,
    Ensembles ensembles,
    List<Note> notes) {

  public Pass {
    notes = List.copyOf(notes);
  }

  /** The same pass, used or not. */
  public Pass withUse(boolean use, String why) {
    return new Pass(name, file, startBank, use, why, leftEdge, rightEdge, ensembles, notes);
  }
}
