package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/**
 * Characters of a text in UTF-8 without malformed bytes.
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
  private final ByteBuffer waiting = ByteBuffer.wrap(block).limit(0);
  private final CharsetDecoder decoder =
      StandardCharsets.UTF_8
          .newDecoder()
          .onMalformedInput(CodingErrorAction.REPORT)
          .onUnmappableCharacter(CodingErrorAction.REPORT);
  private boolean started;
  private boolean lastBlock;
  private boolean ended;
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

  /**
   * Reads characters, at least two unless the text ends.
   *
   * @param length room for at least two characters, the halves of a surrogate pair
   */
  @Override
  public int read(char[] target, int offset, int length) throws IOException {
    if (length < 2) {
      throw new IllegalArgumentException("length must be at least 2, not " + length);
    }
    largestTarget = Math.max(largestTarget, target.length);
    if (!started) {
      started = true;
      fill(4);
      recognise();
    }
    CharBuffer characters = CharBuffer.wrap(target, offset, length);
    while (true) {
      CoderResult result = decoder.decode(waiting, characters, lastBlock);
      int count = characters.position() - offset;
      if (count > 0) {
        last = target[offset + count - 1];
        return count;
      }
      if (result.isError()) {
        throw unreadable();
      }
      if (lastBlock) {
        ended = true;
        return -1;
      }
      fill(waiting.remaining() + 1);
    }
  }

  /** Sees to it that a number of bytes is waiting, or all that are left. */
  private void fill(int needed) throws IOException {
    waiting.compact();
    while (waiting.position() < needed && !lastBlock) {
      int count = bytes.read(block, waiting.position(), waiting.remaining());
      if (count < 0) {
        lastBlock = true;
      } else {
        waiting.position(waiting.position() + count);
      }
    }
    waiting.flip();
  }

  /** Skips a byte-order mark; refuses what is plainly something else. */
  private void recognise() throws UnreadableText {
    if (startsWith(0xef, 0xbb, 0xbf)) {
      waiting.position(3);
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
    return waiting.remaining() >= 4
        && (block[0] == 0) == (block[2] == 0)
        && (block[1] == 0) == (block[3] == 0)
        && (block[0] == 0) != (block[1] == 0);
  }

  private boolean startsWith(int... start) {
    for (int i = 0; i < start.length; i++) {
      if (i >= waiting.limit() || (block[i] & 0xff) != start[i]) {
        return false;
      }
    }
    return true;
  }

  private UnreadableText unreadable() {
    String value = Integer.toHexString(waiting.get(waiting.position()) & 0xff);
    return new UnreadableText(
        "the byte 0x" + value + " where no such byte can be",
        EXPECTED,
        "save the file as UTF-8 (it may be ISO 8859-1 or Windows-1252), or copy it again");
  }

  @Override
  public void close() throws IOException {
    bytes.close();
  }
}
