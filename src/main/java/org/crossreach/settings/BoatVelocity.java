package org.crossreach.settings;

/** Where the boat's velocity over the bed comes from. */
public enum BoatVelocity implements Choice {
  /** Bottom tracking by the profiler. */
  BOTTOM_TRACK("bottom-track");

  private final String key;

  BoatVelocity(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
