package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import org.crossreach.survey.Problem;

/**
 * Whether a schema accepts what a reader accepts and refuses what it refuses: every member of an
 * example is left out, replaced and put beside a stranger, and every number is moved to the ends of
 * every range there is and beyond them.
 *
 * @param beyondASchema words of the problems that a schema cannot say
 */
record Agreement(List<String> beyondASchema) {

  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  /** Reads JSON and tells what is wrong with it. */
  interface Reader {
    List<Problem> problems(String json);
  }

  /**
   * Compares schema and reader on every change of an example.
   *
   * @param schema file of the schema
   * @param example what both accept
   * @param reader the reader
   */
  void check(String schema, ObjectNode example, Reader reader) {
    Set<String> seen = new HashSet<>();
    List<String> disagreements = new ArrayList<>();
    vary(
        example,
        replacements(Format.json(Format.text(schema))),
        () -> {
          String json = example.toString();
          if (!seen.add(json)) {
            return;
          }
          boolean kept = Format.errors(schema, Format.json(json)).isEmpty();
          List<Problem> problems = reader.problems(json);
          boolean beyond =
              problems.stream()
                  .allMatch(each -> beyondASchema.stream().anyMatch(each.toString()::contains));
          if (kept ? !beyond : problems.isEmpty()) {
            disagreements.add((kept ? "schema accepts " : "reader accepts ") + json + problems);
          }
        });
    assertTrue(seen.size() > 300, "only " + seen.size() + " variants");
    assertEquals(List.of(), disagreements.stream().limit(3).toList());
  }

  /** One of each type, and every end of a range in the schema with its neighbours. */
  private static List<JsonNode> replacements(JsonNode schema) {
    List<JsonNode> values = new ArrayList<>();
    values.add(NODES.nullNode());
    values.add(NODES.booleanNode(true));
    values.add(NODES.textNode("neither"));
    values.add(NODES.textNode(""));
    values.add(NODES.objectNode());
    values.add(NODES.arrayNode());
    values.add(NODES.arrayNode().add("text"));
    values.add(NODES.arrayNode().add(1));
    Set<Double> ends = new TreeSet<>();
    for (String key : List.of("minimum", "maximum")) {
      schema.findValues(key).forEach(end -> ends.add(end.asDouble()));
    }
    for (double end : ends) {
      for (double value : List.of(Math.nextDown(end), end, Math.nextUp(end))) {
        values.add(
            value == Math.rint(value) && Math.abs(value) < 1e15
                ? NODES.numberNode((long) value)
                : NODES.numberNode(value));
      }
    }
    return values;
  }

  /** Runs a check on the tree with every single change; afterwards the tree is as it was. */
  private static void vary(JsonNode node, List<JsonNode> values, Runnable check) {
    check.run();
    if (node instanceof ObjectNode object) {
      object.put("stranger", 1);
      check.run();
      object.remove("stranger");
      List<String> names = new ArrayList<>();
      object.fieldNames().forEachRemaining(names::add);
      for (String name : names) {
        JsonNode member = object.get(name);
        replace(value -> object.set(name, value), member, values, check);
        ObjectNode whole = object.deepCopy();
        object.remove(name);
        check.run();
        object.removeAll();
        object.setAll(whole);
        vary(object.get(name), values, check);
      }
    } else if (node instanceof ArrayNode array) {
      for (int i = 0; i < array.size(); i++) {
        int place = i;
        replace(value -> array.set(place, value), array.get(i), values, check);
        vary(array.get(i), values, check);
      }
    }
  }

  private static void replace(
      Consumer<JsonNode> setter, JsonNode member, List<JsonNode> values, Runnable check) {
    for (JsonNode value : values) {
      setter.accept(value);
      check.run();
    }
    setter.accept(member);
  }
}
