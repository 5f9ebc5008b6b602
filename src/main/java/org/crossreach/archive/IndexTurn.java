package org.crossreach.archive;

import java.io.IOException;
import java.io.InterruptedIOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.concurrent.locks.ReentrantLock;

/**
 * The turn of one run to make the index of an archive, so that the last of several sees what all
 * have kept.
 *
 * <p>It is a lock on a file that goes with the turn; the system takes it from a killed run. Where
 * files cannot be locked, or the turn does not come for {@value #PATIENCE_S} s, the run goes on
 * without.
 */
final class IndexTurn {

  static final String NAME = ".index.lock";

  private static final int PATIENCE_S = 600;
  private static final int PAUSE_MS = 20;

  /**
   * Runs in one process come one after the other before they touch the file: a system may drop the
   * lock of a process as soon as that closes the file anywhere.
   */
  private static final ReentrantLock PROCESS = new ReentrantLock();

  private final Path file;
  private FileChannel channel;

  private IndexTurn(Path file) {
    this.file = file;
  }

  /**
   * Waits for the turn.
   *
   * @param target folder of the archive
   * @throws InterruptedIOException when the waiting is interrupted
   */
  static IndexTurn await(Path target) throws InterruptedIOException {
    IndexTurn turn = new IndexTurn(target.resolve(NAME));
    try {
      PROCESS.lockInterruptibly();
      try {
        turn.take();
      } catch (InterruptedException | RuntimeException stop) {
        PROCESS.unlock();
        throw stop;
      }
      return turn;
    } catch (InterruptedException stop) {
      Thread.currentThread().interrupt();
      throw new InterruptedIOException("interrupted while another run makes the index");
    }
  }

  private void take() throws InterruptedException {
    long start = System.nanoTime();
    try {
      while (!tried() && System.nanoTime() - start < PATIENCE_S * 1_000_000_000L) {
        Thread.sleep(PAUSE_MS);
      }
    } catch (IOException noLocks) {
      channel = null;
    }
  }

  /** Whether the file is locked, and is the one that is there and not one that has been removed. */
  private boolean tried() throws IOException {
    Object before = identity();
    FileChannel opened =
        FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    boolean ours = false;
    try {
      ours = opened.tryLock() != null && identity().equals(before);
    } finally {
      if (!ours) {
        opened.close();
      }
    }
    if (ours) {
      channel = opened;
    }
    return ours;
  }

  private Object identity() throws IOException {
    try {
      Object key = Files.readAttributes(file, BasicFileAttributes.class).fileKey();
      return key == null ? NAME : key;
    } catch (NoSuchFileException none) {
      return "";
    }
  }

  /** Gives the turn to the next run. */
  void end() {
    try (FileChannel held = channel) {
      if (held != null) {
        Files.deleteIfExists(file);
      }
    } catch (IOException stays) {
      channel = null; // the file takes up no room, and the next run locks it again
    } finally {
      PROCESS.unlock();
    }
  }
}
