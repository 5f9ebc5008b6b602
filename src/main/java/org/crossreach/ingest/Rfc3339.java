package org.crossreach.ingest;

import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;

/**
 * A time in RFC 3339 form with an offset, for example {@code 2031-04-18T09:30:00.25+01:00}, read
 * from a slice of characters.
 *
 * <p>Kept for reuse: {@link #parse} replaces the time that was read before. {@code T} and {@code Z}
 * may be in lower case and {@code T} may be a space, as section 5.6 allows. Up to nine decimals of
 * a second are read, exactly. Not read: leap seconds ({@code :60}), of which this calendar has
 * none, and offsets beyond 18 hours. Source: Klyne and Newman 2002, RFC 3339, doi:10.17487/RFC3339.
 */
final class Rfc3339 {

  private static final int[] DAYS_BEFORE_MONTH = {
    0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334
  };

  /** Days from 0000-01-01 to 1970-01-01 in the Gregorian calendar. */
  private static final long DAYS_TO_1970 = 719_528;

  private static final int MOST_DECIMALS = 9;
  private static final int LARGEST_OFFSET_S = 18 * 3600;

  private long epochSecond;
  private int nano;
  private int offsetS;

  /** Whole seconds since 1970-01-01T00:00Z of the time that was read last. */
  long epochSecond() {
    return epochSecond;
  }

  /** Nanoseconds after the whole second of the time that was read last, 0 to 999 999 999. */
  int nano() {
    return nano;
  }

  /** The time that was read last, with its offset. */
  OffsetDateTime toOffsetDateTime() {
    return Instant.ofEpochSecond(epochSecond, nano).atOffset(ZoneOffset.ofTotalSeconds(offsetS));
  }

  /**
   * Reads a time.
   *
   * @param text holds the time
   * @param from index of its first character
   * @param to index after its last character
   * @return whether the slice is such a time
   */
  boolean parse(char[] text, int from, int to) {
    if (to - from < 20
        || text[from + 4] != '-'
        || text[from + 7] != '-'
        || !isDateEnd(text[from + 10])
        || text[from + 13] != ':'
        || text[from + 16] != ':') {
      return false;
    }
    int year = 100 * twoDigits(text, from) + twoDigits(text, from + 2);
    int month = twoDigits(text, from + 5);
    int day = twoDigits(text, from + 8);
    int hour = twoDigits(text, from + 11);
    int minute = twoDigits(text, from + 14);
    int second = twoDigits(text, from + 17);
    if (twoDigits(text, from) < 0
        || twoDigits(text, from + 2) < 0
        || month < 1
        || month > 12
        || day < 1
        || day > daysIn(year, month)
        || hour < 0
        || hour > 23
        || minute < 0
        || minute > 59
        || second < 0
        || second > 59) {
      return false;
    }
    int at = parseFraction(text, from + 19, to);
    if (at < 0 || !parseOffset(text, at, to)) {
      return false;
    }
    epochSecond =
        86_400 * epochDay(year, month, day) + 3600 * hour + 60 * minute + second - offsetS;
    return true;
  }

  private static boolean isDateEnd(char character) {
    return character == 'T' || character == 't' || character == ' ';
  }

  /** Reads the decimals of the second, if any; gives the index after them, -1 when they are bad. */
  private int parseFraction(char[] text, int from, int to) {
    nano = 0;
    if (text[from] != '.') {
      return from;
    }
    int at = from + 1;
    int value = 0;
    int weight = 100_000_000;
    while (at < to && text[at] >= '0' && text[at] <= '9') {
      value += weight * (text[at] - '0');
      weight /= 10;
      at++;
    }
    int decimals = at - from - 1;
    nano = value;
    return decimals < 1 || decimals > MOST_DECIMALS ? -1 : at;
  }

  private boolean parseOffset(char[] text, int from, int to) {
    if (to - from == 1 && (text[from] == 'Z' || text[from] == 'z')) {
      offsetS = 0;
      return true;
    }
    if (to - from != 6 || (text[from] != '+' && text[from] != '-') || text[from + 3] != ':') {
      return false;
    }
    int hours = twoDigits(text, from + 1);
    int minutes = twoDigits(text, from + 4);
    int size = 3600 * hours + 60 * minutes;
    offsetS = text[from] == '-' ? -size : size;
    return hours >= 0 && minutes >= 0 && minutes <= 59 && size <= LARGEST_OFFSET_S;
  }

  /** The number that two digits make, negative when they are not digits. */
  private static int twoDigits(char[] text, int at) {
    int tens = text[at] - '0';
    int units = text[at + 1] - '0';
    return tens < 0 || tens > 9 || units < 0 || units > 9 ? -1_000_000 : 10 * tens + units;
  }

  private static boolean isLeap(int year) {
    return year % 4 == 0 && (year % 100 != 0 || year % 400 == 0);
  }

  private static int daysIn(int year, int month) {
    if (month == 2) {
      return isLeap(year) ? 29 : 28;
    }
    return month == 4 || month == 6 || month == 9 || month == 11 ? 30 : 31;
  }

  /** Days since 1970-01-01 in the Gregorian calendar, extended backwards. */
  private static long epochDay(int year, int month, int day) {
    int before = year - 1;
    long days =
        365L * year
            + Math.floorDiv(before, 4)
            - Math.floorDiv(before, 100)
            + Math.floorDiv(before, 400)
            + 1; // the year 0 is a leap year
    return days
        + DAYS_BEFORE_MONTH[month - 1]
        + (month > 2 && isLeap(year) ? 1 : 0)
        + day
        - 1
        - DAYS_TO_1970;
  }
}
