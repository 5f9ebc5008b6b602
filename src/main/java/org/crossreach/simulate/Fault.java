package org.crossreach.simulate;

/** What can go wrong with samples; the key names its rate in a recipe. */
public enum Fault {
  /** An ensemble has no bottom track. */
  LOST_BOAT("lost_boat"),
  /** An ensemble's bottom-track velocity is off by the size of a spike. */
  BOAT_JUMP("boat_jumps"),
  /** An ensemble has no water velocity. */
  LOST_COLUMN("lost_columns"),
  /** A cell has no velocity. */
  LOST_CELL("lost_cells"),
  /** A cell's velocity is off by the size of a spike. */
  SPIKE("spikes"),
  /** Weeds: the upper half of a column is slow and badly correlated. */
  WEED("weeds"),
  /** Bubbles: an ensemble has neither water velocity nor depth. */
  BUBBLE("bubbles"),
  /** A beam's depth is far too small. */
  DEPTH_SPIKE("depth_spikes");

  private final String key;

  Fault(String key) {
    this.key = key;
  }

  /** Name of its rate in a recipe. */
  public String key() {
    return key;
  }
}
