package org.crossreach.settings;

/** How velocity is carried from the highest usable cell to the surface. */
public enum TopLaw implements Choice {
  /** Power law through all usable cells. */
  POWER("power"),
  /** The velocity of the highest usable cell. */
  CONSTANT("constant"),
  /** Straight line through the three highest usable cells. */
  THREE_POINT("three-point");

  private final String key;

  TopLaw(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
