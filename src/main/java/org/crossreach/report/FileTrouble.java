package org.crossreach.report;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.DirectoryNotEmptyException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;

/** One line for a person out of an {@link IOException}, whose own message is often a bare path. */
public final class FileTrouble {

  private FileTrouble() {}

  /**
   * Describes a failure, for example {@code pass-01.csv: there is no such file or folder}.
   *
   * @param fallback what to name when the failure names no file
   * @param failure the failure
   */
  public static String describe(String fallback, IOException failure) {
    if (failure instanceof FileSystemException trouble) {
      return (trouble.getFile() == null ? fallback : trouble.getFile()) + ": " + reason(trouble);
    }
    String message = reason(failure);
    return failure instanceof FileNotFoundException || fallback.isEmpty()
        ? message
        : fallback + ": " + message;
  }

  /** Why something failed, without the file, for example {@code this is not a folder}. */
  public static String reason(IOException failure) {
    if (!(failure instanceof FileSystemException trouble)) {
      return failure.getMessage() == null ? "input or output failed" : failure.getMessage();
    }
    if (trouble instanceof NoSuchFileException) {
      return "there is no such file or folder";
    }
    if (trouble instanceof AccessDeniedException) {
      return "access is denied; check the permissions";
    }
    if (trouble instanceof NotDirectoryException) {
      return "this is not a folder";
    }
    if (trouble instanceof FileAlreadyExistsException) {
      return "this exists already";
    }
    if (trouble instanceof DirectoryNotEmptyException) {
      return "this folder is not empty";
    }
    return trouble.getReason() == null ? "input or output failed" : trouble.getReason();
  }
}
