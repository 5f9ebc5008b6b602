package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.crossreach.survey.Problem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * JSON becomes a tree whose values know path and line; what is no JSON is a problem with a line.
 */
class JsonTreeTest {

  private final FileProblems problems = new FileProblems("some.json");

  private Problem onlyProblem() {
    assertEquals(1, problems.list().size(), () -> problems.list().toString());
    return problems.list().get(0);
  }

  @Test
  void knowsPathAndLineOfEveryValue() {
    String text = "{\n \"a\": [1.5,\n  {\"b\": \"x\"}, null],\n \"c\": true}\n";
    JsonNode.Members root = (JsonNode.Members) JsonTree.parse(text, problems).orElseThrow();
    JsonNode.Elements array = (JsonNode.Elements) root.members().get("a");
    JsonNode.Members inner = (JsonNode.Members) array.elements().get(1);
    assertEquals(new JsonNode.Number("a[0]", 2, 1.5, "1.5"), array.elements().get(0));
    assertEquals(new JsonNode.Text("a[1].b", 3, "x"), inner.members().get("b"));
    assertEquals(new JsonNode.Nothing("a[2]", 3), array.elements().get(2));
    assertEquals(new JsonNode.Flag("c", 4, true), root.members().get("c"));
    assertEquals(1, root.line());
    assertEquals(3, inner.line());
    assertTrue(problems.isEmpty());
  }

  @Test
  void refusesRepeatedKeysAndKeepsTheFirst() {
    JsonNode.Members root =
        (JsonNode.Members)
            JsonTree.parse("{\"a\": {\"b\": 1,\n\n\"b\": 2}}", problems).orElseThrow();
    JsonNode.Members inner = (JsonNode.Members) root.members().get("a");
    assertEquals(1.0, ((JsonNode.Number) inner.members().get("b")).value());
    assertEquals("a.b", onlyProblem().place());
    assertEquals(3, onlyProblem().line());
    assertEquals("the key once more, after line 1", onlyProblem().found());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "{\"a\": 1,}|1",
        "{\"a\": 1~\"b\": 2}|2",
        "{'a': 1}|1",
        "{\"a\": NaN}|1",
        "{\"a\": +1}|1",
        "{\"a\": 01}|1",
        "{\"a\": .5}|1",
        "{\"a\": 1e}|1",
        "{\"a\": tru}|1",
        "{~\"a\": \"~\"}|2",
        "{~~|3",
        "[1, 2|1",
        "{\"a\": 1} {}|1",
        "// no~{}|1"
      })
  void refusesWhatIsNoJson(String text, int line) {
    assertEquals(Optional.empty(), JsonTree.parse(text.replace('~', '\n'), problems));
    assertEquals("some.json", onlyProblem().file());
    assertEquals(line, onlyProblem().line());
    assertFalse(onlyProblem().found().contains("Source"), "words of the parser about itself");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", " ", "\n\n"})
  void refusesNothing(String text) {
    assertEquals(Optional.empty(), JsonTree.parse(text, problems));
    assertEquals("an empty file", onlyProblem().found());
  }

  @Test
  void refusesDepthAndWrongEncodings() {
    JsonTree.parse("[".repeat(100_000), problems);
    assertTrue(onlyProblem().found().startsWith("an error of syntax"));
    FileProblems latin = new FileProblems("latin.json");
    JsonTree.parse("{\n\"a\": \"\u00fc\"}".getBytes(StandardCharsets.ISO_8859_1), latin);
    assertEquals(2, latin.list().get(0).line());
    assertEquals("the byte 0xfc where no such byte can be", latin.list().get(0).found());
    FileProblems wide = new FileProblems("wide.json");
    JsonTree.parse("{}  ".getBytes(StandardCharsets.UTF_16LE), wide);
    assertEquals("UTF-16 text", wide.list().get(0).found());
    assertTrue(
        JsonTree.parse("\ufeff{}".getBytes(StandardCharsets.UTF_8), new FileProblems("bom.json"))
            .isPresent());
  }

  @Test
  void refusesHalvesOfSurrogatePairs() {
    JsonTree.parse("{\"a\": \"\\ud83d\"}", problems);
    assertEquals(List.of("a"), problems.list().stream().map(Problem::place).toList());
  }

  @Test
  void readsNumbersToTheBit() {
    JsonNode.Elements array =
        (JsonNode.Elements)
            JsonTree.parse("[0.1, -0.0, 1e-7, 123456789012345678901]", problems).orElseThrow();
    double[] expected = {0.1, -0.0, 1e-7, 123456789012345678901.0};
    for (int i = 0; i < expected.length; i++) {
      assertEquals(expected[i], ((JsonNode.Number) array.elements().get(i)).value());
    }
  }
}
