package org.crossreach.survey;

/**
 * A test for a bed that moves under the boat.
 *
 * @param kind how the boat was moved
 * @param file file that holds its ensembles, relative to the measurement's folder
 * @param ensembles what the instrument recorded
 */
public record MovingBedTest(Kind kind, String file, Ensembles ensembles) {

  /** How the boat was moved during the test. */
  public enum Kind {
    /** From a point at one bank across the river and back to the same point. */
    LOOP,
    /** Held in one place. */
    STATIONARY
  }
}
