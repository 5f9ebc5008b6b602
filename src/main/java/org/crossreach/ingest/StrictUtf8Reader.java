package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;

/**
 * Characters of a UTF-8 text that holds neither malformed bytes nor NUL.
 *
 * <p>A byte-order mark at the start is skipped. At a byte that does not belong into such a text,
 * all characters before it are handed out first and the next call fails with {@link
 * UnreadableText}, so that the caller knows the line.
 */
final class StrictUtf8Reader extends Reader {

  private static final int BLOCK = 1 << 15;
  private static final String EXPECTED = "UTF-8 text";

  private final InputStream bytes;
  private final byte[] block = new byte[BLOCK];
  private int at;
  private int end;
  private boolean started;
  private boolean ended;
  private char pending;
  private char last;
  private int largestTarget;

  StrictUtf8Reader(InputStream bytes) {
    this.bytes = bytes;
  }

  /** Whether the end of the text was reached. */
  boolean ended() {
    return ended;
  }

  /** The last character handed out so far, NUL before the first. */
  char last() {
    return last;
  }

  /** Length of the largest array that was to be filled so far. */
  int largestTarget() {
    return largestTarget;
  }

  @Override
  public int read(char[] target, int offset, int length) throws IOException {
    if (!started) {
      started = true;
      fill(4);
      recognise();
    }
    largestTarget = Math.max(largestTarget, target.length);
    int from = offset;
    int to = offset + length;
    if (pending != 0 && from < to) {
      target[from++] = pending;
      pending = 0;
    }
    while (from < to) {
      from = copyPlain(target, from, to);
      if (from < to && at < end) {
        int character = decode();
        if (character < 0) {
          break;
        }
        from = put(character, target, from, to);
      } else if (from > offset || !fill(1)) {
        break;
      }
    }
    int count = from - offset;
    if (count == 0 && length > 0) {
      if (at < end) {
        throw unreadable();
      }
      ended = true;
      return -1;
    }
    last = count > 0 ? target[offset + count - 1] : last;
    return count;
  }

  /** Copies characters of the ASCII range, NUL excepted; gives the index after the last one. */
  private int copyPlain(char[] target, int from, int to) {
    int stop = Math.min(end, at + to - from);
    int source = at;
    int put = from;
    while (source < stop && block[source] > 0) {
      target[put++] = (char) block[source++];
    }
    at = source;
    return put;
  }

  private int put(int character, char[] target, int from, int to) {
    if (Character.isBmpCodePoint(character)) {
      target[from] = (char) character;
      return from + 1;
    }
    target[from] = Character.highSurrogate(character);
    if (from + 1 == to) {
      pending = Character.lowSurrogate(character);
      return to;
    }
    target[from + 1] = Character.lowSurrogate(character);
    return from + 2;
  }

  /** Takes one character of several bytes; negative, and nothing taken, when they are malformed. */
  private int decode() throws IOException {
    int lead = block[at] & 0xff;
    int size = lead < 0xc2 ? 0 : lead < 0xe0 ? 2 : lead < 0xf0 ? 3 : lead < 0xf5 ? 4 : 0;
    if (size == 0 || !fill(size)) {
      return -1;
    }
    int character = lead & (0x7f >> size);
    for (int i = 1; i < size; i++) {
      int next = block[at + i];
      if ((next & 0xc0) != 0x80) {
        return -1;
      }
      character = character << 6 | next & 0x3f;
    }
    boolean shortest = size == 2 || character >= (size == 3 ? 0x800 : 0x10000);
    boolean paired = character >= Character.MIN_SURROGATE && character <= Character.MAX_SURROGATE;
    if (!shortest || paired || character > Character.MAX_CODE_POINT) {
      return -1;
    }
    at += size;
    return character;
  }

  /** Sees to it that a number of bytes stands ready; false when the file ends before. */
  private boolean fill(int needed) throws IOException {
    if (end - at >= needed) {
      return true;
    }
    System.arraycopy(block, at, block, 0, end - at);
    end -= at;
    at = 0;
    while (end < needed) {
      int count = bytes.read(block, end, BLOCK - end);
      if (count < 0) {
        return false;
      }
      end += count;
    }
    return true;
  }

  /** Skips a byte-order mark; refuses what is plainly something else. */
  private void recognise() throws UnreadableText {
    if (startsWith(0xef, 0xbb, 0xbf)) {
      at = 3;
    } else if (startsWith(0xff, 0xfe) || startsWith(0xfe, 0xff) || startsWithHalfEmptyPairs()) {
      throw new UnreadableText("UTF-16 text", EXPECTED, "save the file as UTF-8");
    } else if (startsWith(0x1f, 0x8b)) {
      throw new UnreadableText(
          "gzip data", EXPECTED, "give the file's name the ending .gz, or unpack it");
    } else if (startsWith('P', 'K', 3, 4)) {
      throw new UnreadableText(
          "a zip archive or a spreadsheet", EXPECTED, "unpack it, or export it as text");
    }
  }

  private boolean startsWithHalfEmptyPairs() {
    return end - at >= 4
        && (block[0] == 0) == (block[2] == 0)
        && (block[1] == 0) == (block[3] == 0)
        && (block[0] == 0) != (block[1] == 0);
  }

  private boolean startsWith(int... start) {
    for (int i = 0; i < start.length; i++) {
      if (i >= end || (block[i] & 0xff) != start[i]) {
        return false;
      }
    }
    return true;
  }

  private UnreadableText unreadable() {
    if (block[at] == 0) {
      return new UnreadableText(
          "a NUL byte", EXPECTED, "the file is damaged or no text: copy or export it again");
    }
    return new UnreadableText(
        "the byte 0x" + Integer.toHexString(block[at] & 0xff) + " where no such byte can be",
        EXPECTED,
        "save the file as UTF-8 (it may be ISO 8859-1 or Windows-1252)");
  }

  @Override
  public void close() throws IOException {
    bytes.close();
  }
}
