package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * A tree of measurements, each a copy of the example of the formats.
 *
 * @param root its folder
 */
record ExampleTree(Path root) {

  static final Path EXAMPLE = Path.of("formats/example");

  /** Puts a copy at a place below the root. */
  Path copy(String place) throws IOException {
    Path copy = root.resolve(place);
    Files.createDirectories(copy);
    try (Stream<Path> files = Files.list(EXAMPLE)) {
      for (Path each : files.toList()) {
        Files.copy(each, copy.resolve(each.getFileName().toString()));
      }
    }
    return copy;
  }

  /** Every file below a folder by its path, with its bytes. */
  static Map<String, String> bytes(Path folder) throws IOException {
    Map<String, String> all = new TreeMap<>();
    try (Stream<Path> files = Files.walk(folder)) {
      for (Path each : files.filter(Files::isRegularFile).toList()) {
        all.put(
            folder.relativize(each).toString(),
            Base64.getEncoder().encodeToString(Files.readAllBytes(each)));
      }
    }
    return all;
  }
}
