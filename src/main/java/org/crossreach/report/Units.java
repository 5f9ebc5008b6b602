package org.crossreach.report;

import org.crossreach.settings.Choice;

/** The system of units in which a report shows its figures; files for machines are always SI. */
public enum Units implements Choice {
  /** Metres, seconds, cubic metres per second. */
  SI("si"),
  /** US customary: feet, seconds, cubic feet per second. */
  US("us");

  private final String key;

  Units(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
