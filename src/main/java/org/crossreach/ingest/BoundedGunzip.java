package org.crossreach.ingest;

import java.io.EOFException;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipException;

/**
 * The unpacked bytes of a gzip file, with a bound on how much it may expand.
 *
 * <p>Tables of numbers shrink to a fifth or a tenth, tables of mostly empty fields to a fiftieth. A
 * file that unpacks to more than {@value #FREE_BYTES} bytes and to more than {@value #MOST_FOLD}
 * times its size is refused as soon as it has done so: deflate can blow up a thousandfold. Damage
 * is told as {@link UnreadableText}.
 */
final class BoundedGunzip extends InputStream {

  /** Number of unpacked bytes up to which any expansion is accepted: 64 MiB. */
  static final long FREE_BYTES = 64L << 20;

  /** Largest expansion accepted beyond that. */
  static final long MOST_FOLD = 100;

  private static final int BUFFER = 1 << 15;
  private static final String EXPECTED = "a whole gzip file";
  private static final String REMEDY = "copy or pack the file again";

  private final Counted packed;
  private final GZIPInputStream unpacked;
  private long unpackedBytes;

  BoundedGunzip(InputStream packed) throws IOException {
    this.packed = new Counted(packed);
    try {
      unpacked = new GZIPInputStream(this.packed, BUFFER);
    } catch (EOFException e) {
      throw new UnreadableText("a file that ends within the gzip header", EXPECTED, REMEDY);
    } catch (ZipException e) {
      throw new UnreadableText(
          "something that is not gzip",
          EXPECTED,
          "take the ending .gz off a file that is not packed");
    }
  }

  @Override
  public int read(byte[] target, int offset, int length) throws IOException {
    int count;
    try {
      count = unpacked.read(target, offset, length);
    } catch (EOFException e) {
      throw new UnreadableText("gzip data that end too early", EXPECTED, REMEDY);
    } catch (ZipException e) {
      throw new UnreadableText("damaged gzip data", EXPECTED, REMEDY);
    }
    unpackedBytes += Math.max(0, count);
    if (unpackedBytes > FREE_BYTES && unpackedBytes > MOST_FOLD * packed.bytes) {
      throw new UnreadableText(
          "gzip data that expand more than " + MOST_FOLD + "-fold",
          "at most " + MOST_FOLD + "-fold beyond " + (FREE_BYTES >> 20) + " MiB",
          "see whether this is the right file; if it is, unpack it");
    }
    return count;
  }

  @Override
  public int read() throws IOException {
    byte[] one = new byte[1];
    int count = read(one, 0, 1);
    return count < 0 ? -1 : one[0] & 0xff;
  }

  @Override
  public void close() throws IOException {
    unpacked.close();
  }

  /** Counts the bytes that were taken from the file. */
  private static final class Counted extends FilterInputStream {
    private long bytes;

    Counted(InputStream in) {
      super(in);
    }

    @Override
    public int read() throws IOException {
      int value = super.read();
      bytes += value < 0 ? 0 : 1;
      return value;
    }

    @Override
    public int read(byte[] target, int offset, int length) throws IOException {
      int count = super.read(target, offset, length);
      bytes += Math.max(0, count);
      return count;
    }
  }
}
