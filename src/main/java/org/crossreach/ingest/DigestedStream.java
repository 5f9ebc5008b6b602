package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;
import java.io.InterruptedIOException;
import java.security.MessageDigest;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import org.crossreach.survey.InputFile;

/**
 * The bytes of a file, digested by SHA-256 on another core while they are read on this one.
 *
 * <p>Each block goes to the digesting thread when it has been read, so that both see the same
 * bytes, and comes back to be filled again; at most {@value #BLOCKS} blocks are under way.
 * Digesting is a fifth of the work of reading a table.
 */
final class DigestedStream extends InputStream {

  private static final int BLOCK = 1 << 16;
  private static final int BLOCKS = 16;

  /** Stands for the end of the file in the queue. */
  private static final Block END = new Block(new byte[0]);

  private final InputStream file;
  private final MessageDigest digest = StoredFile.sha256();
  private final BlockingQueue<Block> read = new ArrayBlockingQueue<>(BLOCKS + 1);
  private final BlockingQueue<Block> digested = new ArrayBlockingQueue<>(BLOCKS);
  private final Thread digester = new Thread(this::digest, "digest");
  private Block current = END;
  private int at;
  private int blocks;
  private long size;

  /** Some bytes of the file; in the hands of one thread at a time. */
  private static final class Block {
    private final byte[] bytes;
    private int size;

    Block(byte[] bytes) {
      this.bytes = bytes;
    }
  }

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

  /** Hands the current block on and reads the next one; false at the end of the file. */
  private boolean next() throws IOException {
    if (current == END && blocks > 0) {
      return false;
    }
    try {
      if (current != END) {
        read.put(current);
      }
      Block next = blocks < BLOCKS ? new Block(new byte[BLOCK]) : digested.take();
      blocks = Math.min(BLOCKS, blocks + 1);
      next.size = file.readNBytes(next.bytes, 0, BLOCK);
      size += next.size;
      at = 0;
      current = next.size == 0 ? END : next;
      if (current == END) {
        read.put(END);
      }
    } catch (InterruptedException e) {
      throw interrupted();
    }
    return current != END;
  }

  private void digest() {
    try {
      for (Block block = read.take(); block != END; block = read.take()) {
        digest.update(block.bytes, 0, block.size);
        digested.put(block);
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt(); // closed before the end: nobody asks for the digest
    }
  }

  /**
   * Reads what is left and gives size and digest of all bytes.
   *
   * @param name name of the file
   */
  InputFile input(String name) throws IOException {
    while (next()) {
      at = current.size;
    }
    try {
      digester.join();
    } catch (InterruptedException e) {
      throw interrupted();
    }
    return new InputFile(name, size, StoredFile.hex(digest.digest()));
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
