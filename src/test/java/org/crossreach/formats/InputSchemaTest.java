package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.SettingsJson;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The schemas of measurement.json and settings.json accept what the readers accept and refuse what
 * they refuse.
 */
class InputSchemaTest {

  /** What readers refuse and a schema cannot say: other files, and members beside each other. */
  private static final Agreement AGREEMENT =
      new Agreement(
          List.of(
              "which is not there",
              "every pass under a name of its own",
              "a stage above",
              "where the segment before ends",
              "at least from_ensemble",
              "beam_azimuths_deg"));

  @TempDir Path folder;

  @BeforeEach
  void copyExample() throws IOException {
    try (var files = Files.newDirectoryStream(Format.EXAMPLE, "*.csv")) {
      for (Path file : files) {
        Files.copy(file, folder.resolve(file.getFileName()));
      }
    }
  }

  static List<Path> measurements() {
    return Format.measurements();
  }

  @ParameterizedTest
  @MethodSource("measurements")
  void everySampleKeepsTheSchemas(Path sample) {
    for (String name : List.of("measurement", "settings")) {
      Path file = sample.resolve(name + ".json");
      if (Files.exists(file)) {
        assertEquals(
            List.of(), Format.errors(name + ".schema.json", Format.json(Format.text(file))));
      }
    }
  }

  @Test
  void theSchemaOfMeasurementsIsTheReader() {
    ObjectNode example =
        (ObjectNode) Format.json(Format.text(Format.EXAMPLE.resolve("measurement.json")));
    example.withObject("/instrument").put("sound_speed_used_mps", 1500);
    example
        .withArray("/moving_bed_tests")
        .addObject()
        .put("kind", "loop")
        .put("file", "pass-01.csv");
    ObjectNode given = (ObjectNode) example.at("/passes/1/right_edge");
    given.removeAll().put("distance_m", 5.2).put("discharge_m3s", 1.9);
    AGREEMENT.check("measurement.schema.json", example, this::problemsOfMeasurement);
  }

  @Test
  void theSchemaOfSettingsIsTheReader() {
    ObjectNode example =
        (ObjectNode) Format.json(Format.text(Format.EXAMPLE.resolve("settings.json")));
    example.withObject("/screening").put("spikes_mps", 0.4);
    example.withObject("/sound_speed").put("temperature_degc", 11.5);
    AGREEMENT.check("settings.schema.json", example, InputSchemaTest::problemsOfSettings);
    example
        .withObject("/section")
        .withObject("/line", JsonNode.OverwriteMode.ALL, true)
        .put("azimuth_deg", 62);
    AGREEMENT.check("settings.schema.json", example, InputSchemaTest::problemsOfSettings);
  }

  private List<Problem> problemsOfMeasurement(String json) {
    try {
      Files.writeString(folder.resolve("measurement.json"), json);
      MeasurementFolder.read(folder);
      return List.of();
    } catch (UnusableInput unusable) {
      return unusable.problems();
    } catch (IOException unreadable) {
      throw new IllegalStateException(unreadable);
    }
  }

  private static List<Problem> problemsOfSettings(String json) {
    try {
      SettingsFile.parse(json, "settings.json", Settings.defaults());
      return List.of();
    } catch (UnusableInput unusable) {
      return unusable.problems();
    }
  }

  @Test
  void theSchemaStatesTheDefaults() throws Exception {
    ByteArrayOutputStream text = new ByteArrayOutputStream();
    SettingsJson.write(Settings.defaults(), text);
    JsonNode defaults = Format.json(text.toString(StandardCharsets.UTF_8));
    assertDefaults(Format.json(Format.text("settings.schema.json")), defaults, "");
  }

  private static void assertDefaults(JsonNode schema, JsonNode value, String path) {
    if (schema.has("default")) {
      assertTrue(
          schema.get("default").equals(value)
              || schema.get("default").isNumber()
                  && schema.get("default").asDouble() == value.asDouble(),
          path + ": " + schema.get("default") + " but " + value);
    } else if (schema.has("properties")) {
      Set<String> stated = new TreeSet<>();
      schema.get("properties").fieldNames().forEachRemaining(stated::add);
      Set<String> written = new TreeSet<>();
      value.fieldNames().forEachRemaining(written::add);
      assertEquals(stated, written, path);
      stated.forEach(
          key ->
              assertDefaults(schema.get("properties").get(key), value.get(key), path + "/" + key));
    }
  }

  @Test
  void theExamplesOfThePagesAreRead() {
    for (String json : Format.blocks("settings.md", "json")) {
      assertEquals(List.of(), problemsOfSettings(json));
    }
    for (String json : Format.blocks("measurement.md", "json")) {
      assertEquals(List.of(), problemsOfMeasurement(json));
    }
  }

  @ParameterizedTest
  @MethodSource("inputPages")
  void thePagesNameEveryKeyAndChoice(String name) {
    String page = Format.text(name + ".md");
    JsonNode schema = Format.json(Format.text(name + ".schema.json"));
    for (JsonNode properties : schema.findValues("properties")) {
      properties
          .fieldNames()
          .forEachRemaining(
              key ->
                  assertTrue(
                      page.matches("(?s).*[`.…]" + key + "(\\[\\])?[`.].*"),
                      name + ".md does not explain " + key));
    }
    for (JsonNode choices : schema.findValues("enum")) {
      for (JsonNode choice : choices) {
        assertTrue(
            choice.isNull() || page.contains(choice.asText()),
            name + ".md does not name " + choice);
      }
    }
  }

  static List<String> inputPages() {
    return List.of("measurement", "settings");
  }
}
