package org.crossreach.ingest;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.crossreach.settings.Choice;

/**
 * The members of a JSON object, asked for one by one by name and type.
 *
 * <p>What is missing, of the wrong type or out of range becomes a problem with path and line, and a
 * stand-in value is returned, so that reading goes on and all problems of a file come together.
 * Asking for a key makes it a valid one; {@link #finish()} then reports every key that was not
 * asked for. An optional member that is {@code null} counts as absent. Not to be shared between
 * threads.
 */
public final class JsonFields {

  private final String path;
  private final int line;
  private final Map<String, JsonNode> members;
  private final FileProblems problems;
  private final Set<String> known = new LinkedHashSet<>();
  private final List<JsonFields> opened = new ArrayList<>();

  private JsonFields(JsonNode.Members object, FileProblems problems) {
    path = object.path();
    line = object.line();
    members = object.members();
    this.problems = problems;
  }

  /**
   * The members of a file's outermost value.
   *
   * @param outermost the value, empty when it could not be read
   * @param problems receives what is wrong
   * @return the members, none of them when the value is not an object
   */
  public static JsonFields of(Optional<JsonNode> outermost, FileProblems problems) {
    JsonNode node = outermost.orElse(null);
    if (node instanceof JsonNode.Members object) {
      return new JsonFields(object, problems);
    }
    if (node != null) {
      problems.add(node.line(), node.path(), node.phrase(), "an object", "");
    }
    return new JsonFields(new JsonNode.Members("", 1, Map.of()), problems);
  }

  /** Path of the object in its file. */
  public String path() {
    return path;
  }

  /** Line in which the object starts. */
  public int line() {
    return line;
  }

  /** Path of one of its members. */
  public String path(String key) {
    return path.isEmpty() ? key : path + "." + key;
  }

  /** Line of one of its members, that of the object when it is absent. */
  public int line(String key) {
    JsonNode node = members.get(key);
    return node == null ? line : node.line();
  }

  /** All members as they stand in the file; all of them count as known. */
  public Map<String, JsonNode> members() {
    known.addAll(members.keySet());
    return Collections.unmodifiableMap(members);
  }

  /** Whether a member is there and not {@code null}. */
  public boolean has(String key) {
    known.add(key);
    JsonNode node = members.get(key);
    return node != null && !(node instanceof JsonNode.Nothing);
  }

  /** The member as it stands in the file, empty when it is absent. */
  public Optional<JsonNode> find(String key) {
    return has(key) ? Optional.of(members.get(key)) : Optional.empty();
  }

  /** Adds a problem with a member. */
  public void refuse(String key, String found, String expected, String remedy) {
    problems.add(line(key), path(key), found, expected, remedy);
  }

  private JsonNode require(String key, String expected) {
    if (has(key)) {
      return members.get(key);
    }
    JsonNode present = members.get(key);
    refuse(key, present == null ? "no such key" : present.phrase(), expected, remedyFor(key));
    return null;
  }

  private String remedyFor(String key) {
    List<String> others = new ArrayList<>(members.keySet());
    others.removeAll(known);
    return NearestName.find(key, others)
        .map(near -> "rename " + Quoted.of(near) + " to " + key)
        .orElse("add it");
  }

  private void refuseType(JsonNode node, String expected) {
    problems.add(node.line(), node.path(), node.phrase(), expected, "");
  }

  /** A required text. */
  public String text(String key) {
    JsonNode node = require(key, "a text");
    return node == null ? "" : textOf(node, "");
  }

  /** An optional text. */
  public String text(String key, String fallback) {
    return has(key) ? textOf(members.get(key), fallback) : fallback;
  }

  private String textOf(JsonNode node, String fallback) {
    if (node instanceof JsonNode.Text text) {
      return text.text();
    }
    refuseType(node, "a text");
    return fallback;
  }

  /** A required number; NaN after a problem. */
  public double number(String key, double lowest, double highest) {
    return number(key, new PhysicalRange(lowest, highest, ""));
  }

  /** An optional number; the fallback also after a problem. */
  public double number(String key, double lowest, double highest, double fallback) {
    return number(key, new PhysicalRange(lowest, highest, ""), fallback);
  }

  double number(String key, PhysicalRange range) {
    JsonNode node = require(key, range.phrase());
    return node == null ? Double.NaN : numberOf(node, range, Double.NaN);
  }

  double number(String key, PhysicalRange range, double fallback) {
    return has(key) ? numberOf(members.get(key), range, fallback) : fallback;
  }

  private double numberOf(JsonNode node, PhysicalRange range, double fallback) {
    if (node instanceof JsonNode.Number number && range.holds(number.value())) {
      return number.value();
    }
    refuseType(node, range.phrase());
    return fallback;
  }

  /** An optional whole number; the fallback also after a problem. */
  public long whole(String key, long lowest, long highest, long fallback) {
    return has(key) ? wholeOf(members.get(key), lowest, highest, fallback) : fallback;
  }

  /** A required whole number; the lowest one after a problem. */
  public long whole(String key, long lowest, long highest) {
    JsonNode node = require(key, "a whole number from " + lowest + " to " + highest);
    return node == null ? lowest : wholeOf(node, lowest, highest, lowest);
  }

  private long wholeOf(JsonNode node, long lowest, long highest, long fallback) {
    if (node instanceof JsonNode.Number number
        && number.value() == Math.rint(number.value())
        && number.value() >= lowest
        && number.value() <= highest) {
      return (long) number.value();
    }
    refuseType(node, "a whole number from " + lowest + " to " + highest);
    return fallback;
  }

  /** An optional truth value; the fallback also after a problem. */
  public boolean flag(String key, boolean fallback) {
    if (!has(key)) {
      return fallback;
    }
    if (members.get(key) instanceof JsonNode.Flag flag) {
      return flag.value();
    }
    refuseType(members.get(key), "true or false");
    return fallback;
  }

  /** A required text that is one of a list; empty after a problem. */
  public String oneOf(String key, List<String> valid) {
    JsonNode node = require(key, oneOfPhrase(valid));
    return node == null ? "" : oneOf(node, valid, "");
  }

  /** An optional text that is one of a list; the fallback also after a problem. */
  public String oneOf(String key, List<String> valid, String fallback) {
    return has(key) ? oneOf(members.get(key), valid, fallback) : fallback;
  }

  private String oneOf(JsonNode node, List<String> valid, String fallback) {
    if (node instanceof JsonNode.Text text) {
      if (valid.contains(text.text())) {
        return text.text();
      }
      problems.add(
          node.line(),
          node.path(),
          node.phrase(),
          oneOfPhrase(valid),
          NearestName.find(text.text(), valid).map(near -> "write " + near).orElse(""));
    } else {
      refuseType(node, oneOfPhrase(valid));
    }
    return fallback;
  }

  /** The valid words as a phrase, for example {@code one of "left", "right"}. */
  static String oneOfPhrase(List<String> valid) {
    String all = '"' + String.join("\", \"", valid) + '"';
    return valid.size() == 1 ? all : "one of " + all;
  }

  /** An optional choice by its key; the fallback also after a problem. */
  public <E extends Enum<E> & Choice> E choice(String key, Class<E> options, E fallback) {
    return Choice.find(options, oneOf(key, Choice.keys(options), fallback.key())).orElse(fallback);
  }

  /** A required object; one without members after a problem. */
  public JsonFields object(String key) {
    JsonNode node = require(key, "an object");
    if (node == null) {
      return new JsonFields(new JsonNode.Members(path(key), line, Map.of()), emptyProblems());
    }
    return open(node);
  }

  /** Stands in for a missing object, whose members are not to be called missing as well. */
  private FileProblems emptyProblems() {
    return new FileProblems(problems.file());
  }

  /** An optional object. */
  public Optional<JsonFields> findObject(String key) {
    return has(key) ? Optional.of(open(members.get(key))) : Optional.empty();
  }

  private JsonFields open(JsonNode node) {
    if (!(node instanceof JsonNode.Members object)) {
      refuseType(node, "an object");
      return new JsonFields(
          new JsonNode.Members(node.path(), node.line(), Map.of()), emptyProblems());
    }
    JsonFields fields = new JsonFields(object, problems);
    opened.add(fields);
    return fields;
  }

  /** A required array of objects. */
  public List<JsonFields> objects(String key) {
    return require(key, "an array of objects") == null ? List.of() : findObjects(key);
  }

  /** An optional array of objects, empty when it is absent. */
  public List<JsonFields> findObjects(String key) {
    return elements(key, "an array of objects").stream().map(this::open).toList();
  }

  /** An optional array of texts, empty when it is absent. */
  public List<String> texts(String key) {
    return elements(key, "an array of texts").stream().map(node -> textOf(node, "")).toList();
  }

  /** An optional array of numbers, empty when it is absent; NaN for an element with a problem. */
  public List<Double> numbers(String key, double lowest, double highest) {
    PhysicalRange range = new PhysicalRange(lowest, highest, "");
    return elements(key, "an array of numbers").stream()
        .map(node -> numberOf(node, range, Double.NaN))
        .toList();
  }

  private List<JsonNode> elements(String key, String expected) {
    if (!has(key)) {
      return List.of();
    }
    if (members.get(key) instanceof JsonNode.Elements array) {
      return array.elements();
    }
    refuseType(members.get(key), expected);
    return List.of();
  }

  /** Reports every key that was not asked for, here and in the objects that were opened. */
  public void finish() {
    members.forEach(
        (key, node) -> {
          if (!known.contains(key)) {
            problems.add(
                node.line(),
                node.path(),
                "a key that is not known",
                oneOfPhrase(List.copyOf(known)),
                NearestName.find(key, known)
                    .map(near -> "rename it to " + near)
                    .orElse("remove it"));
          }
        });
    opened.forEach(JsonFields::finish);
  }
}
