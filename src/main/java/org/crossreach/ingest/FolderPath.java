package org.crossreach.ingest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;

/** The path of a file as {@code measurement.json} names it: within the measurement's folder. */
final class FolderPath {

  private static final String EXPECTED =
      "a file within the folder, by a relative path with forward slashes";

  private FolderPath() {}

  /**
   * Finds the file that a member names.
   *
   * @param folder the measurement's folder
   * @param fields the object
   * @param key its member with the path
   * @return the file; empty, and the problem told, when it is not a {@code .csv} or {@code .csv.gz}
   *     file within the folder
   * @throws IOException when the disk cannot be read
   */
  static Optional<Path> find(Path folder, JsonFields fields, String key) throws IOException {
    if (!(fields.find(key).orElse(null) instanceof JsonNode.Text name)) {
      return Optional.empty();
    }
    String file = name.text();
    if (!isWithin(file)) {
      fields.refuse(key, Quoted.of(file), EXPECTED, "move the file into the folder");
      return Optional.empty();
    }
    if (passName(file).isEmpty()) {
      fields.refuse(key, Quoted.of(file), "a name that ends with .csv or .csv.gz", "");
      return Optional.empty();
    }
    Path path;
    try {
      path = folder.resolve(file);
    } catch (InvalidPathException e) {
      fields.refuse(key, Quoted.of(file), EXPECTED, "rename the file");
      return Optional.empty();
    }
    if (!Files.exists(path)) {
      fields.refuse(
          key,
          Quoted.of(file) + ", which is not there",
          "a file of the folder",
          "put the file there, or correct its name");
      return Optional.empty();
    }
    if (!path.toRealPath().startsWith(folder.toRealPath())) {
      fields.refuse(
          key, "a link that leads outside the folder", EXPECTED, "move the file into the folder");
      return Optional.empty();
    }
    return Optional.of(path);
  }

  private static boolean isWithin(String file) {
    if (file.isEmpty() || file.indexOf('\\') >= 0 || file.indexOf(':') >= 0) {
      return false;
    }
    int from = 0;
    while (from <= file.length()) {
      int end = file.indexOf('/', from);
      String step = file.substring(from, end < 0 ? file.length() : end);
      if (step.isEmpty() || step.equals(".") || step.equals("..")) {
        return false;
      }
      from += step.length() + 1;
    }
    return true;
  }

  /**
   * The name of a pass: its file's name without folder and endings, for example {@code pass-01} for
   * {@code pass-01.csv.gz}; empty when the endings are others.
   */
  static String passName(String file) {
    String name = file.substring(file.lastIndexOf('/') + 1);
    if (name.endsWith(".gz")) {
      name = name.substring(0, name.length() - 3);
    }
    return name.endsWith(".csv") ? name.substring(0, name.length() - 4) : "";
  }
}
