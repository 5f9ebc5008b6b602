package org.crossreach.archive;

import java.io.IOException;

/** A result could not be written to the archive; what was written before is whole. */
public final class CannotKeep extends IOException {

  private static final long serialVersionUID = 1L;

  CannotKeep(String target, IOException cause) {
    super(
        target
            + ": "
            + (cause.getMessage() == null ? "writing failed" : cause.getMessage())
            + "; nothing half-written was left under a final name",
        cause);
  }
}
