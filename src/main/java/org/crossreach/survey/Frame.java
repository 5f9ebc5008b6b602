package org.crossreach.survey;

/** The axes in which the velocities of a record stand, as its column names tell. */
public enum Frame {
  /** East, north (of the compass), up, error. */
  EARTH,
  /** Starboard, forward, up, error: levelled, not turned. */
  SHIP,
  /** x starboard, y forward, z up, error: tilting with the boat. */
  INSTRUMENT,
  /** Radial velocity of beams 1 to 4, positive towards the transducer. */
  BEAM
}
