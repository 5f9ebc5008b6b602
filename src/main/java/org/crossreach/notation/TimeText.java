package org.crossreach.notation;

import java.time.OffsetDateTime;

/** Times as RFC 3339 writes them: always with seconds, decimals only where there are any. */
public final class TimeText {

  /** Number of characters up to the minutes. */
  private static final int MINUTES_END = 16;

  private TimeText() {}

  /**
   * A time, for example {@code 2031-04-18T09:30:00+01:00}.
   *
   * @param time a time of the years 0 to 9999 whose offset is whole minutes
   */
  public static String of(OffsetDateTime time) {
    String text = time.toString(); // leaves out seconds of 0
    return text.charAt(MINUTES_END) == ':'
        ? text
        : text.substring(0, MINUTES_END) + ":00" + text.substring(MINUTES_END);
  }
}
