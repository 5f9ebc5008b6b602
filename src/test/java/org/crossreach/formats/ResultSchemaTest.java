package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.FileKind;
import org.crossreach.report.OutputFolder;
import org.crossreach.report.Units;
import org.crossreach.report.result.ResultJson;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every result keeps the published schema, and the schema and page name every key there is. */
class ResultSchemaTest {

  static List<Path> measurements() {
    return Format.measurements();
  }

  private static Result reduce(Path folder, Settings settings) throws Exception {
    return Result.of(Reducer.onAllProcessors().reduce(MeasurementFolder.read(folder), settings));
  }

  private static JsonNode json(Result result) throws Exception {
    ByteArrayOutputStream text = new ByteArrayOutputStream();
    ResultJson.write(result, text);
    return Format.json(text.toString(StandardCharsets.UTF_8));
  }

  private static void assertKept(Result result) throws Exception {
    assertEquals(List.of(), Format.errors("result.schema.json", json(result)));
  }

  @ParameterizedTest
  @MethodSource("measurements")
  void everySampleGivesAResultThatKeepsTheSchema(Path folder) throws Exception {
    assertKept(reduce(folder, SettingsFile.read(folder)));
  }

  @Test
  void otherChoicesKeepTheSchemaToo() throws Exception {
    for (String choices :
        List.of(
            "{\"section\": {\"line\": {\"azimuth_deg\": 90}}, \"method\": \"path-flux\"}",
            "{\"section\": {\"line\": \"common\"}, \"exponent\": {\"rule\": \"fit-all\"}}",
            "{\"exponent\": {\"rule\": \"fit-pass\"}, \"sound_speed\": {\"temperature_degc\": 4}}",
            "{\"screening\": {\"spikes_mps\": 0.3, \"correlation\": \"auto\"}}")) {
      for (Path folder : List.of(Format.EXAMPLE, Format.SAMPLES.resolve("tern-landing-0418"))) {
        assertKept(reduce(folder, SettingsFile.parse(choices, "test", Settings.defaults())));
      }
    }
  }

  @Test
  void aSinglePassKeepsTheSchemaWithNulls() throws Exception {
    Measurement all = MeasurementFolder.read(Format.EXAMPLE);
    List<Pass> passes = new ArrayList<>(all.passes());
    passes.set(1, passes.get(1).withUse(false, "gust"));
    Result result =
        Result.of(Reducer.onAllProcessors().reduce(all.withPasses(passes), Settings.defaults()));
    assertKept(result);
    assertTrue(json(result).at("/summary/discharge_m3s/sd").isNull());
  }

  @Test
  void thePageExplainsEveryKey() throws Exception {
    Set<String> keys = new TreeSet<>();
    JsonNode result = json(reduce(Format.EXAMPLE, SettingsFile.read(Format.EXAMPLE)));
    for (String part : List.of("passes", "summary")) {
      collect(result.get(part), keys);
    }
    result.fieldNames().forEachRemaining(keys::add);
    String page = Format.text("result.md");
    for (String key : keys) {
      assertTrue(
          page.contains("`" + key + "`")
              || page.contains("`" + key + ".")
              || page.contains("." + key + "`")
              || page.contains(key + "[]"),
          "formats/result.md does not explain " + key);
    }
  }

  private static void collect(JsonNode node, Set<String> keys) {
    for (Iterator<String> names = node.fieldNames(); names.hasNext(); ) {
      keys.add(names.next());
    }
    node.forEach(child -> collect(child, keys));
  }

  @Test
  void thePageNamesTheColumnsOfTheTables(@TempDir Path folder) throws Exception {
    OutputFolder files = OutputFolder.claim(folder.resolve("result"));
    FileKind.CSV.write(reduce(Format.EXAMPLE, Settings.defaults()), Units.SI, files);
    String page = Format.text("result.md");
    String header = Format.text(folder.resolve("result/passes.csv")).lines().findFirst().get();
    for (String column : header.split(",")) {
      assertTrue(page.contains("`" + column + "`"), "formats/result.md does not name " + column);
    }
    header = Format.text(folder.resolve("result/pass-01.ensembles.csv")).lines().findFirst().get();
    for (String column : header.split(",")) {
      boolean named = page.contains("`" + column + "`");
      boolean family = column.startsWith("cells_") || column.endsWith("_m2s");
      assertTrue(named || family, "formats/result.md does not name " + column);
    }
  }
}
