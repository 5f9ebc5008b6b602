package org.crossreach.settings;

/** How velocity is carried from the lowest usable cell to the bed. */
public enum BottomLaw implements Choice {
  /** Power law through all usable cells. */
  POWER("power"),
  /** Power law through the usable cells in the lowest fifth of the depth. */
  NO_SLIP("no-slip");

  private final String key;

  BottomLaw(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
