package org.crossreach.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import org.crossreach.report.FileTrouble;

/**
 * Standard output that remembers why it failed.
 *
 * <p>Writers swallow a failing stream's exception; here the first one is kept, and what follows it
 * is dropped, so that the program can tell a reader that has gone away ({@code | head}) from a full
 * disk.
 */
final class StandardOutput extends OutputStream {

  private final OutputStream target;
  private IOException failure;

  StandardOutput() {
    this(new FileOutputStream(FileDescriptor.out));
  }

  StandardOutput(OutputStream target) {
    this.target = target;
  }

  @Override
  public void write(int value) {
    write(new byte[] {(byte) value}, 0, 1);
  }

  @Override
  public void write(byte[] bytes, int offset, int length) {
    if (failure != null) {
      return;
    }
    try {
      target.write(bytes, offset, length);
    } catch (IOException trouble) {
      failure = trouble;
    }
  }

  /**
   * Complains when something was lost.
   *
   * @throws CannotWrite when writing failed for any other reason than that nobody reads any more
   */
  void requireComplete() throws CannotWrite {
    if (failure != null && !readerHasGone()) {
      throw new CannotWrite("standard output", FileTrouble.describe("", failure));
    }
  }

  private boolean readerHasGone() {
    String message = failure.getMessage();
    return message != null
        && (message.contains("Broken pipe") || message.contains("pipe is being"));
  }
}
