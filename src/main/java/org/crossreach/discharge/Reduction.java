package org.crossreach.discharge;

import java.util.List;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;

/**
 * A reduced measurement.
 *
 * @param measurement what was recorded
 * @param settings the effective choices
 * @param passes the discharge of each pass that could be reduced, in the order of the record
 * @param notes what is to be said about the reduction as a whole
 */
public record Reduction(
    Measurement measurement, Settings settings, List<PassDischarge> passes, List<Note> notes) {

  public Reduction {
    passes = List.copyOf(passes);
    notes = List.copyOf(notes);
  }

  /** The passes on their lines, as they were before laws and exponent were chosen. */
  public LaidMeasurement laid() {
    return new LaidMeasurement(
        measurement,
        passes.stream().map(each -> new LaidPass(each.pass(), each.section())).toList(),
        notes);
  }

  /** The passes that count in the measurement's discharge. */
  public List<PassDischarge> used() {
    return passes.stream().filter(each -> each.pass().used()).toList();
  }
}
