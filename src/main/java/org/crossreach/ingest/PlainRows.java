package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;

/**
 * The bytes of an ensemble CSV, line by line, without those rows that can be read straight from
 * them: rows of nothing but times, numbers with at most 18 digits and without exponent, within
 * their ranges, and missing values, each ended by a line feed. Those go to the table here; of all
 * other lines the bytes are handed out, so that one parser knows every rule.
 *
 * <p>A row is looked at here only where the parser has begun a new one and waits for its first
 * byte; so a line that starts within a quoted field is not taken for a row.
 */
final class PlainRows extends InputStream {

  /** Most bytes of a row that is read here. */
  private static final int LONGEST_ROW = 1 << 18;

  private static final int LONGEST_TIME = 64;

  private static final int NOT_PLAIN = -1;
  private static final int CUT_OFF = -2;

  private final InputStream bytes;
  private final EnsembleTable table;

  /** Bytes that were not yet handed out, from {@link #at} to {@link #end}; a line feed follows. */
  private final byte[] buffer = new byte[LONGEST_ROW + 1];

  private int at;
  private int end;
  private boolean ended;

  /** Whether the parser has begun a row of which it has no byte. */
  private boolean betweenRows;

  /** What is left of the line that is being handed out; 0 between lines. */
  private int lineLeft;

  private long parserLine;
  private long lines;

  private final char[] timeText = new char[LONGEST_TIME];

  /**
   * Starts at the first byte.
   *
   * @param bytes the bytes, unpacked
   * @param table receives the rows, once it has its header
   */
  PlainRows(InputStream bytes, EnsembleTable table) {
    this.bytes = bytes;
    this.table = table;
    buffer[0] = '\n';
  }

  /** Number of lines that were read here, of which the parser knows nothing. */
  long lines() {
    return lines;
  }

  /**
   * Tells that the parser begins a row, before it asks for its bytes.
   *
   * @param line the line by its own count, from 1
   */
  void beginRow(long line) {
    parserLine = line;
    betweenRows = true;
  }

  @Override
  public int read() throws IOException {
    return prepare() ? buffer[take(1)] & 0xff : -1;
  }

  @Override
  public int read(byte[] target, int offset, int length) throws IOException {
    if (!prepare()) {
      return -1;
    }
    int count = Math.min(length, lineLeft);
    System.arraycopy(buffer, take(count), target, offset, count);
    return count;
  }

  private int take(int count) {
    int from = at;
    at += count;
    lineLeft -= count;
    return from;
  }

  /** Sees to it that something of a line can be handed out; false at the end of the file. */
  private boolean prepare() throws IOException {
    if (lineLeft > 0) {
      return true;
    }
    if (betweenRows && table.row().length > 0) {
      takeRows();
    }
    betweenRows = false;
    if (at == end && !fill()) {
      return false;
    }
    int feed = at;
    while (buffer[feed] != '\n') {
      feed++;
    }
    lineLeft = Math.min(feed + 1, end) - at;
    return true;
  }

  /** Takes rows as long as they are plain. */
  private void takeRows() throws IOException {
    while (table.hasRoom()) {
      int next = readRow(at);
      if (next >= 0) {
        table.takeRow(parserLine + lines);
        lines++;
        at = next;
      } else if (next == NOT_PLAIN || !fill()) {
        return;
      }
    }
  }

  /** Reads more bytes behind those that wait; false when there are none, or no room. */
  private boolean fill() throws IOException {
    System.arraycopy(buffer, at, buffer, 0, end - at);
    end -= at;
    at = 0;
    int count = ended ? -1 : bytes.read(buffer, end, LONGEST_ROW - end);
    ended = count < 0;
    end += Math.max(0, count);
    buffer[end] = '\n';
    return count > 0;
  }

  /**
   * Reads the row that starts at a place into the table's row.
   *
   * @return the place after its line feed; {@link #NOT_PLAIN}, or {@link #CUT_OFF} when the bytes
   *     end within it
   */
  private int readRow(int start) {
    byte[] text = buffer;
    double[] row = table.row();
    double[] limits = table.limits();
    int timeField = table.timeField();
    int last = row.length - 1;
    int from = start;
    for (int field = 0; field <= last; field++) {
      int place = from;
      if (field == timeField) {
        place = readTime(from);
        row[field] = 0;
      } else {
        int character = text[place];
        int minus = 0;
        if (character == '-') {
          minus = 1;
          character = text[++place];
        }
        int first = place;
        long whole = 0;
        while (character >= '0' && character <= '9') {
          whole = 10 * whole + (character - '0');
          character = text[++place];
        }
        int digits = place - first;
        int decimals = 0;
        if (character == '.') {
          first = place + 1;
          character = text[++place];
          while (character >= '0' && character <= '9') {
            whole = 10 * whole + (character - '0');
            character = text[++place];
          }
          decimals = place - first;
          digits += decimals;
        }
        if (digits > 0) {
          double value = Decimal.of(whole, digits, decimals, minus);
          if (!(value >= limits[2 * field] && value <= limits[2 * field + 1])) {
            return NOT_PLAIN;
          }
          row[field] = value;
        } else {
          place = place >= end ? CUT_OFF : endOfMissing(from);
          row[field] = Double.NaN;
        }
      }
      if (place < 0) {
        return place;
      }
      from = place + 1;
      if (text[place] != ',' || field == last) {
        return field == last ? afterRow(place) : place >= end ? CUT_OFF : NOT_PLAIN;
      }
    }
    return NOT_PLAIN;
  }

  /** The place after an empty field, {@code NaN} or {@code NA}. */
  private int endOfMissing(int from) {
    if (buffer[from] != 'N') {
      return isEnd(buffer[from]) ? from : NOT_PLAIN;
    }
    int place = buffer[from + 1] == 'a' ? from + 2 : from + 1;
    return buffer[place] == (place == from + 2 ? 'N' : 'A') ? place + 1 : NOT_PLAIN;
  }

  /** Reads the time at a place; gives the place after it. */
  private int readTime(int from) {
    int size = 0;
    while (!isEnd(buffer[from + size])) {
      if (size == timeText.length) {
        return NOT_PLAIN;
      }
      timeText[size] = (char) (buffer[from + size] & 0xff);
      size++;
    }
    if (from + size >= end) {
      return CUT_OFF;
    }
    return table.time().parse(timeText, 0, size) ? from + size : NOT_PLAIN;
  }

  /** The place after the end of a row. */
  private int afterRow(int place) {
    int feed = buffer[place] == '\r' ? place + 1 : place;
    if (feed >= end) {
      return CUT_OFF;
    }
    return buffer[feed] == '\n' ? feed + 1 : NOT_PLAIN;
  }

  private static boolean isEnd(byte character) {
    return character == ',' || character == '\n' || character == '\r';
  }
}
