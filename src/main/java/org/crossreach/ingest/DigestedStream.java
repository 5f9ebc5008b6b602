package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;
import java.io.InterruptedIOException;
import java.security.MessageDigest;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;

/**
 * The bytes of a file, digested by SHA-256 on another core while they are read on this one.
 *
 * <p>Each block goes to the digesting thread as soon as it has been read, so that both work on the
 * same bytes; at most {@value #BLOCKS_AHEAD} blocks wait. Digesting is a fifth of the work of
 * reading a table.
 */
final class DigestedStream extends InputStream {

  private static final int BLOCK = 1 << 17;
  private static final int BLOCKS_AHEAD = 16;

  /** Stands for the end of the file in the queue. */
  private static final Block END = new Block(new byte[0], 0);

  private final InputStream file;
  private final MessageDigest digest = StoredFile.sha256();
  private final BlockingQueue<Block> waiting = new ArrayBlockingQueue<>(BLOCKS_AHEAD);
  private final Thread digester = new Thread(this::digest, "digest");
  private Block current = END;
  private int at;
  private boolean ended;

  /** Bytes that are only read any more once they are here. */
  private record Block(byte[] bytes, int size) {}

  /** Starts before the first byte of a file. */
  DigestedStream(InputStream file) {
    this.file = file;
    digester.setDaemon(true);
    digester.start();
  }

  @Override
  public int read(byte[] target, int offset, int length) throws IOException {
    if (at == current.size && !next()) {
      return -1;
    }
    int count = Math.min(length, current.size - at);
    System.arraycopy(current.bytes, at, target, offset, count);
    at += count;
    return count;
  }

  @Override
  public int read() throws IOException {
    return at == current.size && !next() ? -1 : current.bytes[at++] & 0xff;
  }

  /** Reads the next block; false at the end of the file. */
  private boolean next() throws IOException {
    if (ended) {
      return false;
    }
    byte[] bytes = new byte[BLOCK];
    int size = file.readNBytes(bytes, 0, BLOCK);
    at = 0;
    current = size == 0 ? END : new Block(bytes, size);
    ended = size == 0;
    try {
      waiting.put(current);
    } catch (InterruptedException e) {
      throw interrupted();
    }
    return !ended;
  }

  private void digest() {
    try {
      for (Block block = waiting.take(); block != END; block = waiting.take()) {
        digest.update(block.bytes, 0, block.size);
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt(); // closed before the end: nobody asks for the digest
    }
  }

  /**
   * Reads what is left and gives the digest of all bytes.
   *
   * @return SHA-256 as 64 lower-case hexadecimal digits
   */
  String sha256() throws IOException {
    while (!ended) {
      next();
    }
    try {
      digester.join();
    } catch (InterruptedException e) {
      throw interrupted();
    }
    return StoredFile.hex(digest.digest());
  }

  private static InterruptedIOException interrupted() {
    Thread.currentThread().interrupt();
    return new InterruptedIOException("reading was interrupted");
  }

  @Override
  public void close() throws IOException {
    digester.interrupt();
    file.close();
  }
}
