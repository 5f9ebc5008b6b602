package org.crossreach.archive;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.crossreach.notation.JsonText;
import org.crossreach.report.CsvTable;

/**
 * The index of an archive, made anew from its manifests: {@code index.json}, {@code
 * index-measurements.csv} and {@code index-passes.csv}.
 */
public final class Index {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-index/1";

  private Index() {}

  /**
   * Writes the index of an archive.
   *
   * @param target folder of the archive
   * @throws CannotKeep when it cannot be written
   */
  public static void write(Path target) throws IOException {
    List<Manifest> manifests = new ArrayList<>();
    for (String place : places(target)) {
      Manifest.read(target.resolve(place)).ifPresent(manifests::add);
    }
    Place folder = new Place(target);
    folder.open();
    folder.write("index.json", stream -> json(manifests, stream));
    List<Map<String, Object>> measurements = new ArrayList<>();
    List<Map<String, Object>> passes = new ArrayList<>();
    for (Manifest each : manifests) {
      Map<String, Object> head = new LinkedHashMap<>();
      head.put("place", each.place());
      Map<String, Object> row = new LinkedHashMap<>(head);
      row.put("outcome", each.done() ? "done" : "failed");
      row.put("problem", each.problems().isEmpty() ? "" : each.problems().get(0));
      each.rows().ifPresent(rows -> row.putAll(rows.measurement()));
      measurements.add(row);
      for (Map<String, Object> pass : each.rows().map(IndexRows::passes).orElse(List.of())) {
        Map<String, Object> passRow = new LinkedHashMap<>(head);
        passRow.putAll(pass);
        passes.add(passRow);
      }
    }
    folder.write("index-measurements.csv", stream -> csv(measurements, stream));
    folder.write("index-passes.csv", stream -> csv(passes, stream));
  }

  /** Places of all manifests below the target, sorted. */
  private static TreeSet<String> places(Path target) throws IOException {
    TreeSet<String> places = new TreeSet<>();
    if (!Files.isDirectory(target)) {
      return places;
    }
    Files.walkFileTree(
        target,
        new SimpleFileVisitor<Path>() {
          @Override
          public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
            if (file.getFileName().toString().equals(Manifest.NAME)) {
              String separator = file.getFileSystem().getSeparator();
              String place = target.relativize(file.getParent()).toString();
              places.add(place.replace(separator, "/"));
            }
            return FileVisitResult.CONTINUE;
          }

          @Override
          public FileVisitResult visitFileFailed(Path file, IOException unreadable) {
            return FileVisitResult.CONTINUE;
          }
        });
    return places;
  }

  private static void json(List<Manifest> manifests, OutputStream stream) throws IOException {
    try (JsonText json = new JsonText(stream)) {
      json.object(
          () -> {
            json.text("format", FORMAT);
            json.objects(
                "measurements",
                manifests,
                (Manifest each) -> {
                  json.text("place", each.place());
                  json.text("outcome", each.done() ? "done" : "failed");
                  json.texts("problems", each.problems());
                  Optional<IndexRows> rows = each.rows();
                  if (rows.isPresent()) {
                    rows.get().write(json);
                  }
                });
          });
    }
  }

  private static void csv(List<Map<String, Object>> rows, OutputStream stream) throws IOException {
    List<String> names = new ArrayList<>();
    for (Map<String, Object> row : rows) {
      for (String name : row.keySet()) {
        if (!names.contains(name)) {
          names.add(name);
        }
      }
    }
    List<CsvTable.Column<Map<String, Object>>> columns = new ArrayList<>();
    for (String name : names) {
      columns.add(new CsvTable.Column<>(name, row -> text(row.get(name))));
    }
    new CsvTable<>(columns).write(rows, stream);
  }

  private static String text(Object value) {
    return value instanceof Double number
        ? CsvTable.text(number)
        : value == null ? "" : value.toString();
  }
}
