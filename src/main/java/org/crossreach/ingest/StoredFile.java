package org.crossreach.ingest;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.UnusableInput;

/** A file on disk before anything is known of what it holds: that it is there, and its digest. */
final class StoredFile {

  private static final String HEXADECIMAL = "0123456789abcdef";

  private StoredFile() {}

  /**
   * Sees to it that there is a regular file.
   *
   * @throws UnusableInput when there is none; the problem is added first
   */
  static void check(Path file, FileProblems problems) throws UnusableInput {
    if (Files.isRegularFile(file)) {
      return;
    }
    boolean folder = Files.isDirectory(file);
    boolean special = Files.exists(file);
    problems.add(
        0,
        "",
        folder ? "a folder" : special ? "a device or pipe" : "no such file",
        "a file",
        folder || special ? "" : "put the file there, or correct its name");
    throw new UnusableInput(problems.list());
  }

  /**
   * The bytes of a small file.
   *
   * @throws UnusableInput when there is none or it is too large; the problem is added first
   * @throws IOException when it cannot be read from its disk
   */
  static byte[] bytes(Path file, FileProblems problems) throws UnusableInput, IOException {
    check(file, problems);
    try (InputStream stored = Files.newInputStream(file)) {
      byte[] bytes = stored.readNBytes(JsonTree.LARGEST + 1);
      if (bytes.length > JsonTree.LARGEST) {
        problems.add(
            0,
            "",
            "more than " + JsonTree.LARGEST + " bytes",
            "at most " + JsonTree.LARGEST,
            "see whether this is the right file");
        throw new UnusableInput(problems.list());
      }
      return bytes;
    } catch (IOException e) {
      throw named(problems.file(), e);
    }
  }

  /** A failure of the disk with the name by which the user knows the file, in plain words. */
  static IOException named(String shownName, IOException failure) {
    String reason = failure.getMessage();
    if (failure instanceof AccessDeniedException) {
      reason = "permission denied";
    } else if (failure instanceof FileSystemException system) {
      reason = system.getReason() == null ? "cannot be read" : system.getReason();
    }
    return new IOException(shownName + ": " + reason, failure);
  }

  /** An empty SHA-256 digest. */
  static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  /** Size and digest of a file's bytes. */
  static InputFile input(String name, byte[] bytes) {
    return new InputFile(name, bytes.length, hex(sha256().digest(bytes)));
  }

  /** Bytes as lower-case hexadecimal digits. */
  static String hex(byte[] bytes) {
    StringBuilder digits = new StringBuilder(2 * bytes.length);
    for (byte value : bytes) {
      digits.append(HEXADECIMAL.charAt(value >> 4 & 15)).append(HEXADECIMAL.charAt(value & 15));
    }
    return digits.toString();
  }
}
