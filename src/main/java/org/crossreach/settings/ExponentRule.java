package org.crossreach.settings;

/** Where the exponent of the power law comes from. */
public enum ExponentRule implements Choice {
  /** The given value. */
  FIXED("fixed"),
  /** Fitted to each pass. */
  FIT_PASS("fit-pass"),
  /** Fitted to all used passes together. */
  FIT_ALL("fit-all");

  private final String key;

  ExponentRule(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
