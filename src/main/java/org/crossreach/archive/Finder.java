package org.crossreach.archive;

import java.io.IOException;
import java.nio.file.FileSystemLoopException;
import java.nio.file.FileVisitOption;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Collection;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeMap;

/**
 * Finds measurement folders: those that hold a {@code measurement.json}.
 *
 * <p>Links are followed, each real folder once; folders whose names begin with a point are passed
 * over. What cannot be entered is kept as a trouble and stops nothing.
 */
public final class Finder {

  private static final String MARK = "measurement.json";

  private final TreeMap<String, Found> found = new TreeMap<>();
  private final List<String> troubles = new ArrayList<>();
  private final Set<Path> seen = new HashSet<>();

  /** What was found, by place in a fixed order. */
  public Collection<Found> found() {
    return found.values();
  }

  /** What could not be looked into, one line each. */
  public List<String> troubles() {
    return troubles;
  }

  /**
   * Looks through folders. The place of a measurement is its path below the folder it was found
   * from, preceded by that folder's name when there are several.
   *
   * @param roots the folders
   * @throws IOException when one of them is not there or cannot be read
   */
  public void look(List<Path> roots) throws IOException {
    for (Path root : roots) {
      String prefix = roots.size() > 1 ? name(root) + "/" : "";
      Files.newDirectoryStream(root).close();
      Files.walkFileTree(
          root,
          EnumSet.of(FileVisitOption.FOLLOW_LINKS),
          Integer.MAX_VALUE,
          new SimpleFileVisitor<Path>() {
            @Override
            public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes)
                throws IOException {
              boolean hidden = !folder.equals(root) && name(folder).startsWith(".");
              if (hidden || !seen.add(folder.toRealPath())) {
                return FileVisitResult.SKIP_SUBTREE;
              }
              if (Files.exists(folder.resolve(MARK))) {
                String below = slashed(root.relativize(folder));
                add(new Found(folder, prefix + (below.isEmpty() ? name(root) : below)));
              }
              return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult visitFileFailed(Path file, IOException trouble) {
              if (!(trouble instanceof FileSystemLoopException)) {
                troubles.add(file + ": this cannot be looked into");
              }
              return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult postVisitDirectory(Path folder, IOException trouble) {
              if (trouble != null) {
                troubles.add(folder + ": this cannot be listed to its end");
              }
              return FileVisitResult.CONTINUE;
            }
          });
    }
  }

  /**
   * Takes folders from a list. The place of a measurement is its path as listed, without what leads
   * out of a folder or to the root of the file system.
   *
   * @param folders the folders, each a measurement
   */
  public void take(List<Path> folders) {
    for (Path folder : folders) {
      List<String> names = new ArrayList<>();
      for (Path part : folder.normalize()) {
        if (!part.toString().equals("..") && !part.toString().isEmpty()) {
          names.add(part.toString());
        }
      }
      add(new Found(folder, names.isEmpty() ? name(folder) : String.join("/", names)));
    }
  }

  private void add(Found each) {
    Found other = found.putIfAbsent(each.place(), each);
    if (other != null && !other.folder().equals(each.folder())) {
      troubles.add(
          each.folder()
              + ": its results would go where those of "
              + other.folder()
              + " go; archive them in runs of their own");
    }
  }

  private static String name(Path folder) {
    Path absolute = folder.toAbsolutePath().normalize();
    return absolute.getFileName() == null ? "root" : absolute.getFileName().toString();
  }

  private static String slashed(Path path) {
    return path.toString().replace(path.getFileSystem().getSeparator(), "/");
  }
}
