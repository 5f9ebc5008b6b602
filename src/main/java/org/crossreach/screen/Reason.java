package org.crossreach.screen;

/**
 * Why a sample is not used. A sample carries the first reason that applies, in the order of the
 * constants; {@link #NONE} means that it is used.
 *
 * <p>The same reasons serve for the cells of the water, the bottom-track velocity and the depth of
 * an ensemble; each says which of them can carry it.
 */
public enum Reason {
  /** Nothing speaks against the sample. */
  NONE("none"),
  /** Cell: the ensemble has fewer cells. */
  NO_CELL("no-cell"),
  /** Cell: the ensemble was left out by hand. */
  EXCLUDED("excluded"),
  /** Cell: it reaches below the limit where side lobes return from the bed. */
  SIDE_LOBE("side-lobe"),
  /** Cell: it reaches into the water near the surface that is to be left out. */
  NEAR_SURFACE("near-surface"),
  /** Cell, bottom track, depth: no value was recorded, or too few beams for one. */
  MISSING("missing"),
  /** Cell, bottom track: it rests on three beams, which are not accepted. */
  THREE_BEAM("three-beam"),
  /** Cell: too few of the pings were used. */
  GOOD_PCT("good-pct"),
  /** Cell: the correlation is too low. */
  CORRELATION("correlation"),
  /** Cell: the echo is too weak. */
  INTENSITY("intensity"),
  /** Cell, bottom track: the beams disagree. */
  ERROR_VELOCITY("error-velocity"),
  /** Cell, bottom track: the vertical velocity stands apart. */
  VERTICAL_VELOCITY("vertical-velocity"),
  /** Cell: it stands apart from its neighbours in time and depth. */
  SPIKE("spike"),
  /** Bottom track: it stands apart from its neighbours in time. */
  BOAT_SPEED("boat-speed"),
  /** Depth: every beam that has one stands apart from its neighbours and the other beams. */
  DEPTH_BEAMS("depth-beams"),
  /** Cell: too few cells of its ensemble are left. */
  FEW_CELLS("few-cells");

  private static final Reason[] VALUES = values();

  private final String key;

  Reason(String key) {
    this.key = key;
  }

  /** Name of the reason in results, lower case with hyphens. */
  public String key() {
    return key;
  }

  /** Whether a cell of the water can carry the reason. */
  public boolean ofCells() {
    return this != BOAT_SPEED && this != DEPTH_BEAMS;
  }

  /** The reason as one byte. */
  byte code() {
    return (byte) ordinal();
  }

  /** The reason with a given {@link #code()}. */
  static Reason of(byte code) {
    return VALUES[code];
  }
}
