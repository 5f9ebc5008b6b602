package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Path;
import org.crossreach.report.FileTrouble;

/** An output that could not be written; every other {@link IOException} is taken for an input. */
final class CannotWrite extends IOException {

  private static final long serialVersionUID = 1L;

  /** Something that writes files. */
  interface Writing {
    void run() throws IOException;
  }

  /**
   * Says why an output could not be written.
   *
   * @param target the file, folder or stream as the user knows it
   * @param reason why, as a phrase
   */
  CannotWrite(String target, String reason) {
    super(target + ": " + reason);
  }

  private CannotWrite(Path target, IOException cause) {
    super(FileTrouble.describe(target.toString(), cause), cause);
  }

  /**
   * Runs something that writes, so that its failures count as outputs that cannot be written.
   *
   * @param target the file or folder to name when the failure itself names none
   * @param writing what writes
   * @throws CannotWrite when the writing fails
   */
  static void unless(Path target, Writing writing) throws CannotWrite {
    try {
      writing.run();
    } catch (CannotWrite told) {
      throw told;
    } catch (IOException failure) {
      throw new CannotWrite(target, failure);
    }
  }
}
