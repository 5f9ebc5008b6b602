package org.crossreach.profile;

/** A part of a column's height. */
public enum Zone {
  /** From the highest usable cell to the surface. */
  TOP,
  /** From the highest to the lowest usable cell, gaps between them filled in. */
  MEASURED,
  /** From the lowest usable cell to the bed. */
  BOTTOM
}
