package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.crossreach.archive.Found;

/**
 * How much work measurements are, for telling the time left: the bytes of their files, and for each
 * file as much as a few million bytes, since its tables and pages cost something however short it
 * is.
 *
 * @param sizes the size of each measurement by its place
 * @param whole the sum
 */
record Workload(Map<String, Long> sizes, long whole) {

  private static final long EACH_FILE = 4_000_000;

  static Workload of(List<Found> measurements) {
    Map<String, Long> sizes = new HashMap<>();
    long whole = 0;
    for (Found each : measurements) {
      long size = of(each.folder());
      sizes.put(each.place(), size);
      whole += size;
    }
    return new Workload(sizes, whole);
  }

  private static long of(Path folder) {
    long size = 0;
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder)) {
      for (Path each : files) {
        if (Files.isRegularFile(each)) {
          size += EACH_FILE + Files.size(each);
        }
      }
    } catch (IOException | DirectoryIteratorException unreadable) {
      return Math.max(1, size); // it is told when its turn comes
    }
    return Math.max(1, size);
  }
}
