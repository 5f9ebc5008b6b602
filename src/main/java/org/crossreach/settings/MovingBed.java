package org.crossreach.settings;

/** How a moving bed is corrected for. */
public enum MovingBed implements Choice {
  /** Not at all. */
  NONE("none");

  private final String key;

  MovingBed(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
