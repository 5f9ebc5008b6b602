package org.crossreach.archive;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.ingest.FileProblems;
import org.crossreach.ingest.JsonFields;
import org.crossreach.ingest.JsonTree;
import org.crossreach.notation.JsonText;
import org.crossreach.report.ProgramVersion;

/**
 * What was made of one measurement, out of which bytes: the file that makes it done.
 *
 * @param version version of the program
 * @param place where the results stand below the target
 * @param kinds kinds of files, as one text
 * @param units units of what people read
 * @param overriding choices in place of the measurement's own, as one text
 * @param inputs every file that was read
 * @param products every file that was written beside the manifest
 * @param problems why nothing could be made of it; empty when it is done
 * @param rows what the index says about it
 */
record Manifest(
    String version,
    String place,
    String kinds,
    String units,
    String overriding,
    List<Place.Kept> inputs,
    List<Place.Kept> products,
    List<String> problems,
    Optional<IndexRows> rows) {

  static final String NAME = "manifest.json";
  static final String FORMAT = "crossreach-manifest/1";

  Manifest {
    inputs = List.copyOf(inputs);
    products = List.copyOf(products);
    problems = List.copyOf(problems);
  }

  boolean done() {
    return rows.isPresent();
  }

  /** What became of the measurement, as one word. */
  String outcome() {
    return done() ? "done" : "failed";
  }

  /** Whether it still holds: made by the same program and plan, from the same bytes, all there. */
  boolean holds(Plan plan, Found found, Path folder) {
    return done()
        && version.equals(ProgramVersion.read())
        && place.equals(found.place())
        && kinds.equals(plan.kindKeys())
        && units.equals(plan.units().key())
        && overriding.equals(plan.overriding())
        && sameSettingsFile(found)
        && inputs.stream().allMatch(each -> Place.same(found.folder(), each))
        && products.stream().allMatch(each -> Place.same(folder, each));
  }

  /** A settings.json that has come since is not among the inputs. */
  private boolean sameSettingsFile(Found found) {
    boolean listed = inputs.stream().anyMatch(each -> each.name().equals("settings.json"));
    return listed == Files.exists(found.folder().resolve("settings.json"));
  }

  void write(OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      write(json);
    }
  }

  private void write(JsonText json) throws IOException {
    json.object(
        () -> {
          json.text("format", FORMAT);
          ProgramVersion.write(version, json);
          json.text("place", place);
          json.text("kinds", kinds);
          json.text("units", units);
          json.text("overriding", overriding);
          json.text("outcome", outcome());
          json.texts("problems", problems);
          json.objects("inputs", inputs, each -> kept("file", each, json));
          json.objects("products", products, each -> kept("file", each, json));
          if (rows.isPresent()) {
            rows.get().write(json);
          }
        });
  }

  private static void kept(String key, Place.Kept kept, JsonText json) throws IOException {
    json.text(key, kept.name());
    json.whole("bytes", kept.size());
    json.text("sha256", kept.sha256());
  }

  /** Reads a manifest; empty when there is none that can be read. */
  static Optional<Manifest> read(Path folder) {
    Path file = folder.resolve(NAME);
    try {
      if (!Files.isRegularFile(file)) {
        return Optional.empty();
      }
      FileProblems problems = new FileProblems(NAME);
      JsonFields root = JsonFields.of(JsonTree.parse(Files.readAllBytes(file), problems), problems);
      root.oneOf("format", List.of(FORMAT));
      Manifest manifest =
          new Manifest(
              root.object("program").text("version"),
              root.text("place"),
              root.text("kinds"),
              root.text("units"),
              root.text("overriding"),
              kept(root.findObjects("inputs")),
              kept(root.findObjects("products")),
              root.texts("problems"),
              root.findObject("measurement")
                  .map(measurement -> IndexRows.of(measurement, root.findObjects("passes"))));
      return problems.isEmpty() ? Optional.of(manifest) : Optional.empty();
    } catch (IOException unreadable) {
      return Optional.empty();
    }
  }

  private static List<Place.Kept> kept(List<JsonFields> files) {
    List<Place.Kept> all = new ArrayList<>();
    for (JsonFields each : files) {
      all.add(
          new Place.Kept(
              each.text("file"), each.whole("bytes", 0, Long.MAX_VALUE >> 1), each.text("sha256")));
    }
    return all;
  }
}
