package org.crossreach.formats;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;

/** The published formats: pages, schemas and what stands in them. */
final class Format {

  static final Path FOLDER = Path.of("formats");
  static final Path EXAMPLE = FOLDER.resolve("example");
  static final Path SAMPLES = Path.of("sample-transects");

  private static final String HOME = "https://crossreach.invalid/formats/";
  private static final ObjectMapper JSON = new ObjectMapper();
  private static final SchemaRegistry REGISTRY =
      SchemaRegistry.withDefaultDialect(
          SpecificationVersion.DRAFT_2020_12,
          builder ->
              builder.schemas(
                  Map.of(
                      HOME + "measurement.schema.json", text("measurement.schema.json"),
                      HOME + "settings.schema.json", text("settings.schema.json"),
                      HOME + "result.schema.json", text("result.schema.json"),
                      HOME + "comparison.schema.json", text("comparison.schema.json"),
                      HOME + "check.schema.json", text("check.schema.json"),
                      HOME + "recipe.schema.json", text("recipe.schema.json"),
                      HOME + "truth.schema.json", text("truth.schema.json"),
                      HOME + "manifest.schema.json", text("manifest.schema.json"),
                      HOME + "index.schema.json", text("index.schema.json"))));

  private Format() {}

  /** A file of the formats' folder. */
  static String text(String name) {
    return text(FOLDER.resolve(name));
  }

  static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  static JsonNode json(String text) {
    try {
      return JSON.readTree(text);
    } catch (JsonProcessingException broken) {
      throw new IllegalArgumentException(text, broken);
    }
  }

  static Schema schema(String name) {
    return REGISTRY.getSchema(SchemaLocation.of(HOME + name));
  }

  /** What a schema has against some JSON; empty when it keeps the schema. */
  static List<Error> errors(String schema, JsonNode json) {
    return schema(schema).validate(json);
  }

  /** The folders of the samples and of the example. */
  static List<Path> measurements() {
    try (Stream<Path> entries = Files.list(SAMPLES)) {
      List<Path> folders = new ArrayList<>(entries.filter(Files::isDirectory).sorted().toList());
      folders.add(EXAMPLE);
      return folders;
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  /** Every key that stands anywhere in the properties of a schema. */
  static Set<String> keys(String schema) {
    Set<String> keys = new TreeSet<>();
    for (JsonNode properties : json(text(schema)).findValues("properties")) {
      properties.fieldNames().forEachRemaining(keys::add);
    }
    return keys;
  }

  /** The blocks of a language in a page. */
  static List<String> blocks(String page, String language) {
    List<String> blocks = new ArrayList<>();
    String text = text(page);
    String open = "```" + language + "\n";
    for (int from = text.indexOf(open); from >= 0; from = text.indexOf(open, from + 1)) {
      blocks.add(text.substring(from + open.length(), text.indexOf("```\n", from + 3)));
    }
    return blocks;
  }
}
