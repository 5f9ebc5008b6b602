package org.crossreach.archive;

import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeMap;

/**
 * Finds measurement folders: those that hold a {@code measurement.json}.
 *
 * <p>Links are followed, each real folder once and under its own name before any link's; folders
 * whose names begin with a point are passed over. What cannot be entered is kept as a trouble and
 * stops nothing.
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
      Deque<Path> folders = new ArrayDeque<>(List.of(root));
      Deque<Path> links = new ArrayDeque<>();
      while (!folders.isEmpty() || !links.isEmpty()) {
        Path folder = folders.isEmpty() ? links.removeFirst() : folders.removeFirst();
        try {
          if (seen.add(folder.toRealPath())) {
            enter(folder, root, prefix, folders, links);
          }
        } catch (IOException | DirectoryIteratorException trouble) {
          troubles.add(folder + ": this cannot be looked into");
        }
      }
    }
  }

  /** Looks at one folder; what it holds comes in the order of names, links after all else. */
  private void enter(Path folder, Path root, String prefix, Deque<Path> folders, Deque<Path> links)
      throws IOException {
    List<Path> inside = new ArrayList<>();
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
      for (Path each : entries) {
        if (!name(each).startsWith(".") && Files.isDirectory(each)) {
          inside.add(each);
        }
      }
    }
    inside.sort(null);
    for (Path each : inside) {
      (Files.isSymbolicLink(each) ? links : folders).addLast(each);
    }
    if (Files.exists(folder.resolve(MARK))) {
      String below = slashed(root.relativize(folder));
      add(new Found(folder, prefix + (below.isEmpty() ? name(root) : below)));
    }
  }

  /**
   * Takes folders from a list, each real folder once and as it is written first. The place of a
   * measurement is its path as listed, without what leads out of a folder or to the root of the
   * file system.
   *
   * @param lines the paths of the folders, each a measurement
   */
  public void take(List<String> lines) {
    for (String line : lines) {
      try {
        Path folder = Path.of(line);
        if (seen.add(real(folder))) {
          add(new Found(folder, listedPlace(folder)));
        }
      } catch (InvalidPathException noPath) {
        troubles.add(noPath.getReason() + " in the list: " + printable(line));
      }
    }
  }

  private static Path real(Path folder) {
    try {
      return folder.toRealPath();
    } catch (IOException missing) {
      return folder.toAbsolutePath().normalize();
    }
  }

  private static String listedPlace(Path folder) {
    List<String> names = new ArrayList<>();
    for (Path part : folder.normalize()) {
      if (!part.toString().equals("..") && !part.toString().isEmpty()) {
        names.add(part.toString());
      }
    }
    return names.isEmpty() ? name(folder) : String.join("/", names);
  }

  private static String printable(String line) {
    StringBuilder shown = new StringBuilder();
    line.chars().forEach(c -> shown.append(Character.isISOControl(c) ? '?' : (char) c));
    return shown.toString();
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
