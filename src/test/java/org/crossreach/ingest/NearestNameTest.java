package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A slip leads to the name that was meant; another word leads nowhere. */
class NearestNameTest {

  @ParameterizedTest
  @CsvSource({
    "ensembel,ensemble",
    "Ensemble,ensemble",
    "tiem,time",
    "bt_est_mps,bt_east_mps",
    "bt_east_mp,bt_east_mps",
    "east_mps_70,east_mps_7",
    "estt_mps_12,east_mps_12",
    "depth_beam_1_m,depth_beam1_m",
    "temperature_c,temperature_degc",
    "heading,heading_deg",
    "goodpct_3,good_pct_3"
  })
  void findsTheColumnThatWasMeant(String slip, String meant) {
    List<String> names =
        List.of(
            "ensemble",
            "time",
            "cells",
            "bt_east_mps",
            "bt_north_mps",
            "east_mps_7",
            "east_mps_12",
            "depth_beam1_m",
            "temperature_degc",
            "heading_deg",
            "good_pct_3");
    assertEquals(Optional.of(meant), NearestName.find(slip, names));
  }

  @Test
  void findsNothingForOtherWords() {
    List<String> names = List.of("time", "cells");
    assertEquals(Optional.empty(), NearestName.find("weather", names));
    assertEquals(Optional.empty(), NearestName.find("", names));
    assertEquals(Optional.empty(), NearestName.find("t".repeat(100_000), names));
    assertEquals(Optional.empty(), NearestName.find("time", List.of()));
  }

  @Test
  void takesCellNumbersFromTheSlip() {
    assertEquals(Optional.of("north_mps_45"), EnsembleColumn.nearest("nroth_mps_45"));
    assertEquals(Optional.of("bt_up_mps"), EnsembleColumn.nearest("bt_upp_mps"));
  }
}
