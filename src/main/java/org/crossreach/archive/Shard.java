package org.crossreach.archive;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.CRC32;

/**
 * One of N parts of the work, found without asking the others: a measurement belongs to shard
 * {@code 1 + CRC-32(place in UTF-8) mod N}.
 *
 * @param number which part, 1 to {@code of}
 * @param of number of parts
 */
public record Shard(int number, int of) {

  /** All of the work. */
  public static final Shard WHOLE = new Shard(1, 1);

  public Shard {
    if (of < 1 || number < 1 || number > of) {
      throw new IllegalArgumentException(
          "a shard is K/N with K from 1 to N, not " + number + "/" + of);
    }
  }

  /**
   * Reads {@code K/N}.
   *
   * @throws IllegalArgumentException when the text is anything else
   */
  public static Shard parse(String text) {
    int slash = text.indexOf('/');
    try {
      return new Shard(
          Integer.parseInt(text.substring(0, Math.max(0, slash))),
          Integer.parseInt(text.substring(slash + 1)));
    } catch (NumberFormatException notNumbers) {
      throw new IllegalArgumentException("a shard is K/N, for example 3/16, not " + text);
    }
  }

  /** The measurements that belong to this part, in the same order. */
  public List<Found> of(Iterable<Found> found) {
    List<Found> own = new ArrayList<>();
    for (Found each : found) {
      if (has(each)) {
        own.add(each);
      }
    }
    return own;
  }

  private boolean has(Found found) {
    CRC32 crc = new CRC32();
    crc.update(found.place().getBytes(StandardCharsets.UTF_8));
    return crc.getValue() % of == number - 1;
  }
}
