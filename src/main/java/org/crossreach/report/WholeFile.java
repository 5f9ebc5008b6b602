package org.crossreach.report;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes files that appear under their names only when they are complete. */
final class WholeFile {

  private WholeFile() {}

  /**
   * Writes a file, in place of one of the same name.
   *
   * @param target the file
   * @param product what it holds
   * @return the file
   */
  static Path write(Path target, OutputFolder.Product product) throws IOException {
    Path unfinished =
        target.resolveSibling(
            "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part");
    try {
      try (OutputStream stream = new BufferedOutputStream(Files.newOutputStream(unfinished))) {
        product.write(stream);
      }
      return Files.move(
          unfinished, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(unfinished);
    }
  }
}
