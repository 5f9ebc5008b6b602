package org.crossreach.ingest;

import java.util.List;
import java.util.Map;

/** A value in a JSON file, with its place. */
public sealed interface JsonNode {

  /** Where the value stands, for example {@code passes[0].start_bank}; empty for the outermost. */
  String path();

  /** Line of the file in which the value starts, from 1. */
  int line();

  /** The value as a phrase for messages, for example {@code the text "wall"}. */
  String phrase();

  /**
   * An object.
   *
   * @param members its members in the order of the file
   */
  record Members(String path, int line, Map<String, JsonNode> members) implements JsonNode {
    @Override
    public String phrase() {
      return "an object";
    }
  }

  /**
   * An array.
   *
   * @param elements its elements in order
   */
  record Elements(String path, int line, List<JsonNode> elements) implements JsonNode {
    @Override
    public String phrase() {
      return "an array";
    }
  }

  /**
   * A text.
   *
   * @param text its characters
   */
  record Text(String path, int line, String text) implements JsonNode {
    @Override
    public String phrase() {
      return text.isEmpty() ? "an empty text" : "the text " + Quoted.of(text);
    }
  }

  /**
   * A number.
   *
   * @param value the nearest double, infinite when there is none
   * @param written as it stands in the file
   */
  record Number(String path, int line, double value, String written) implements JsonNode {
    @Override
    public String phrase() {
      return Quoted.cut(written);
    }
  }

  /**
   * A truth value.
   *
   * @param value true or false
   */
  record Flag(String path, int line, boolean value) implements JsonNode {
    @Override
    public String phrase() {
      return Boolean.toString(value);
    }
  }

  /** The value {@code null}. */
  record Nothing(String path, int line) implements JsonNode {
    @Override
    public String phrase() {
      return "null";
    }
  }
}
