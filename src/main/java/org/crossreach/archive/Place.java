package org.crossreach.archive;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.HexFormat;
import org.crossreach.report.OutputFolder;

/**
 * A folder of the archive in which files appear whole or not at all.
 *
 * <p>A file is written under a name that carries the writing process, then renamed, which is
 * atomic. Two runs on one target therefore never mix their bytes, and since the same inputs make
 * the same bytes it does not matter which of them renames last. What a killed process left behind
 * is removed by the next run that writes here.
 */
final class Place {

  private static final String ENDING = ".part";
  private static final String WRITER = host() + "." + ProcessHandle.current().pid();
  private static final int LONGEST_NAME = 200;
  private static final String PROBE = ".probe";
  private static final int PROBE_SIZE = 1 << 20;

  private final Path folder;

  Place(Path folder) {
    this.folder = folder;
  }

  Path folder() {
    return folder;
  }

  /** A file as it was written or is. */
  record Kept(String name, long size, String sha256) {}

  /** Makes the folder and removes what dead processes left in it. */
  void open() throws CannotKeep {
    try {
      Files.createDirectories(folder);
    } catch (IOException trouble) {
      throw new CannotKeep(folder.toString(), trouble);
    }
    sweep();
  }

  /** Removes what dead processes left in the folder, as far as that can be done. */
  void sweep() {
    try (DirectoryStream<Path> left = Files.newDirectoryStream(folder, ".*" + ENDING)) {
      for (Path each : left) {
        if (isAbandoned(each)) {
          Files.deleteIfExists(each);
        }
      }
    } catch (IOException | DirectoryIteratorException readOnly) {
      return; // they take up room and do no harm
    }
  }

  private static boolean isAbandoned(Path file) throws IOException {
    String name = file.getFileName().toString();
    String writer = name.substring(0, name.length() - ENDING.length());
    int point = writer.lastIndexOf('.');
    String process = writer.substring(point + 1);
    boolean ours = point > 0 && writer.substring(0, point).endsWith("." + host());
    if (ours && !process.isEmpty() && process.chars().allMatch(Character::isDigit)) {
      return ProcessHandle.of(Long.parseLong(process)).isEmpty();
    }
    Instant aDayAgo = Instant.now().minus(1, ChronoUnit.DAYS);
    return Files.getLastModifiedTime(file).toInstant().isBefore(aDayAgo);
  }

  private static String host() {
    try {
      return Files.readString(Path.of("/proc/sys/kernel/hostname")).strip().replace('.', '-');
    } catch (IOException unknown) {
      return "host";
    }
  }

  /**
   * Writes a file.
   *
   * @param name its name
   * @param product what it holds
   */
  Kept write(String name, OutputFolder.Product product) throws CannotKeep {
    Path target = folder.resolve(name);
    String shortened = name.substring(0, Math.min(LONGEST_NAME, name.length()));
    Path unfinished =
        folder.resolve(
            "." + shortened + "." + Thread.currentThread().getId() + "." + WRITER + ENDING);
    MessageDigest digest = sha256();
    try {
      try (OutputStream stream =
          new BufferedOutputStream(
              new DigestOutputStream(Files.newOutputStream(unfinished), digest))) {
        product.write(stream);
      } catch (IOException | RuntimeException | Error trouble) {
        Files.deleteIfExists(unfinished);
        throw trouble;
      }
      long size = Files.size(unfinished);
      Files.move(
          unfinished, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
      return new Kept(name, size, HexFormat.of().formatHex(digest.digest()));
    } catch (IOException trouble) {
      throw new CannotKeep(target.toString(), trouble);
    } catch (UncheckedIOException trouble) {
      // the writer of tables reports a full disk this way
      throw new CannotKeep(target.toString(), trouble.getCause());
    }
  }

  /** Whether files can be written here at all: tries it with one of some size. */
  boolean takesFiles() {
    try {
      write(PROBE, stream -> stream.write(new byte[PROBE_SIZE]));
      remove(PROBE);
      return true;
    } catch (CannotKeep refused) {
      return false;
    }
  }

  /** Removes a file if it is there. */
  void remove(String name) throws CannotKeep {
    try {
      Files.deleteIfExists(folder.resolve(name));
    } catch (IOException trouble) {
      throw new CannotKeep(folder.resolve(name).toString(), trouble);
    }
  }

  /** Whether a file is there and holds the same bytes as when it was kept. */
  static boolean same(Path folder, Kept kept) {
    Path file = folder.resolve(kept.name());
    try {
      return Files.isRegularFile(file)
          && Files.size(file) == kept.size()
          && sha256(file).equals(kept.sha256());
    } catch (IOException unreadable) {
      return false;
    }
  }

  private static String sha256(Path file) throws IOException {
    MessageDigest digest = sha256();
    byte[] buffer = new byte[1 << 16];
    try (InputStream stream = Files.newInputStream(file)) {
      for (int n = stream.read(buffer); n >= 0; n = stream.read(buffer)) {
        digest.update(buffer, 0, n);
      }
    }
    return HexFormat.of().formatHex(digest.digest());
  }

  private static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java has SHA-256", impossible);
    }
  }
}
