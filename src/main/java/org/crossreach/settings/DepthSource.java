package org.crossreach.settings;

/** Which beams give the depth. */
public enum DepthSource implements Choice {
  /** Arithmetic mean of the valid slant beams. */
  SLANT_MEAN("slant-mean"),
  /** Inverse-distance weighted mean of the valid slant beams, which is their harmonic mean. */
  SLANT_INVERSE_DISTANCE("slant-inverse-distance"),
  /** The vertical beam. */
  VERTICAL("vertical");

  private final String key;

  DepthSource(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
