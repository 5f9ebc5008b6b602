package org.crossreach.report;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * A folder that receives the files of one result.
 *
 * <p>A folder is ours when it is new, empty, or holds a {@code result.json} or {@code
 * comparison.json} of ours; any other is left alone. A file appears under its name only when it is
 * complete.
 */
public final class OutputFolder {

  /** Name of the file that marks a folder as ours. */
  public static final String MARK = "result.json";

  private static final int ENOUGH_TO_KNOW = 200;

  private final Path folder;

  /** Something that writes a file. */
  public interface Product {
    void write(OutputStream target) throws IOException;
  }

  private OutputFolder(Path folder) {
    this.folder = folder;
  }

  /**
   * Takes a folder for a result; it is made where it is missing.
   *
   * @param folder the folder
   * @throws FileSystemException when the folder holds something that is not ours
   */
  public static OutputFolder claim(Path folder) throws IOException {
    if (Files.exists(folder) && !isOurs(folder)) {
      throw new FileSystemException(
          folder.toString(),
          null,
          "this holds something that is not a result of crossreach; choose another folder");
    }
    Files.createDirectories(folder);
    return new OutputFolder(folder);
  }

  private static boolean isOurs(Path folder) throws IOException {
    if (!Files.isDirectory(folder)) {
      return false;
    }
    try (var entries = Files.newDirectoryStream(folder)) {
      if (!entries.iterator().hasNext()) {
        return true;
      }
    }
    return holds(folder.resolve(MARK), "\"crossreach-result/")
        || holds(folder.resolve("comparison.json"), "\"crossreach-comparison/");
  }

  /**
   * Whether a file is there and says at its beginning what it is.
   *
   * @param file the file
   * @param format what stands near its beginning, for example {@code "crossreach-settings/}
   */
  public static boolean holds(Path file, String format) throws IOException {
    if (!Files.isRegularFile(file)) {
      return false;
    }
    try (var stream = Files.newInputStream(file)) {
      byte[] head = stream.readNBytes(ENOUGH_TO_KNOW);
      return new String(head, StandardCharsets.UTF_8).contains(format);
    }
  }

  /**
   * Writes one file.
   *
   * @param name its name
   * @param product what it holds
   * @return the path of the file
   */
  public Path write(String name, Product product) throws IOException {
    return WholeFile.write(folder.resolve(name), product);
  }
}
