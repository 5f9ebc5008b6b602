package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.crossreach.evidence.Comparer;
import org.crossreach.evidence.Comparison;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.comparison.ComparisonCsv;
import org.crossreach.report.comparison.ComparisonJson;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every comparison keeps the published schema, and the page names every key and column. */
class ComparisonSchemaTest {

  static List<Path> measurements() {
    return Format.measurements();
  }

  @ParameterizedTest
  @MethodSource("measurements")
  void everySampleGivesAComparisonThatKeepsTheSchema(Path folder) throws Exception {
    Comparison comparison =
        Comparer.onAllProcessors()
            .compare(MeasurementFolder.read(folder), SettingsFile.read(folder));
    ByteArrayOutputStream text = new ByteArrayOutputStream();
    ComparisonJson.write(List.of(comparison), text);
    JsonNode json = Format.json(text.toString(StandardCharsets.UTF_8));
    assertEquals(List.of(), Format.errors("comparison.schema.json", json));
    String page = Format.text("compare.md");
    for (String key : keys(json, new TreeSet<>())) {
      assertTrue(page.contains("`" + key + "`"), "no word on " + key);
    }
    ByteArrayOutputStream table = new ByteArrayOutputStream();
    ComparisonCsv.write(List.of(comparison), table);
    String header = table.toString(StandardCharsets.UTF_8).lines().findFirst().orElseThrow();
    for (String column : header.split(",")) {
      assertTrue(page.contains("`" + column + "`"), "no word on " + column);
    }
  }

  /**
   * Every key of some JSON, but for what stands in the settings, which have a page of their own.
   */
  private static Set<String> keys(JsonNode json, Set<String> keys) {
    for (Iterator<String> names = json.fieldNames(); names.hasNext(); ) {
      String name = names.next();
      keys.add(name);
      if (!name.equals("settings")) {
        keys(json.get(name), keys);
      }
    }
    for (JsonNode element : json) {
      if (json.isArray()) {
        keys(element, keys);
      }
    }
    return keys;
  }
}
