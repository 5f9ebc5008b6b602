package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.stream.Stream;
import org.crossreach.archive.ArchiveRun;
import org.crossreach.archive.Finder;
import org.crossreach.archive.Index;
import org.crossreach.archive.Plan;
import org.crossreach.report.FileKind;
import org.crossreach.report.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Manifests and index of an archive keep their schemas, of good and of bad measurements. */
class ArchiveSchemaTest {

  private static final Path REPORTS = Path.of("reports");

  @TempDir Path folder;

  private static List<Path> named(Path root, String name) throws IOException {
    try (Stream<Path> files = Files.walk(root)) {
      return files.filter(each -> each.endsWith(name)).sorted().toList();
    }
  }

  private static void assertKept(Path root, int measurements) throws IOException {
    List<Path> manifests = named(root, "manifest.json");
    assertEquals(measurements, manifests.size());
    for (Path each : manifests) {
      assertEquals(
          List.of(),
          Format.errors("manifest.schema.json", Format.json(Format.text(each))),
          each.toString());
    }
    JsonNode index = Format.json(Format.text(root.resolve("index.json")));
    assertEquals(List.of(), Format.errors("index.schema.json", index));
    assertEquals(measurements, index.at("/measurements").size());
  }

  @Test
  void theReportsOfTheSamplesKeepTheSchemas() throws Exception {
    assertKept(REPORTS, Format.measurements().size() - 1);
  }

  @Test
  void soDoThoseOfAMeasurementThatFailedAndOfASinglePass() throws Exception {
    Path bad = Files.createDirectories(folder.resolve("tree/bad"));
    Files.writeString(bad.resolve("measurement.json"), "{");
    Path single = Files.createDirectories(folder.resolve("tree/single"));
    try (Stream<Path> files = Files.list(Format.EXAMPLE)) {
      for (Path file : files.toList()) {
        Files.copy(file, single.resolve(file.getFileName()));
      }
    }
    ObjectNode facts =
        (ObjectNode) Format.json(Format.text(Format.EXAMPLE.resolve("measurement.json")));
    facts.withArray("/passes").remove(1);
    Files.writeString(single.resolve("measurement.json"), facts.toString());
    Finder finder = new Finder();
    finder.look(List.of(folder.resolve("tree")));
    Path target = folder.resolve("archive");
    Plan plan = new Plan(target, EnumSet.of(FileKind.JSON), Units.SI, 1, "");
    new ArchiveRun(plan, outcome -> {}).keep(finder.found());
    Index.write(target);
    assertKept(target, 2);
  }

  @Test
  void theSchemaOfManifestsRefusesHalfOfOne() throws Exception {
    Path any = named(REPORTS, "manifest.json").get(0);
    ObjectNode manifest = (ObjectNode) Format.json(Format.text(any));
    for (String key : List.of("format", "place", "products", "measurement", "passes")) {
      ObjectNode without = manifest.deepCopy().without(key);
      assertFalse(Format.errors("manifest.schema.json", without).isEmpty(), key);
    }
    manifest.put("outcome", "failed");
    assertFalse(Format.errors("manifest.schema.json", manifest).isEmpty(), "failed, yet with rows");
  }

  @Test
  void thePageNamesEveryKey() {
    String page = Format.text("archive.md");
    for (String schema : List.of("manifest.schema.json", "index.schema.json")) {
      assertTrue(page.contains(schema), "no word on " + schema);
      for (String key : Format.keys(schema)) {
        assertTrue(page.contains("`" + key) || page.contains(key + "`"), "no word on " + key);
      }
    }
  }
}
