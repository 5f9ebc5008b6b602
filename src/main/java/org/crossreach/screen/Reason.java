package org.crossreach.screen;

/**
 * Why a sample is not used. A sample carries the first reason that applies, in the order of the
 * constants; {@link #NONE} means that it is used.
 */
public enum Reason {
  /** Nothing speaks against the sample. */
  NONE("none"),
  /** The ensemble has fewer cells. */
  NO_CELL("no-cell"),
  /** The cell reaches below the limit where side lobes return from the bed. */
  SIDE_LOBE("side-lobe"),
  /** No value was recorded. */
  MISSING("missing");

  private static final Reason[] VALUES = values();

  private final String key;

  Reason(String key) {
    this.key = key;
  }

  /** Name of the reason in results, lower case with hyphens. */
  public String key() {
    return key;
  }

  /** The reason with a given ordinal. */
  static Reason of(byte ordinal) {
    return VALUES[ordinal];
  }
}
