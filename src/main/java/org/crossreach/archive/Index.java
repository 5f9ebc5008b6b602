package org.crossreach.archive;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.StreamSupport;
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
   * Writes the index of an archive, reading one manifest at a time.
   *
   * <p>Of runs that end together each waits for its turn, so that the last index has the
   * measurements of all.
   *
   * @param target folder of the archive
   * @throws CannotKeep when it cannot be written
   */
  public static void write(Path target) throws IOException {
    Place folder = new Place(target);
    folder.open();
    IndexTurn turn = IndexTurn.await(target);
    try {
      Manifests manifests = Manifests.in(target);
      folder.write("index.json", stream -> json(manifests, stream));
      folder.write("index-measurements.csv", stream -> measurements(manifests, stream));
      folder.write("index-passes.csv", stream -> passes(manifests, stream));
    } finally {
      turn.end();
    }
  }

  private static void json(Manifests manifests, OutputStream stream) throws IOException {
    try (JsonText json = new JsonText(stream)) {
      json.object(
          () -> {
            json.text("format", FORMAT);
            json.objects(
                "measurements",
                manifests,
                (Manifest each) -> {
                  json.text("place", each.place());
                  json.text("outcome", each.outcome());
                  json.texts("problems", each.problems());
                  Optional<IndexRows> rows = each.rows();
                  if (rows.isPresent()) {
                    rows.get().write(json);
                  }
                });
          });
    }
  }

  private static void measurements(Manifests manifests, OutputStream stream) throws IOException {
    List<CsvTable.Column<Manifest>> columns = new ArrayList<>();
    columns.add(new CsvTable.Column<>("place", Manifest::place));
    columns.add(new CsvTable.Column<>("outcome", Manifest::outcome));
    columns.add(
        new CsvTable.Column<>(
            "problem", each -> each.problems().isEmpty() ? "" : each.problems().get(0)));
    for (String name : IndexRows.MEASUREMENT) {
      columns.add(
          new CsvTable.Column<>(
              name, each -> each.rows().map(rows -> text(rows.measurement(), name)).orElse("")));
    }
    new CsvTable<>(columns).write(manifests, stream);
  }

  private static void passes(Manifests manifests, OutputStream stream) throws IOException {
    List<CsvTable.Column<Map<String, Object>>> columns = new ArrayList<>();
    columns.add(new CsvTable.Column<>("place", row -> text(row, "place")));
    for (String name : IndexRows.PASS) {
      columns.add(new CsvTable.Column<>(name, row -> text(row, name)));
    }
    new CsvTable<>(columns)
        .write(
            () ->
                StreamSupport.stream(manifests.spliterator(), /* parallel= */ false)
                    .flatMap(each -> passes(each).stream())
                    .iterator(),
            stream);
  }

  private static List<Map<String, Object>> passes(Manifest manifest) {
    List<Map<String, Object>> passes = new ArrayList<>();
    for (Map<String, Object> pass : manifest.rows().map(IndexRows::passes).orElse(List.of())) {
      Map<String, Object> row = new LinkedHashMap<>(pass);
      row.put("place", manifest.place());
      passes.add(row);
    }
    return passes;
  }

  private static String text(Map<String, Object> row, String name) {
    Object value = row.get(name);
    return value instanceof Double number
        ? CsvTable.text(number)
        : value == null ? "" : value.toString();
  }
}
