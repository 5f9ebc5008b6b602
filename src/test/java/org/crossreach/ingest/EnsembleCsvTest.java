package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Note;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A valid ensemble CSV becomes the same columns, however it is written and packed. */
class EnsembleCsvTest {

  @TempDir Path folder;

  private EnsembleFile read(String name, byte[] bytes) throws UnusableInput, IOException {
    return EnsembleCsv.read(TableText.write(folder, name, bytes), name);
  }

  private Ensembles read(String text) throws UnusableInput, IOException {
    return read("pass-01.csv", text.getBytes(StandardCharsets.UTF_8)).ensembles();
  }

  private static void assertIsTheTable(Ensembles ensembles) {
    assertEquals(3, ensembles.size());
    assertEquals(Frame.EARTH, ensembles.frame());
    assertEquals(OffsetDateTime.parse("2031-04-18T09:30:00.25+01:00"), ensembles.start());
    assertEquals(2, ensembles.maxCells());
    assertEquals(3, ensembles.number(2));
    assertEquals(0.0, ensembles.elapsedS(0));
    assertEquals(0.5, ensembles.elapsedS(1));
    assertEquals(1.0, ensembles.elapsedS(2));
    assertEquals(0.625, ensembles.value(EnsembleQuantity.BOTTOM_1, 1));
    assertEquals(Double.NaN, ensembles.value(EnsembleQuantity.BOTTOM_2, 1));
    assertEquals(4.0, ensembles.value(EnsembleQuantity.DEPTH_BEAM_1_M, 2));
    assertEquals(0.75, ensembles.value(EnsembleQuantity.FIRST_CELL_M, 0));
    assertEquals(Double.NaN, ensembles.value(EnsembleQuantity.CELL_SIZE_M, 2));
    assertFalse(ensembles.has(EnsembleQuantity.HEADING_DEG));
    assertEquals(1, ensembles.cells(1));
    assertEquals(1.125, ensembles.grid(CellQuantity.WATER_1).get(0, 0));
    assertEquals(1.0, ensembles.grid(CellQuantity.WATER_1).get(0, 1));
    assertEquals(Double.NaN, ensembles.grid(CellQuantity.WATER_2).get(0, 1));
    assertEquals(-0.5, ensembles.grid(CellQuantity.WATER_2).get(1, 0));
    assertFalse(ensembles.has(CellQuantity.WATER_3));
  }

  @Test
  void readsEveryColumn() throws Exception {
    assertIsTheTable(read(TableText.valid().text()));
  }

  @Test
  void dropsValuesBeyondTheNumberOfCells() throws Exception {
    Ensembles ensembles = read(TableText.valid().text());
    assertEquals(Double.NaN, ensembles.grid(CellQuantity.WATER_1).get(1, 1));
  }

  @Test
  void readsEveryLineEndingByteOrderMarkAndQuoting() throws Exception {
    String text = TableText.valid().text();
    assertIsTheTable(read("\ufeff" + text));
    assertIsTheTable(read(text.replace("\n", "\r\n")));
    assertIsTheTable(read(text.strip()));
    assertIsTheTable(read(text + "\n\n"));
    assertIsTheTable(read(text.replace(",", " ,\t")));
    assertIsTheTable(read('"' + text.strip().replace(",", "\",\"").replace("\n", "\"\n\"") + '"'));
  }

  @Test
  void readsColumnsInAnyOrder() throws Exception {
    String[] lines = TableText.valid().text().split("\n");
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < 12; i++) {
      order.add(i);
    }
    Random random = new Random(1);
    for (int trial = 0; trial < 20; trial++) {
      Collections.shuffle(order, random);
      StringBuilder text = new StringBuilder();
      for (String line : lines) {
        String[] fields = line.split(",", -1);
        for (int i = 0; i < fields.length; i++) {
          text.append(i == 0 ? "" : ",").append(fields[order.get(i)]);
        }
        text.append('\n');
      }
      assertIsTheTable(read(text.toString()));
    }
  }

  @Test
  void readsPackedFiles() throws Exception {
    byte[] packed = TableText.packed(TableText.valid().bytes());
    assertIsTheTable(read("pass-01.csv.gz", packed).ensembles());
  }

  @Test
  void digestsTheBytesAsStored() throws Exception {
    byte[] packed = TableText.packed(TableText.valid().bytes());
    assertEquals(
        StoredFile.input("pass-01.csv.gz", packed), read("pass-01.csv.gz", packed).input());
    assertEquals(
        StoredFile.input("pass-01.csv", TableText.valid().bytes()),
        read("pass-01.csv", TableText.valid().bytes()).input());
  }

  /** Source: FIPS 180-4, the example "abc" of NIST's example values. */
  @Test
  void writesDigestsAsTheStandardDoes() {
    assertEquals(
        "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad",
        StoredFile.input("abc", "abc".getBytes(StandardCharsets.US_ASCII)).sha256());
  }

  @Test
  void namesUnknownColumnsInOneNoteAndIgnoresThem() throws Exception {
    String text =
        TableText.valid()
            .text()
            .strip()
            .replace("\n", ",\"x\u00e9 \ud83d\ude00 \"\"\n,\"\n")
            .replaceFirst("north_mps_2.*\n.*\n", "north_mps_2,pitch_dg\n")
            .concat(",");
    EnsembleFile file = read("pass-01.csv", text.getBytes(StandardCharsets.UTF_8));
    assertIsTheTable(file.ensembles());
    assertEquals(1, file.notes().size());
    assertEquals("unknown-column", file.notes().get(0).code());
    assertEquals(Note.Level.CAUTION, file.notes().get(0).level());
    assertEquals(
        "columns that are not known are ignored: \"pitch_dg\" (nearest known name: pitch_deg)",
        file.notes().get(0).text());
  }

  @Test
  void recognisesTheFrameByTheNames() throws Exception {
    String text = TableText.valid().text();
    for (Frame frame : List.of(Frame.SHIP, Frame.EARTH)) {
      String renamed =
          frame == Frame.EARTH
              ? text
              : text.replace("bt_east", "bt_starboard")
                  .replace("bt_north", "bt_forward")
                  .replace("east_mps_", "starboard_mps_")
                  .replace("north_mps_", "forward_mps_")
                  .replace("depth_beam1_m", "depth_beam1_m,heading_deg")
                  .replaceAll("(?m),(4[.0-9]*),", ",$1,350,");
      Ensembles ensembles = read(renamed);
      assertEquals(frame, ensembles.frame());
      assertEquals(1.125, ensembles.grid(CellQuantity.WATER_1).get(0, 0));
      assertEquals(0.625, ensembles.value(EnsembleQuantity.BOTTOM_1, 1));
    }
    assertTrue(read(text).has(EnsembleQuantity.BOTTOM_2));
  }
}
