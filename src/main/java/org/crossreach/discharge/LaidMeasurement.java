package org.crossreach.discharge;

import java.util.List;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;

/**
 * A measurement whose passes are screened and laid on their lines, ready to be integrated by any
 * choice of laws, exponent and method.
 *
 * @param measurement what was recorded
 * @param passes the passes that could be laid, in the order of the record
 * @param notes what is to be said about those that could not
 */
public record LaidMeasurement(Measurement measurement, List<LaidPass> passes, List<Note> notes) {

  public LaidMeasurement {
    passes = List.copyOf(passes);
    notes = List.copyOf(notes);
  }
}
