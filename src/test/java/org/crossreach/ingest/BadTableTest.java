package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every way to spoil an ensemble CSV is refused with its place, what was found, what was expected
 * and, where there is a likely one, the remedy.
 */
class BadTableTest {

  @TempDir Path folder;

  private List<Problem> problems(String name, byte[] bytes) throws IOException {
    Path file = TableText.write(folder, name, bytes);
    return assertThrows(UnusableInput.class, () -> EnsembleCsv.read(file, name)).problems();
  }

  private List<Problem> problems(String text) throws IOException {
    return problems("pass-01.csv", text.getBytes(StandardCharsets.UTF_8));
  }

  private static Arguments bad(
      String what, TableText table, int line, String place, String found, String expected) {
    return Arguments.of(what, table.text(), line, place, found, expected);
  }

  static Stream<Arguments> oneFault() {
    TableText valid = TableText.valid();
    String number = "a number";
    String whole = "a whole number";
    String time = "a date and time with offset, for example 2031-04-18T09:30:00.25+01:00";
    String value = "a value in every row";
    return Stream.of(
        bad(
            "text in a number",
            valid.replace(2, "1.125", "1.1.25"),
            2,
            "east_mps_1",
            "\"1.1.25\"",
            number),
        bad(
            "decimal comma in quotes",
            valid.replace(2, "0.75", "\"0,75\""),
            2,
            "first_cell_m",
            "\"0,75\"",
            number),
        bad(
            "decimal comma without quotes",
            valid.replace(2, "0.75", "0,75"),
            2,
            "",
            "13 fields",
            "12 as in the header"),
        bad(
            "too few fields",
            valid.line(3, "2,2031-04-18T09:30:00.75+01:00,0.625"),
            3,
            "",
            "3 fields",
            "12 as in the header"),
        bad(
            "filler in a velocity",
            valid.replace(2, "1.125", "-32768"),
            2,
            "east_mps_1",
            "\"-32768\"",
            "a number from -20 to 20 m/s"),
        bad(
            "filler beyond the cells",
            valid.replace(3, ",9,", ",-32768,"),
            3,
            "east_mps_2",
            "\"-32768\"",
            "a number from -20 to 20 m/s"),
        bad(
            "filler in a depth",
            valid.replace(3, "4.25", "0"),
            3,
            "depth_beam1_m",
            "\"0\"",
            "a number from 0.001 to 500 m"),
        bad(
            "a number too large for a double",
            valid.replace(3, "4.25", "1e999"),
            3,
            "depth_beam1_m",
            "\"1e999\"",
            "a number from 0.001 to 500 m"),
        bad(
            "a word for infinity",
            valid.replace(3, "4.25", "Infinity"),
            3,
            "depth_beam1_m",
            "\"Infinity\"",
            number),
        bad(
            "another word for missing",
            valid.replace(3, "4.25", "nan"),
            3,
            "depth_beam1_m",
            "\"nan\"",
            number),
        bad(
            "hexadecimal digits",
            valid.replace(3, "4.25", "0x1p2"),
            3,
            "depth_beam1_m",
            "\"0x1p2\"",
            number),
        bad(
            "a fraction of an ensemble",
            valid.replace(3, "2,2031", "2.5,2031"),
            3,
            "ensemble",
            "\"2.5\"",
            whole),
        bad(
            "no ensemble number",
            valid.replace(3, "2,2031", ",2031"),
            3,
            "ensemble",
            "nothing",
            value),
        bad(
            "a negative ensemble number",
            valid.replace(2, "1,2031", "-1,2031"),
            2,
            "ensemble",
            "\"-1\"",
            "a number from 0 to 999999999999"),
        bad(
            "a repeated ensemble number",
            valid.replace(3, "2,2031", "1,2031"),
            3,
            "ensemble",
            "\"1\" after \"1\"",
            "a number above that of the row before"),
        bad(
            "no time",
            valid.replace(3, "2031-04-18T09:30:00.75+01:00", ""),
            3,
            "time",
            "nothing",
            value),
        bad(
            "a time without offset",
            valid.replace(3, "75+01:00", "75"),
            3,
            "time",
            "\"2031-04-18T09:30:00.75\"",
            time),
        bad(
            "a day that does not exist",
            valid.replace(3, "04-18", "02-29"),
            3,
            "time",
            "\"2031-02-29T09:30:00.75+01:00\"",
            time),
        bad(
            "a time that goes back",
            valid.replace(3, "09:30:00.75", "09:29:59.75"),
            3,
            "time",
            "a time that is not after that of the row before",
            "increasing times"),
        bad(
            "a time that stands still",
            valid.replace(3, "00.75", "00.25"),
            3,
            "time",
            "a time that is not after that of the row before",
            "increasing times"),
        bad(
            "a time in another year",
            valid.replace(4, "2031", "2032"),
            4,
            "time",
            "a time 366 days from the first one",
            "all ensembles within 31 days"),
        bad(
            "more cells than columns",
            valid.replace(2, ",2,0.75", ",3,0.75"),
            2,
            "cells",
            "\"3\"",
            "at most 2, the number of cells that have columns"),
        bad(
            "no number of cells",
            valid.replace(2, ",2,0.75", ",NA,0.75"),
            2,
            "cells",
            "nothing",
            value),
        bad(
            "cells without a place",
            valid.replace(2, ",2,0.75", ",2,"),
            2,
            "first_cell_m",
            "nothing",
            "a number wherever there are cells"),
        bad(
            "no column of a name",
            valid.replace(1, "time", "tmie"),
            1,
            "time",
            "no such column",
            "the column time"),
        bad(
            "no column of a cell",
            valid.replace(1, "north_mps_1", "nort_mps_1"),
            1,
            "north_mps_1",
            "no such column",
            "north_mps_1 to north_mps_2 without a gap"),
        bad(
            "a gap in the cells",
            valid.replace(1, "east_mps_2", "east_mps_3"),
            1,
            "east_mps_2",
            "no such column",
            "east_mps_1 to east_mps_3 without a gap"),
        bad(
            "half a bottom track",
            valid.replace(1, "bt_north_mps", "bt_nroth_mps"),
            1,
            "bt_north_mps",
            "no such column",
            "the column bt_north_mps"),
        bad(
            "no depth",
            valid.replace(1, "depth_beam1_m", "dpth_beam1_m"),
            1,
            "depth_beam1_m",
            "no column for the depth",
            "depth_beam1_m to depth_beam4_m, or depth_vertical_m"),
        bad(
            "a repeated column",
            valid.line(1, TableText.HEADER.replace("cell_size", "first_cell")),
            1,
            "first_cell_m",
            "the name in columns 7 and 8",
            "every name once"),
        bad(
            "bottom track of another frame",
            valid.replace(1, "bt_east_mps,bt_north_mps", "bt_east_mps,bt_forward_mps"),
            1,
            "bt_forward_mps",
            "a velocity of another frame than east_mps_1",
            "velocities of one frame"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("oneFault")
  void tellsPlaceAndValue(
      String what, String text, int line, String place, String found, String expected)
      throws IOException {
    List<Problem> problems = problems(text);
    Problem first = problems.get(0);
    assertAll(
        () -> assertEquals("pass-01.csv", first.file()),
        () -> assertEquals(line, first.line()),
        () -> assertEquals(place, first.place()),
        () -> assertEquals(found, first.found()),
        () -> assertEquals(expected, first.expected()),
        () -> assertTrue(problems.stream().allMatch(problem -> problem.line() >= line)));
  }

  /** The remedy is the reason why somebody reads a message to its end. */
  @Test
  void saysWhatToDo() throws IOException {
    TableText valid = TableText.valid();
    assertEquals(
        "pass-01.csv:2, first_cell_m: found \"0,75\", expected a number; use a decimal point",
        problems(valid.replace(2, "0.75", "\"0,75\"").text()).get(0).toString());
    assertEquals(
        "pass-01.csv:2: found 13 fields, expected 12 as in the header; "
            + "if commas stand for decimal points, write points",
        problems(valid.replace(2, "0.75", "0,75").text()).get(0).toString());
    assertEquals(
        "pass-01.csv:1, time: found no such column, expected the column time; "
            + "rename \"tmie\" to time",
        problems(valid.replace(1, "time", "tmie").text()).get(0).toString());
    assertEquals(
        "rename \"dpth_beam1_m\" to depth_beam1_m",
        problems(valid.replace(1, "depth_beam1_m", "dpth_beam1_m").text()).get(0).remedy());
    assertEquals(
        "leave the field empty for a missing value",
        problems(valid.replace(2, "1.125", "-32768").text()).get(0).remedy());
    assertEquals(
        "separate the columns by commas", problems(valid.text().replace(',', ';')).get(0).remedy());
  }

  @Test
  void refusesATornLastRow() throws IOException {
    String text = TableText.valid().text();
    List<Problem> problems = problems(text.substring(0, text.length() - 6));
    assertEquals(1, problems.size());
    assertEquals(4, problems.get(0).line());
    assertEquals("7 fields", problems.get(0).found());
    assertEquals(
        "the file ends within this row: copy it again, or delete the row",
        problems.get(0).remedy());
  }

  @Test
  void refusesAFileWithoutRows() throws IOException {
    assertEquals("an empty file", problems("").get(0).found());
    assertEquals("an empty file", problems("\ufeff").get(0).found());
    assertEquals("an empty file", problems("\n\n").get(0).found());
    assertEquals("a header row only", problems(TableText.HEADER).get(0).found());
    assertEquals("a header row only", problems(TableText.HEADER + "\n\n").get(0).found());
  }

  @Test
  void refusesAHeaderWithoutAnyKnownName() throws IOException {
    List<Problem> problems = problems("1,2,3\n4,5,6\n");
    assertEquals(1, problems.size());
    assertEquals(1, problems.get(0).line());
    assertEquals("a header row with known column names", problems.get(0).expected());
  }

  @Test
  void namesEverySourceOfBoatVelocity() throws IOException {
    String text = TableText.valid().text().replace("bt_east_mps,bt_north_mps", "one,two");
    Problem problem = problems(text).get(0);
    assertEquals("bt_east_mps", problem.place());
    assertEquals(
        "bt_east_mps with bt_north_mps, or gnss_lat_deg with gnss_lon_deg, "
            + "or gnss_east_mps with gnss_north_mps",
        problem.expected());
  }

  @Test
  void needsTheHeadingInEveryFrameButEarth() throws IOException {
    String text = TableText.valid().text();
    text = text.replace("east_mps", "starboard_mps").replace("north_mps", "forward_mps");
    List<Problem> problems = problems(text);
    assertEquals(1, problems.size());
    assertEquals("heading_deg", problems.get(0).place());
  }

  @Test
  void tellsMixedFramesOnce() throws IOException {
    String text = TableText.valid().text();
    text = text.replace("north_mps_1,north_mps_2", "north_mps_1,forward_mps_2");
    List<Problem> problems = problems(text);
    assertEquals("forward_mps_2", problems.get(0).place());
    assertEquals("velocities of one frame", problems.get(0).expected());
  }

  @Test
  void tellsAllProblemsTogetherInTheOrderOfTheFile() throws IOException {
    String text =
        TableText.valid()
            .replace(1, "bt_north_mps", "bt_nord_mps")
            .replace(2, "1.125", "x")
            .replace(2, "4.5", "y")
            .replace(4, "4,0", "4,-1")
            .text();
    assertEquals(
        List.of("1 bt_north_mps", "2 depth_beam1_m", "2 east_mps_1", "4 cells"),
        problems(text).stream().map(problem -> problem.line() + " " + problem.place()).toList());
  }

  @Test
  void listsTwentyProblemsAndCountsTheRest() throws IOException {
    StringBuilder text = new StringBuilder(TableText.HEADER).append('\n');
    for (int i = 0; i < 1000; i++) {
      text.append("bad\n");
    }
    List<Problem> problems = problems(text.toString());
    assertEquals(FileProblems.LISTED + 1, problems.size());
    assertEquals(21, problems.get(19).line());
    assertEquals("980 more problems, 1000 in all", problems.get(20).found());
  }

  @Test
  void showsNoControlCharacterOfTheFile() throws IOException {
    String text = TableText.valid().replace(2, "1.125", "\u001b[31m1\u202e\u0000").text();
    assertEquals("\"\\u001b[31m1\\u202e\\u0000\"", problems(text).get(0).found());
  }

  @Test
  void cutsLongTexts() throws IOException {
    String text = TableText.valid().replace(2, "1.125", "7".repeat(1000) + "x").text();
    assertEquals('"' + "7".repeat(40) + "…\" (1001 characters)", problems(text).get(0).found());
  }

  @Test
  void refusesStrayQuotationMarks() throws IOException {
    TableText valid = TableText.valid();
    Problem after = problems(valid.replace(2, "1.125", "\"1\"2").text()).get(0);
    assertEquals(2, after.line());
    assertEquals("text after a closing quotation mark", after.found());
    String text = valid.text();
    List<Problem> open = problems(text.substring(0, text.length() - 1) + "\"1");
    assertEquals(4, open.get(0).line());
    assertEquals("a quotation mark without its partner", open.get(0).found());
    Problem swallowing = problems(valid.replace(2, "1.125", "\"1.125").text()).get(0);
    assertEquals(2, swallowing.line());
    assertEquals("a quotation mark without its partner", swallowing.found());
  }
}
