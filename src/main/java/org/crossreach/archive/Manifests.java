package org.crossreach.archive;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.Iterator;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * The manifests below a folder in the order of their places, each read when it is asked for, so
 * that there may be any number of them.
 *
 * @param target the folder
 * @param places the places that have one
 */
record Manifests(Path target, SortedSet<String> places) implements Iterable<Manifest> {

  /** The manifests that are there now; none when there is no such folder. */
  static Manifests in(Path target) throws IOException {
    SortedSet<String> places = new TreeSet<>();
    if (Files.isDirectory(target)) {
      Files.walkFileTree(target, new Walk(target, places));
    }
    return new Manifests(target, places);
  }

  /** Those that can be read; one that has gone since is passed over. */
  @Override
  public Iterator<Manifest> iterator() {
    return places.stream()
        .map(place -> Manifest.read(target.resolve(place)))
        .flatMap(Optional::stream)
        .iterator();
  }

  private static final class Walk extends SimpleFileVisitor<Path> {
    private final Path target;
    private final SortedSet<String> places;

    Walk(Path target, SortedSet<String> places) {
      this.target = target;
      this.places = places;
    }

    @Override
    public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
      if (file.getFileName().toString().equals(Manifest.NAME)) {
        String place = target.relativize(file.getParent()).toString();
        String separator = file.getFileSystem().getSeparator();
        places.add(place.replace(separator, "/"));
      }
      return FileVisitResult.CONTINUE;
    }

    @Override
    public FileVisitResult visitFileFailed(Path file, IOException unreadable) {
      return FileVisitResult.CONTINUE;
    }
  }
}
