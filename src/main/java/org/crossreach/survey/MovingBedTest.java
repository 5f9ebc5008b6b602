package org.crossreach.survey;

import java.util.List;

/**
 * A test for a bed that moves under the boat.
 *
 * @param kind how the boat was moved
 * @param file file that holds its ensembles, relative to the measurement's folder
 * @param ensembles what the instrument recorded
 * @param notes what the importer had to say about the file, may be empty
 */
public record MovingBedTest(Kind kind, String file, Ensembles ensembles, List<Note> notes) {

  public MovingBedTest {
    notes = List.copyOf(notes);
  }

  /** How the boat was moved during the test. */
  public enum Kind {
    /** From a point at one bank across the river and back to the same point. */
    LOOP,
    /** Held in one place. */
    STATIONARY
  }
}
