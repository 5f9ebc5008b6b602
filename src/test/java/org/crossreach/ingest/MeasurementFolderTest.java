package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.List;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.MovingBedTest;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A folder becomes one measurement, or every problem of every file in it. */
class MeasurementFolderTest {

  static final String MEASUREMENT =
      """
      {
        "format": "crossreach-measurement/1",
        "id": "tern-landing-0418",
        "site": {"name": "Tern Landing", "river": "Ousel", "latitude_deg": 51.5},
        "party": ["first boat"],
        "stage": {"datum": "local", "readings": [{"time": "2031-04-18T09:00:00Z", "stage_m": 2.41}]},
        "rating": {"segments": [
          {"from_stage_m": 0.4, "to_stage_m": 5.0, "a": 31.2, "h0_m": 0.12, "b": 1.71}]},
        "water": {"temperature_check_degc": 14.2},
        "instrument": {"serial": "17", "beam_angle_deg": 20, "draft_m": 0.22, "declination_deg": -3.1},
        "passes": [
          {"file": "pass-01.csv", "start_bank": "left",
           "left_edge": {"distance_m": 3.0, "shape": "sloping"},
           "right_edge": {"distance_m": 2.2, "shape": "wall"}},
          {"file": "sub/pass-02.csv.gz", "start_bank": "right", "use": false, "note": "gust",
           "left_edge": {"distance_m": 3, "shape": "coefficient", "coefficient": 0.5},
           "right_edge": {"distance_m": 2, "discharge_m3s": 0.25}}
        ],
        "moving_bed_tests": [{"kind": "loop", "file": "loop-01.csv"}]
      }
      """;

  @TempDir Path folder;

  @BeforeEach
  void fillFolder() throws IOException {
    write("measurement.json", MEASUREMENT);
    TableText.write(folder, "pass-01.csv", TableText.valid().bytes());
    Files.createDirectory(folder.resolve("sub"));
    TableText.write(folder, "sub/pass-02.csv.gz", TableText.packed(TableText.valid().bytes()));
    TableText.write(folder, "loop-01.csv", TableText.valid().bytes());
  }

  private void write(String name, String text) throws IOException {
    TableText.write(folder, name, text.getBytes(StandardCharsets.UTF_8));
  }

  private List<Problem> problems() {
    return assertThrows(UnusableInput.class, () -> MeasurementFolder.read(folder)).problems();
  }

  @Test
  void readsEveryFact() throws Exception {
    Measurement measurement = MeasurementFolder.read(folder);
    assertEquals("tern-landing-0418", measurement.id());
    assertEquals("Ousel", measurement.site().river());
    assertEquals(51.5, measurement.site().latitudeDeg());
    assertEquals(Double.NaN, measurement.site().longitudeDeg());
    assertEquals(List.of("first boat"), measurement.party());
    assertEquals("", measurement.remarks());
    assertEquals(2.41, measurement.stage().orElseThrow().readings().get(0).stageM());
    assertEquals(
        OffsetDateTime.parse("2031-04-18T09:00:00Z"),
        measurement.stage().orElseThrow().readings().get(0).time());
    assertEquals(1.71, measurement.rating().orElseThrow().segments().get(0).b());
    assertEquals(14.2, measurement.water().temperatureCheckDegC());
    assertEquals(0.0, measurement.water().salinityPpt());
    assertEquals(20.0, measurement.instrument().beamAngleDeg());
    assertEquals(-3.1, measurement.instrument().northTurnDeg());
    assertEquals(Double.NaN, measurement.instrument().soundSpeedUsedMps());
    assertEquals(2, measurement.passes().size());
    assertEquals("pass-01", measurement.passes().get(0).name());
    assertEquals("pass-02", measurement.passes().get(1).name());
    assertEquals("sub/pass-02.csv.gz", measurement.passes().get(1).file());
    assertEquals(Bank.RIGHT, measurement.passes().get(1).startBank());
    assertTrue(measurement.passes().get(0).used());
    assertFalse(measurement.passes().get(1).used());
    assertEquals("gust", measurement.passes().get(1).note());
    assertEquals(new Edge(3.0, Edge.SLOPING, Double.NaN), measurement.passes().get(0).leftEdge());
    assertEquals(new Edge(2.2, Edge.WALL, Double.NaN), measurement.passes().get(0).rightEdge());
    assertEquals(new Edge(3.0, 0.5, Double.NaN), measurement.passes().get(1).leftEdge());
    assertEquals(new Edge(2.0, Double.NaN, 0.25), measurement.passes().get(1).rightEdge());
    assertEquals(3, measurement.passes().get(1).ensembles().size());
    assertEquals(MovingBedTest.Kind.LOOP, measurement.movingBedTests().get(0).kind());
  }

  @Test
  void listsEveryFileWithItsDigest() throws Exception {
    write("settings.json", "{}");
    Measurement measurement = MeasurementFolder.read(folder);
    List<String> names = measurement.inputs().stream().map(input -> input.file()).toList();
    assertEquals(
        List.of(
            "measurement.json",
            "settings.json",
            "pass-01.csv",
            "sub/pass-02.csv.gz",
            "loop-01.csv"),
        names);
    for (var input : measurement.inputs()) {
      assertEquals(
          StoredFile.input(input.file(), Files.readAllBytes(folder.resolve(input.file()))), input);
    }
  }

  @Test
  void reportsTheProblemsOfEveryFileTogether() throws Exception {
    write("measurement.json", MEASUREMENT.replace("0.22", "-0.22"));
    write("settings.json", "{\n\"metod\": \"path-flux\"}");
    TableText.write(folder, "pass-01.csv", TableText.valid().replace(2, "0.75", "0.75m").bytes());
    TableText.write(
        folder, "loop-01.csv", TableText.valid().replace(3, "9,-0.5", "-32768,-0.5").bytes());
    List<Problem> problems = problems();
    assertEquals(
        List.of("measurement.json", "settings.json", "pass-01.csv", "loop-01.csv"),
        problems.stream().map(Problem::file).toList());
    assertEquals(
        """
        measurement.json:10, instrument.draft_m: found -0.22, expected a number from 0 to 20 m
        settings.json:2, metod: found a key that is not known, expected one of "format", \
        "boat_velocity", "method", "section", "depth", "top", "bottom", "exponent", \
        "edge_ensembles", "screening", "sound_speed", "moving_bed", "uncertainty"; \
        rename it to method
        pass-01.csv:2, first_cell_m: found "0.75m", expected a number; leave the field empty for a \
        missing value
        loop-01.csv:3, east_mps_2: found "-32768", expected a number from -20 to 20 m/s; leave the \
        field empty for a missing value""",
        String.join("\n", problems.stream().map(Problem::toString).toList()));
  }
}
