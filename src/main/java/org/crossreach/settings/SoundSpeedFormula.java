package org.crossreach.settings;

/** Which published formula gives the speed of sound in water. */
public enum SoundSpeedFormula implements Choice {
  /** By the water: marczak-1997 when fresh, chen-millero-1977 when saline. */
  AUTO("auto"),
  /** Marczak 1997, pure water. */
  MARCZAK_1997("marczak-1997"),
  /** Chen and Millero 1977, in the form of UNESCO 44. */
  CHEN_MILLERO_1977("chen-millero-1977"),
  /** Medwin 1975. */
  MEDWIN_1975("medwin-1975");

  private final String key;

  SoundSpeedFormula(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
