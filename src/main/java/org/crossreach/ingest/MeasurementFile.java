package org.crossreach.ingest;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.MovingBedTest;
import org.crossreach.survey.Rating;
import org.crossreach.survey.Site;
import org.crossreach.survey.Stage;
import org.crossreach.survey.Water;

/**
 * What {@code measurement.json} says, before the files that it names are read.
 *
 * <p>Problems go to the file's problems; the record then holds stand-ins and is not to be used for
 * anything but finding more problems.
 */
record MeasurementFile(
    String id,
    Site site,
    List<String> party,
    String remarks,
    Optional<Stage> stage,
    Optional<Rating> rating,
    Water water,
    Instrument instrument,
    JsonFields instrumentFields,
    List<PassEntry> passes,
    List<TestEntry> tests) {

  static final String NAME = "measurement.json";
  static final String FORMAT = "crossreach-measurement/1";

  private static final PhysicalRange COEFFICIENT_A = new PhysicalRange(0, 1e6, "");
  private static final PhysicalRange EXPONENT_B = new PhysicalRange(0.01, 10, "");

  /** One of the {@code passes}; {@code fields} gives its place. */
  record PassEntry(
      JsonFields fields,
      String file,
      String name,
      Bank startBank,
      boolean used,
      String note,
      Edge leftEdge,
      Edge rightEdge) {}

  /** One of the {@code moving_bed_tests}; {@code fields} gives its place. */
  record TestEntry(JsonFields fields, String file, MovingBedTest.Kind kind) {}

  /** Reads the members of the file. */
  static MeasurementFile of(JsonFields root) {
    root.oneOf("format", List.of(FORMAT));
    JsonFields instrument = root.object("instrument");
    MeasurementFile file =
        new MeasurementFile(
            Identity.of(root, "id"),
            root.findObject("site").map(MeasurementFile::site).orElse(NO_SITE),
            root.texts("party"),
            root.text("remarks", ""),
            root.findObject("stage").map(MeasurementFile::stage),
            root.findObject("rating").map(MeasurementFile::rating),
            root.findObject("water").map(MeasurementFile::water).orElse(FRESH_WATER),
            instrument(instrument),
            instrument,
            passes(root),
            tests(root));
    root.finish();
    return file;
  }

  private static final Site NO_SITE = new Site("", "", "", Double.NaN, Double.NaN);
  private static final Water FRESH_WATER = new Water(Double.NaN, 0);

  private static Site site(JsonFields site) {
    return new Site(
        site.text("name", ""),
        site.text("number", ""),
        site.text("river", ""),
        site.number("latitude_deg", PhysicalRange.LATITUDE, Double.NaN),
        site.number("longitude_deg", PhysicalRange.LONGITUDE, Double.NaN));
  }

  private static Stage stage(JsonFields stage) {
    List<Stage.Reading> readings = new ArrayList<>();
    for (JsonFields reading : stage.findObjects("readings")) {
      OffsetDateTime time = time(reading, "time");
      double stageM = reading.number("stage_m", PhysicalRange.STAGE);
      readings.add(new Stage.Reading(time, stageM));
    }
    return new Stage(stage.text("datum", ""), readings);
  }

  private static OffsetDateTime time(JsonFields fields, String key) {
    String text = fields.text(key);
    Rfc3339 time = new Rfc3339();
    if (time.parse(text.toCharArray(), 0, text.length())) {
      return time.toOffsetDateTime();
    }
    if (fields.has(key)) {
      fields.refuse(
          key,
          Quoted.of(text),
          "a date and time with offset, for example 2031-04-18T09:30:00+01:00",
          "");
    }
    return OffsetDateTime.MIN;
  }

  private static Rating rating(JsonFields rating) {
    List<Rating.Segment> segments = new ArrayList<>();
    double reached = Double.NEGATIVE_INFINITY;
    for (JsonFields segment : rating.objects("segments")) {
      double from = segment.number("from_stage_m", PhysicalRange.STAGE);
      double to = segment.number("to_stage_m", PhysicalRange.STAGE);
      if (from < reached) {
        segment.refuse(
            "from_stage_m",
            Double.toString(from),
            "at least " + reached + ", where the segment before ends",
            "sort the segments by stage");
      }
      if (to <= from) {
        segment.refuse("to_stage_m", Double.toString(to), "a stage above " + from, "");
      }
      reached = to;
      segments.add(
          new Rating.Segment(
              from,
              to,
              segment.number("a", COEFFICIENT_A),
              segment.number("h0_m", PhysicalRange.STAGE),
              segment.number("b", EXPONENT_B)));
    }
    return new Rating(segments);
  }

  private static Water water(JsonFields water) {
    return new Water(
        water.number("temperature_check_degc", PhysicalRange.TEMPERATURE, Double.NaN),
        water.number("salinity_ppt", PhysicalRange.SALINITY, 0));
  }

  private static Instrument instrument(JsonFields instrument) {
    List<Double> azimuths =
        instrument.numbers(
            "beam_azimuths_deg",
            PhysicalRange.DIRECTION.lowest(),
            PhysicalRange.DIRECTION.highest());
    if (!azimuths.isEmpty() && azimuths.size() != 4) {
      instrument.refuse(
          "beam_azimuths_deg", azimuths.size() + " azimuths", "four, one for each beam", "");
    }
    return new Instrument(
        instrument.text("serial", ""),
        instrument.number("frequency_khz", PhysicalRange.FREQUENCY, Double.NaN),
        instrument.number("beam_angle_deg", PhysicalRange.BEAM_ANGLE),
        azimuths,
        instrument.number("draft_m", PhysicalRange.DRAFT),
        instrument.number("sound_speed_used_mps", PhysicalRange.SOUND_SPEED, Double.NaN),
        instrument.number("declination_deg", PhysicalRange.DIRECTION, 0),
        instrument.number("heading_offset_deg", PhysicalRange.DIRECTION, 0));
  }

  private static List<PassEntry> passes(JsonFields root) {
    List<PassEntry> passes = new ArrayList<>();
    Set<String> names = new HashSet<>();
    for (JsonFields pass : root.objects("passes")) {
      String file = pass.text("file");
      String name = FolderPath.passName(file);
      String bank = pass.oneOf("start_bank", List.of("left", "right"));
      boolean used = pass.flag("use", true);
      String note = pass.text("note", "");
      Edge left = edge(pass.object("left_edge"));
      Edge right = edge(pass.object("right_edge"));
      if (!name.isEmpty() && !names.add(name)) {
        pass.refuse(
            "file",
            "the name " + Quoted.of(name) + " of an earlier pass",
            "every pass under a name of its own",
            "rename one of the files");
      }
      passes.add(
          new PassEntry(
              pass,
              file,
              name,
              bank.equals("right") ? Bank.RIGHT : Bank.LEFT,
              used,
              note,
              left,
              right));
    }
    if (root.find("passes").orElse(null) instanceof JsonNode.Elements array
        && array.elements().isEmpty()) {
      root.refuse("passes", "no pass", "at least one", "");
    }
    return passes;
  }

  private static Edge edge(JsonFields edge) {
    double distance = edge.number("distance_m", PhysicalRange.EDGE_DISTANCE);
    double discharge = edge.number("discharge_m3s", PhysicalRange.EDGE_DISCHARGE, Double.NaN);
    List<String> shapes = List.of("sloping", "wall", "coefficient");
    if (edge.has("discharge_m3s") && !edge.has("shape")) {
      edge.find("coefficient")
          .ifPresent(
              node ->
                  edge.refuse(
                      "coefficient", node.phrase(), "none beside discharge_m3s", "remove one"));
      return Double.isNaN(discharge)
          ? new Edge(distance, Edge.SLOPING, Double.NaN)
          : new Edge(distance, Double.NaN, discharge);
    }
    if (edge.has("discharge_m3s")) {
      edge.refuse(
          "shape", edge.find("shape").get().phrase(), "none beside discharge_m3s", "remove one");
    }
    String shape = edge.oneOf("shape", shapes);
    double coefficient =
        switch (shape) {
          case "wall" -> Edge.WALL;
          case "coefficient" -> edge.number("coefficient", PhysicalRange.EDGE_COEFFICIENT);
          default -> Edge.SLOPING;
        };
    if (!shape.equals("coefficient") && edge.has("coefficient") && edge.has("shape")) {
      edge.refuse(
          "coefficient",
          edge.find("coefficient").get().phrase(),
          "none beside the shape " + Quoted.of(shape),
          "remove it, or make the shape \"coefficient\"");
    }
    return new Edge(distance, Double.isNaN(coefficient) ? Edge.SLOPING : coefficient, Double.NaN);
  }

  private static List<TestEntry> tests(JsonFields root) {
    List<TestEntry> tests = new ArrayList<>();
    for (JsonFields test : root.findObjects("moving_bed_tests")) {
      String kind = test.oneOf("kind", List.of("loop", "stationary"));
      String file = test.text("file");
      tests.add(
          new TestEntry(
              test,
              file,
              kind.equals("stationary") ? MovingBedTest.Kind.STATIONARY : MovingBedTest.Kind.LOOP));
    }
    return tests;
  }
}
