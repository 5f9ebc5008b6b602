package org.crossreach.ingest;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonFactoryBuilder;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Reads JSON (RFC 8259) into a tree in which every value knows its path and its line.
 *
 * <p>A repeated key is a problem, and its first value counts. An error of syntax is a problem too
 * and ends the reading. Bounds: {@value #LARGEST} bytes, {@value #DEEPEST} levels.
 */
public final class JsonTree {

  /** Most bytes in a JSON file: 16 MiB. */
  public static final int LARGEST = 16 << 20;

  private static final int DEEPEST = 60;

  private static final JsonFactory FACTORY =
      new JsonFactoryBuilder()
          .streamReadConstraints(
              StreamReadConstraints.builder()
                  .maxNestingDepth(DEEPEST)
                  .maxStringLength(LARGEST)
                  .build())
          .build();

  private final JsonParser parser;
  private final FileProblems problems;

  private JsonTree(JsonParser parser, FileProblems problems) {
    this.parser = parser;
    this.problems = problems;
  }

  /**
   * Reads the bytes of a file.
   *
   * @param bytes UTF-8 text, with or without a byte-order mark
   * @param problems receives what is wrong
   * @return the outermost value, empty when there is none that can be used
   */
  public static Optional<JsonNode> parse(byte[] bytes, FileProblems problems) {
    StringWriter text = new StringWriter(bytes.length);
    try {
      new StrictUtf8Reader(new ByteArrayInputStream(bytes)).transferTo(text);
    } catch (UnreadableText e) {
      long line = 1 + text.toString().chars().filter(character -> character == '\n').count();
      problems.add(line, "", e.found(), e.expected(), e.remedy());
      return Optional.empty();
    } catch (IOException e) {
      throw new IllegalStateException("reading from memory cannot fail", e);
    }
    return parse(text.toString(), problems);
  }

  /**
   * Reads a text.
   *
   * @param text JSON
   * @param problems receives what is wrong
   * @return the outermost value, empty when there is none that can be used
   */
  public static Optional<JsonNode> parse(String text, FileProblems problems) {
    if (text.isBlank()) {
      problems.add(0, "", "an empty file", "JSON", "");
      return Optional.empty();
    }
    try (JsonParser parser = FACTORY.createParser(text)) {
      parser.nextToken();
      JsonTree tree = new JsonTree(parser, problems);
      JsonNode outermost = tree.value("");
      if (parser.nextToken() != null) {
        problems.add(
            tree.line(), "", "more after the end", "one JSON value", "remove what follows");
        return Optional.empty();
      }
      return Optional.of(outermost);
    } catch (JsonProcessingException e) {
      long line = e.getLocation() == null ? 0 : Math.max(0, e.getLocation().getLineNr());
      problems.add(line, "", complaint(e), "JSON", "correct the text at this place");
      return Optional.empty();
    } catch (IOException e) {
      throw new IllegalStateException("reading from memory cannot fail", e);
    }
  }

  /** The parser's complaint as one short phrase. */
  private static String complaint(JsonProcessingException failure) {
    String message = failure.getOriginalMessage();
    // what is behind these tells of the parser's own affairs
    String first = before("\n", before(" (start marker at", message));
    String place =
        failure.getLocation() == null
            ? ""
            : " (column " + failure.getLocation().getColumnNr() + ")";
    return "an error of syntax" + place + ": " + Quoted.cut(first, 160);
  }

  private static String before(String mark, String text) {
    int end = text.indexOf(mark);
    return end < 0 ? text : text.substring(0, end);
  }

  private int line() {
    return parser.currentTokenLocation().getLineNr();
  }

  private JsonNode value(String path) throws IOException {
    JsonToken token = parser.currentToken();
    int line = line();
    return switch (token) {
      case START_OBJECT -> members(path, line);
      case START_ARRAY -> elements(path, line);
      case VALUE_STRING -> text(path, line);
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> number(path, line);
      case VALUE_TRUE, VALUE_FALSE -> new JsonNode.Flag(path, line, token == JsonToken.VALUE_TRUE);
      case VALUE_NULL -> new JsonNode.Nothing(path, line);
      case END_OBJECT, END_ARRAY, FIELD_NAME, NOT_AVAILABLE, VALUE_EMBEDDED_OBJECT ->
          throw new IllegalStateException("no value starts with " + token);
    };
  }

  private JsonNode members(String path, int line) throws IOException {
    Map<String, JsonNode> members = new LinkedHashMap<>();
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String key = parser.currentName();
      int keyLine = line();
      String keyPath = path.isEmpty() ? key : path + "." + key;
      parser.nextToken();
      JsonNode value = value(keyPath);
      JsonNode first = members.putIfAbsent(key, value);
      if (first != null) {
        problems.add(
            keyLine,
            keyPath,
            "the key once more, after line " + first.line(),
            "every key once",
            "remove one of the two");
      }
    }
    return new JsonNode.Members(path, line, members);
  }

  private JsonNode elements(String path, int line) throws IOException {
    List<JsonNode> elements = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      elements.add(value(path + "[" + elements.size() + "]"));
    }
    return new JsonNode.Elements(path, line, elements);
  }

  private JsonNode text(String path, int line) throws IOException {
    String text = parser.getText();
    if (!StandardCharsets.UTF_8.newEncoder().canEncode(text)) {
      problems.add(line, path, "half of a surrogate pair", "whole characters", "correct the text");
    }
    return new JsonNode.Text(path, line, text);
  }

  private JsonNode number(String path, int line) throws IOException {
    String written = parser.getText();
    char[] digits = written.toCharArray();
    return new JsonNode.Number(path, line, Decimal.parse(digits, 0, digits.length), written);
  }
}
