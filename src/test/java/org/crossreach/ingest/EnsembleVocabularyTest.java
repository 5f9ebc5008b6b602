package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Frame;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The page on ensemble CSV and its description in the vocabulary of the W3C (Tennison and Kellogg
 * 2015, Metadata Vocabulary for Tabular Data) name the columns, ranges and frames that are read.
 */
class EnsembleVocabularyTest {

  private static final Path FORMATS = Path.of("formats");

  @TempDir Path folder;

  private static JsonNode description() throws Exception {
    return new ObjectMapper().readTree(Files.readString(FORMATS.resolve("ensemble-csv.csvw.json")));
  }

  /** Every column that is read, with {@code {cell}} for the number of a cell. */
  private static Set<String> known() {
    Set<String> names = new TreeSet<>(List.of("ensemble", "time", "cells"));
    for (Frame frame : Frame.values()) {
      for (EnsembleQuantity quantity : EnsembleQuantity.values()) {
        names.add(EnsembleColumn.nameOf(quantity, frame));
      }
      for (CellQuantity quantity : CellQuantity.values()) {
        names.add(EnsembleColumn.nameOf(quantity, frame) + "_{cell}");
      }
    }
    return names;
  }

  @Test
  void describesEveryColumnWithItsRangeAndFrames() throws Exception {
    Set<String> described = new TreeSet<>();
    for (JsonNode each : description().get("notes")) {
      String name = each.get("column").asText();
      described.add(name);
      EnsembleColumn column = EnsembleColumn.find(name.replace("{cell}", "7")).orElseThrow();
      if (column.role() != EnsembleColumn.Role.TIME) {
        assertEquals(column.range().lowest(), each.get("minimum").asDouble(), name);
        assertEquals(column.range().highest(), each.get("maximum").asDouble(), name);
      }
      Set<String> frames = new TreeSet<>();
      column.frames().forEach(frame -> frames.add(frame.name().toLowerCase(Locale.ROOT)));
      Set<String> stated = new TreeSet<>();
      each.get("frames").forEach(frame -> stated.add(frame.asText()));
      assertEquals(frames, stated, name);
    }
    assertEquals(known(), described);
  }

  @Test
  void describesTheTablesOfTheExample() throws Exception {
    JsonNode description = description();
    List<String> columns = new ArrayList<>();
    for (JsonNode each : description.at("/tableSchema/columns")) {
      columns.add(each.get("name").asText());
      EnsembleColumn column = EnsembleColumn.find(each.get("name").asText()).orElseThrow();
      if (column.role() != EnsembleColumn.Role.TIME) {
        assertEquals(column.range().lowest(), each.at("/datatype/minimum").asDouble());
        assertEquals(column.range().highest(), each.at("/datatype/maximum").asDouble());
      }
    }
    for (JsonNode table : description.get("tables")) {
      String header = Files.readAllLines(FORMATS.resolve(table.get("url").asText())).get(0);
      assertEquals(String.join(",", columns), header);
    }
  }

  @Test
  void thePageNamesEveryColumn() throws Exception {
    String page = Files.readString(FORMATS.resolve("ensemble-csv.md"));
    Set<String> runs = Set.of("beam2", "beam3"); // between "beam1 … beam4"
    for (String name : known()) {
      String shown = name.replace("{cell}", "k");
      assertTrue(
          page.contains("`" + shown + "`") || runs.stream().anyMatch(name::contains),
          "ensemble-csv.md does not name " + shown);
    }
  }

  @Test
  void theExampleOfThePageIsRead() throws Exception {
    String page = Files.readString(FORMATS.resolve("ensemble-csv.md"));
    String table = page.substring(page.indexOf("```csv\n") + 7);
    Path file = folder.resolve("pass-01.csv");
    Files.writeString(file, table.substring(0, table.indexOf("```")));
    assertEquals(3, EnsembleCsv.read(file, "pass-01.csv").ensembles().size());
  }
}
