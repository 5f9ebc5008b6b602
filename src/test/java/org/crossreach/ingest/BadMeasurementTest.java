package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every slip in {@code measurement.json} is told with its line, its path and what is valid. */
class BadMeasurementTest {

  @TempDir Path root;
  private Path folder;

  @BeforeEach
  void fillFolder() throws IOException {
    folder = Files.createDirectory(root.resolve("measurement"));
    TableText.write(folder, "pass-01.csv", TableText.valid().bytes());
    Files.createDirectory(folder.resolve("sub"));
    TableText.write(folder, "sub/pass-02.csv.gz", TableText.packed(TableText.valid().bytes()));
    TableText.write(folder, "loop-01.csv", TableText.valid().bytes());
  }

  private List<Problem> problems(String measurement) throws IOException {
    TableText.write(folder, "measurement.json", measurement.getBytes(StandardCharsets.UTF_8));
    return assertThrows(UnusableInput.class, () -> MeasurementFolder.read(folder)).problems();
  }

  private List<Problem> problems(String target, String replacement) throws IOException {
    String valid = MeasurementFolderTest.MEASUREMENT;
    assertEquals(true, valid.contains(target), target);
    return problems(valid.replace(target, replacement));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        // replaced | by | line | place | found | expected
        "measurement/1|measurement/2|2|format|the text \"crossreach-measurement/2\""
            + "|\"crossreach-measurement/1\"",
        "\"id\"|\"ID\"|1|id|no such key|a text",
        "tern-landing-0418|../x|3|id|\"../x\""
            + "|letters, digits, hyphens, points and underscores, the first one a letter or digit",
        "\"river\": \"Ousel\"|\"river\": 7|4|site.river|7|a text",
        "\"latitude_deg\": 51.5|\"latitude_deg\": 91|4|site.latitude_deg|91"
            + "|a number from -90 to 90 deg",
        "\"latitude_deg\": 51.5|\"latitude_deg\": \"51\"|4|site.latitude_deg|the text \"51\""
            + "|a number from -90 to 90 deg",
        "[\"first boat\"]|[\"a\", 3]|5|party[1]|3|a text",
        "[\"first boat\"]|\"me\"|5|party|the text \"me\"|an array of texts",
        "T09:00:00Z|T09:00:00|6|stage.readings[0].time|\"2031-04-18T09:00:00\""
            + "|a date and time with offset, for example 2031-04-18T09:30:00+01:00",
        "\"stage_m\": 2.41|\"stage\": 2.41|6|stage.readings[0].stage_m|no such key"
            + "|a number from -1000 to 9000 m",
        "\"to_stage_m\": 5.0|\"to_stage_m\": 0.1|8|rating.segments[0].to_stage_m|0.1"
            + "|a stage above 0.4",
        "\"beam_angle_deg\": 20|\"beam_angle_deg\": 60|10|instrument.beam_angle_deg|60"
            + "|a number from 1 to 45 deg",
        "\"beam_angle_deg\": 20, ||10|instrument.beam_angle_deg|no such key"
            + "|a number from 1 to 45 deg",
        "\"draft_m\": 0.22|\"draft_m\": null|10|instrument.draft_m|null|a number from 0 to 20 m",
        "\"draft_m\": 0.22|\"draft_m\": 0.22, \"beam_azimuths_deg\": [0, 90]|10"
            + "|instrument.beam_azimuths_deg|2 azimuths|four, one for each beam",
        "\"start_bank\": \"left\"|\"start_bank\": \"Left\"|12|passes[0].start_bank"
            + "|the text \"Left\"|one of \"left\", \"right\"",
        "\"use\": false|\"use\": \"no\"|15|passes[1].use|the text \"no\"|true or false",
        "\"distance_m\": 3.0|\"distance_m\": -3.0|13|passes[0].left_edge.distance_m|-3.0"
            + "|a number from 0 to 5000 m",
        "\"shape\": \"wall\"|\"shape\": \"round\"|14|passes[0].right_edge.shape"
            + "|the text \"round\"|one of \"sloping\", \"wall\", \"coefficient\"",
        ", \"coefficient\": 0.5||16|passes[1].left_edge.coefficient|no such key"
            + "|a number from 0 to 2",
        "\"shape\": \"wall\"|\"shape\": \"wall\", \"coefficient\": 0.4|14"
            + "|passes[0].right_edge.coefficient|0.4|none beside the shape \"wall\"",
        "\"discharge_m3s\": 0.25|\"discharge_m3s\": 0.25, \"shape\": \"wall\"|17"
            + "|passes[1].right_edge.shape|the text \"wall\"|none beside discharge_m3s",
        "\"right_edge\": {\"distance_m\": 2, \"discharge_m3s\": 0.25}|\"right_edge\": 5|17"
            + "|passes[1].right_edge|5|an object",
        "\"kind\": \"loop\"|\"kind\": \"loops\"|19|moving_bed_tests[0].kind|the text \"loops\""
            + "|one of \"loop\", \"stationary\"",
        "sub/pass-02.csv.gz|pass-01.csv|15|passes[1].file|the name \"pass-01\" of an earlier pass"
            + "|every pass under a name of its own",
        "sub/pass-02.csv.gz|pass-03.csv|15|passes[1].file|\"pass-03.csv\", which is not there"
            + "|a file of the folder",
        "sub/pass-02.csv.gz|pass-02.txt|15|passes[1].file|\"pass-02.txt\""
            + "|a name that ends with .csv or .csv.gz",
      })
  void tellsPlaceAndValue(
      String target, String replacement, int line, String place, String found, String expected)
      throws IOException {
    List<Problem> problems = problems(target, replacement == null ? "" : replacement);
    Problem first = problems.get(0);
    assertAll(
        () -> assertEquals("measurement.json", first.file()),
        () -> assertEquals(line, first.line()),
        () -> assertEquals(place, first.place()),
        () -> assertEquals(found, first.found()),
        () -> assertEquals(expected, first.expected()));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "../secret.csv",
        "/etc/secret.csv",
        "sub/../../secret.csv",
        "C:/secret.csv",
        "..\\\\secret.csv",
        "./pass-09.csv",
        "sub//pass-02.csv.gz",
        "",
        "a\\u0000.csv"
      })
  void refusesPathsThatLeadOutsideTheFolder(String file) throws IOException {
    TableText.write(root, "secret.csv", TableText.valid().bytes());
    List<Problem> problems = problems("sub/pass-02.csv.gz", file);
    assertEquals(1, problems.size(), problems::toString);
    assertEquals("passes[1].file", problems.get(0).place());
    assertEquals(15, problems.get(0).line());
    assertEquals(
        "a file within the folder, by a relative path with forward slashes",
        problems.get(0).expected());
  }

  @Test
  void refusesLinksThatLeadOutsideTheFolder() throws IOException {
    Path secret = TableText.write(root, "secret.csv", TableText.valid().bytes());
    Files.createSymbolicLink(folder.resolve("link.csv"), secret);
    Files.createSymbolicLink(folder.resolve("away"), root);
    assertEquals(
        "a link that leads outside the folder",
        problems("sub/pass-02.csv.gz", "link.csv").get(0).found());
    assertEquals(
        "a link that leads outside the folder",
        problems("sub/pass-02.csv.gz", "away/secret.csv").get(0).found());
  }

  @Test
  void followsALinkToTheFolderItself() throws Exception {
    TableText.write(
        folder,
        "measurement.json",
        MeasurementFolderTest.MEASUREMENT.getBytes(StandardCharsets.UTF_8));
    Path link = Files.createSymbolicLink(root.resolve("link"), folder);
    assertEquals(2, MeasurementFolder.read(link).passes().size());
  }

  @Test
  void suggestsTheNearestKey() throws IOException {
    List<Problem> problems = problems("\"start_bank\": \"left\"", "\"start_bnak\": \"left\"");
    assertEquals(
        List.of(
            "measurement.json:12, passes[0].start_bank: found no such key, expected one of "
                + "\"left\", \"right\"; rename \"start_bnak\" to start_bank",
            "measurement.json:12, passes[0].start_bnak: found a key that is not known, expected "
                + "one of \"file\", \"start_bank\", \"use\", \"note\", \"left_edge\", "
                + "\"right_edge\"; rename it to start_bank"),
        problems.stream().map(Problem::toString).toList());
  }

  @Test
  void needsAtLeastOnePass() throws IOException {
    String valid = MeasurementFolderTest.MEASUREMENT;
    int from = valid.indexOf("[\n    {\"file\"");
    String none = valid.substring(0, from) + valid.substring(valid.indexOf("],\n  \"moving"));
    Problem problem = problems(none.replace("\"passes\": ]", "\"passes\": []")).get(0);
    assertEquals("passes", problem.place());
    assertEquals("no pass", problem.found());
  }

  @Test
  void needsBeamAzimuthsOnlyForBeamFrames() throws Exception {
    TableText.write(
        folder,
        "pass-01.csv",
        ("ensemble,time,bt_beam1_mps,bt_beam2_mps,bt_beam3_mps,bt_beam4_mps,heading_deg,"
                + "depth_vertical_m,cells,first_cell_m,cell_size_m,"
                + "beam1_mps_1,beam2_mps_1,beam3_mps_1,beam4_mps_1\n"
                + "1,2031-04-18T09:30:00Z,0,0,0,0,350,4,1,1,1,1,2,3,4\n")
            .getBytes(StandardCharsets.UTF_8));
    Problem problem = problems("0.22", "0.22").get(0);
    assertEquals("instrument.beam_azimuths_deg", problem.place());
    assertEquals("no such key", problem.found());
    TableText.write(
        folder,
        "measurement.json",
        MeasurementFolderTest.MEASUREMENT
            .replace("0.22", "0.22, \"beam_azimuths_deg\": [45, 135, 225, 315]")
            .getBytes(StandardCharsets.UTF_8));
    assertEquals(2, MeasurementFolder.read(folder).passes().size());
  }

  @Test
  void needsTheFile() {
    Problem problem =
        assertThrows(UnusableInput.class, () -> MeasurementFolder.read(folder)).problems().get(0);
    assertEquals("measurement.json", problem.file());
    assertEquals("no such file", problem.found());
  }

  @Test
  void tellsSyntaxErrorsAlone() throws IOException {
    List<Problem> problems = problems("\"passes\": [", "\"passes\": (");
    assertEquals(1, problems.size());
    assertEquals(11, problems.get(0).line());
  }

  @Test
  void refusesExclusionsFromPassesThatAreNot() throws IOException {
    String exclusion =
        """
        {"screening": {"exclusions": [
          {"pass": "pass-1", "from_ensemble": 1, "to_ensemble": 2, "reason": "wake"}]}}
        """;
    TableText.write(folder, "settings.json", exclusion.getBytes(StandardCharsets.UTF_8));
    Problem problem = problems("0.22", "0.22").get(0);
    assertEquals("settings.json", problem.file());
    assertEquals("screening.exclusions[0].pass", problem.place());
    assertEquals("one of \"pass-01\", \"pass-02\"", problem.expected());
  }
}
