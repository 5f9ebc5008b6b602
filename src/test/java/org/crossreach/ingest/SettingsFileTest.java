package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Method;
import org.crossreach.settings.Screening;
import org.crossreach.settings.SectionLine;
import org.crossreach.settings.Settings;
import org.crossreach.settings.SoundSpeed;
import org.crossreach.settings.SoundSpeedFormula;
import org.crossreach.settings.TopLaw;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a settings file says holds, what it does not say stays, and slips are told with places. */
class SettingsFileTest {

  private static Settings parse(String text) throws UnusableInput {
    return SettingsFile.parse(text, "settings.json", Settings.defaults());
  }

  private static List<Problem> problems(String text) {
    return assertThrows(UnusableInput.class, () -> parse(text)).problems();
  }

  @Test
  void takesTheDefaultsWhereThereIsNoFile(@TempDir Path folder) throws Exception {
    assertEquals(Settings.defaults(), SettingsFile.read(folder));
    TableText.write(folder, "settings.json", "{}".getBytes(StandardCharsets.UTF_8));
    assertEquals(Settings.defaults(), SettingsFile.read(folder));
  }

  @Test
  void readsEveryChoice() throws Exception {
    Settings settings =
        parse(
            """
            {
              "format": "crossreach-settings/1",
              "boat_velocity": "bottom-track",
              "method": "path-flux",
              "section": {"line": "common"},
              "depth": {"source": "slant-inverse-distance"},
              "top": "three-point", "bottom": "no-slip",
              "exponent": {"rule": "fixed", "value": 0.2},
              "edge_ensembles": 7,
              "screening": {
                "error_velocity_mps": 0.1, "vertical_velocity_mps": "off", "correlation": 0.25,
                "intensity_db": "auto", "good_pct": 50, "three_beam": false, "spikes_mps": 1,
                "bottom_error_velocity_mps": 0.2, "bottom_vertical_velocity_mps": 0.3,
                "boat_speed_mps": 0.4, "depth_beams": 0.15, "minimum_cells": 3,
                "leave_out_top_m": 0.5,
                "exclusions": [{"pass": "pass-01", "from_ensemble": 3, "to_ensemble": 9,
                                "reason": "wake of a ferry"}]},
              "sound_speed": {"formula": "medwin-1975", "temperature_degc": 12.5},
              "moving_bed": "none",
              "uncertainty": {}
            }
            """);
    assertEquals(Method.PATH_FLUX, settings.method());
    assertEquals(SectionLine.COMMON, settings.section());
    assertEquals(DepthSource.SLANT_INVERSE_DISTANCE, settings.depth());
    assertEquals(TopLaw.THREE_POINT, settings.top());
    assertEquals(BottomLaw.NO_SLIP, settings.bottom());
    assertEquals(new Exponent(ExponentRule.FIXED, 0.2), settings.exponent());
    assertEquals(7, settings.edgeEnsembles());
    assertEquals(
        new Screening(
            Limit.of(0.1),
            Limit.OFF,
            Limit.of(0.25),
            Limit.AUTO,
            Limit.of(50),
            /* threeBeam= */ false,
            Limit.of(1),
            Limit.of(0.2),
            Limit.of(0.3),
            Limit.of(0.4),
            Limit.of(0.15),
            /* minimumCells= */ 3,
            /* leaveOutTopM= */ 0.5,
            List.of(new Exclusion("pass-01", 3, 9, "wake of a ferry"))),
        settings.screening());
    assertEquals(new SoundSpeed(SoundSpeedFormula.MEDWIN_1975, 12.5), settings.soundSpeed());
  }

  @Test
  void readsAGivenAzimuthInBothForms() throws Exception {
    SectionLine expected = SectionLine.ofAzimuth(123);
    assertEquals(expected, parse("{\"section\": {\"line\": {\"azimuth_deg\": 123.0}}}").section());
    assertEquals(expected, parse("{\"section\": {\"azimuth_deg\": 123}}").section());
  }

  @Test
  void keepsWhatTheTextDoesNotSay() throws Exception {
    Settings base = parse("{\"top\": \"constant\", \"exponent\": {\"value\": 0.3}}");
    Settings settings =
        SettingsFile.parse(
            "{\"exponent\": {\"rule\": \"fit-all\"}, \"screening\": {\"spikes_mps\": \"off\"}}",
            "the command line",
            base);
    assertEquals(TopLaw.CONSTANT, settings.top());
    assertEquals(new Exponent(ExponentRule.FIT_ALL, 0.3), settings.exponent());
    assertEquals(Limit.OFF, settings.screening().spikes());
    assertEquals(Limit.AUTO, settings.screening().errorVelocity());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        // text | place | found | expected
        "{\"format\": \"crossreach-settings/2\"}|format|the text \"crossreach-settings/2\""
            + "|\"crossreach-settings/1\"",
        "{\"boat_velocity\": \"sonar\"}|boat_velocity|the text \"sonar\"|*",
        "{\"method\": 3}|method|3|one of \"section-normal\", \"path-flux\"",
        "{\"top\": \"log\"}|top|the text \"log\"|one of \"power\", \"constant\", \"three-point\"",
        "{\"section\": {\"line\": \"mine\"}}|section.line|the text \"mine\""
            + "|one of \"each-pass\", \"common\"",
        "{\"section\": {\"line\": 5}}|section.line|5"
            + "|\"each-pass\", \"common\" or {\"azimuth_deg\": …}",
        "{\"section\": {\"line\": {\"azimuth_deg\": 500}}}|section.line.azimuth_deg|500"
            + "|a number from -360 to 360 deg",
        "{\"section\": {\"line\": \"common\", \"azimuth_deg\": 5}}|section.line"
            + "|the text \"common\"|none beside azimuth_deg",
        "{\"exponent\": {\"value\": 1.5}}|exponent.value|1.5|a number from 0.01 to 1",
        "{\"edge_ensembles\": 0}|edge_ensembles|0|a whole number from 1 to 1000",
        "{\"edge_ensembles\": 2.5}|edge_ensembles|2.5|a whole number from 1 to 1000",
        "{\"screening\": []}|screening|an array|an object",
        "{\"screening\": {\"correlation\": 25}}|screening.correlation|25"
            + "|\"off\", \"auto\" or a number from 0 to 1",
        "{\"screening\": {\"spikes_mps\": \"on\"}}|screening.spikes_mps|the text \"on\""
            + "|\"off\", \"auto\" or a number from 0 to 20 m/s",
        "{\"screening\": {\"three_beam\": \"off\"}}|screening.three_beam|the text \"off\""
            + "|true or false",
        "{\"screening\": {\"exclusions\": [{\"pass\": \"a\", \"from_ensemble\": 5, "
            + "\"to_ensemble\": 4, \"reason\": \"x\"}]}}|screening.exclusions[0].to_ensemble|4"
            + "|at least from_ensemble, which is 5",
        "{\"screening\": {\"exclusions\": [{\"pass\": \"a\", \"from_ensemble\": 5, "
            + "\"to_ensemble\": 6, \"reason\": \" \"}]}}|screening.exclusions[0].reason"
            + "|an empty text|why the ensembles are left out",
        "{\"screening\": {\"exclusions\": [{\"pass\": \"a\"}]}}"
            + "|screening.exclusions[0].from_ensemble|no such key"
            + "|a whole number from 0 to 999999999999",
        "{\"sound_speed\": {\"temperature_degc\": 80}}|sound_speed.temperature_degc|80"
            + "|a number from -5 to 60 deg C",
        "{\"moving_bed\": \"guess\"}|moving_bed|the text \"guess\"|*",
        "{\"uncertainty\": {\"draws\": \"many\"}}|uncertainty.draws|*|*",
        "[]||an array|an object"
      })
  void tellsPlaceAndValue(String text, String place, String found, String expected) {
    Problem problem = problems(text).get(0);
    assertAll(
        () -> assertEquals("settings.json", problem.file()),
        () -> assertEquals(1, problem.line()),
        () -> assertEquals(place == null ? "" : place, problem.place()),
        () -> assertEquals("*".equals(found) ? problem.found() : found, problem.found()),
        () ->
            assertEquals("*".equals(expected) ? problem.expected() : expected, problem.expected()));
  }

  @Test
  void listsTheChoicesThatThereAre() {
    Problem problem = problems("{\"depth\": {\"source\": \"slant-maen\"}}").get(0);
    assertEquals(
        "settings.json:1, depth.source: found the text \"slant-maen\", expected one of "
            + "\"slant-mean\", \"slant-inverse-distance\", \"vertical\"; write slant-mean",
        problem.toString());
  }
}
