package org.crossreach.archive;

import java.io.IOException;
import org.crossreach.report.FileTrouble;

/** A result could not be written to the archive; what was written before is whole. */
public final class CannotKeep extends IOException {

  private static final long serialVersionUID = 1L;

  CannotKeep(String target, IOException cause) {
    super(
        target
            + ": "
            + FileTrouble.reason(cause)
            + "; nothing half-written was left under a final name",
        cause);
  }
}
