package org.crossreach.simulate;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.crossreach.ingest.FileProblems;
import org.crossreach.ingest.Identity;
import org.crossreach.ingest.JsonFields;
import org.crossreach.ingest.JsonNode;
import org.crossreach.ingest.JsonTree;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.UnusableInput;

/** Reads recipes; {@code formats/recipe.md} says what every key means. */
public final class RecipeFile {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-recipe/1";

  private static final double ANY = 1e6;
  private static final double MOST_DAYS_S = 1e7;

  private final FileProblems problems;

  private RecipeFile(FileProblems problems) {
    this.problems = problems;
  }

  /**
   * Reads a recipe.
   *
   * @param file the file
   * @throws UnusableInput with every problem of the file
   */
  public static Recipe read(Path file) throws UnusableInput, IOException {
    return parse(Files.readString(file), file.getFileName().toString());
  }

  /**
   * Reads a recipe from text.
   *
   * @param text JSON
   * @param name how problems call the text
   * @throws UnusableInput with every problem of the text
   */
  public static Recipe parse(String text, String name) throws UnusableInput {
    FileProblems problems = new FileProblems(name);
    JsonFields root = JsonFields.of(JsonTree.parse(text, problems), problems);
    problems.throwIfAny();
    try {
      Recipe recipe = new RecipeFile(problems).recipe(root);
      root.finish();
      problems.throwIfAny();
      return recipe;
    } catch (IllegalArgumentException unusable) {
      problems.throwIfAny();
      problems.add(0, "river", unusable.getMessage(), "a river that can be", "");
      throw new UnusableInput(problems.list());
    }
  }

  private Recipe recipe(JsonFields root) {
    root.oneOf("format", List.of(FORMAT));
    JsonFields passes = root.object("passes");
    JsonFields river = root.object("river");
    EdgePlan left = bank(river.findObject("left_bank"));
    EdgePlan right = bank(river.findObject("right_bank"));
    JsonFields measurement = root.object("measurement");
    return new Recipe(
        Identity.of(root, "id"),
        root.whole("seed", 0, Long.MAX_VALUE >> 11, 1),
        start(passes),
        (int) passes.whole("count", 1, 1000, 4),
        passes.oneOf("first_bank", List.of("left", "right"), "left").equals("right")
            ? Bank.RIGHT
            : Bank.LEFT,
        passes.number("pause_s", 0, MOST_DAYS_S, 120),
        river(river, left.law(), right.law()),
        boat(root.object("boat")),
        root.findObject("attitude").map(RecipeFile::attitude).orElse(Attitude.LEVEL),
        profiler(root.object("profiler"), measurement),
        root.findObject("noise").map(RecipeFile::noise).orElse(Noise.NONE),
        root.findObject("faults").map(RecipeFile::faults).orElse(Faults.NONE),
        (int) root.whole("decimals", 1, 12, 4),
        new Recipe.Edges(left.coefficient(), right.coefficient()),
        root.find("measurement").orElse(new JsonNode.Members("", 1, Map.of())),
        root.find("settings").orElse(new JsonNode.Nothing("", 1)));
  }

  private static OffsetDateTime start(JsonFields passes) {
    String text = passes.text("start", "2031-04-18T09:30:00+00:00");
    try {
      return OffsetDateTime.parse(text);
    } catch (DateTimeException unreadable) {
      passes.refuse(
          "start", '"' + text + '"', "a date and time with offset", "2031-04-18T09:30:00+01:00");
      return OffsetDateTime.MIN;
    }
  }

  private River river(JsonFields river, BankLaw leftBank, BankLaw rightBank) {
    return new River(
        river.number("section_azimuth_deg", -360, 360, 90),
        polyline(river, "bed", "depth_m", 0),
        polyline(river, "velocity", "mean_mps", -20),
        leftBank,
        rightBank,
        river.findObject("vertical").map(RecipeFile::vertical).orElse(VerticalLaws.power(1.0 / 6)),
        river.number("skew_deg", -80, 80, 0),
        river.findObject("factor").map(RecipeFile::factor).orElse(TimeFactor.STEADY));
  }

  private Polyline polyline(JsonFields river, String key, String quantity, double lowest) {
    List<Polyline.Point> points = new ArrayList<>();
    for (JsonFields point : river.objects(key)) {
      points.add(
          new Polyline.Point(
              point.number("station_m", -ANY, ANY), point.number(quantity, lowest, ANY)));
    }
    if (points.size() < 2) {
      river.refuse(key, points.size() + " points", "at least two", "");
      return new Polyline(List.of(new Polyline.Point(0, 1), new Polyline.Point(1, 1)));
    }
    for (int i = 1; i < points.size(); i++) {
      if (points.get(i).stationM() < points.get(i - 1).stationM()) {
        river.refuse(key, "stations that go back", "stations that do not decrease", "sort them");
        return new Polyline(List.of(new Polyline.Point(0, 1), new Polyline.Point(1, 1)));
      }
    }
    return new Polyline(points);
  }

  /** A bank as the recipe has it. */
  private record EdgePlan(BankLaw law, double coefficient) {}

  private static EdgePlan bank(Optional<JsonFields> given) {
    if (given.isEmpty()) {
      return new EdgePlan(BankLaw.NONE, Edge.WALL);
    }
    JsonFields bank = given.get();
    boolean wall = bank.oneOf("shape", List.of("wall", "sloping"), "wall").equals("wall");
    double coefficient = bank.number("coefficient", 0.05, 1, wall ? Edge.WALL : Edge.SLOPING);
    double width = bank.number("width_m", 0, ANY, 0);
    return new EdgePlan(
        wall ? BankLaw.wall(width, coefficient) : BankLaw.sloping(width, coefficient), coefficient);
  }

  private static VerticalLaw vertical(JsonFields vertical) {
    String law =
        vertical.oneOf(
            "law", List.of("power", "logarithmic", "constant-above", "wind-above", "rough-below"));
    double exponent = vertical.number("exponent", 0.01, 1, 1.0 / 6);
    double share = vertical.number("share", 0.01, 0.99, 0.7);
    return switch (law) {
      case "logarithmic" ->
          VerticalLaws.logarithmic(vertical.number("roughness_m", 1e-7, 1, 0.001));
      case "constant-above" -> VerticalLaws.constantAbove(exponent, share);
      case "wind-above" ->
          VerticalLaws.windAbove(exponent, share, vertical.number("surface_factor", -2, 3, 0.7));
      case "rough-below" ->
          VerticalLaws.roughBelow(exponent, share, vertical.number("bed_exponent", 0.01, 3, 0.5));
      default -> VerticalLaws.power(exponent);
    };
  }

  private static TimeFactor factor(JsonFields factor) {
    return new TimeFactor(
        factor.number("start", -10, 10, 1),
        factor.number("per_hour", -100, 100, 0),
        factor.number("amplitude", -10, 10, 0),
        factor.number("period_s", 1, MOST_DAYS_S, 44_712),
        factor.number("phase_deg", -360, 360, 0));
  }

  private static BoatPlan boat(JsonFields boat) {
    return new BoatPlan(
        boat.number("ensemble_s", 0.01, 3600, 1),
        (int) boat.whole("ensembles", 1, 10_000_000, 400),
        (int) boat.whole("hold_ensembles", 0, 100_000, 12),
        boat.number("speed_change", 0, 0.9, 0),
        boat.number("wobble_m", 0, 1000, 0),
        boat.number("wobbles", 0, 1000, 3),
        boat.number("left_edge_m", 0, ANY),
        boat.number("right_edge_m", 0, ANY));
  }

  private static Attitude attitude(JsonFields attitude) {
    return new Attitude(
        attitude.number("heading_deg", -360, 360, 0),
        attitude.number("heading_swing_deg", 0, 360, 0),
        attitude.number("pitch_deg", 0, 45, 0),
        attitude.number("roll_deg", 0, 45, 0),
        attitude.number("period_s", 0.1, 3600, 6));
  }

  private static Profiler profiler(JsonFields profiler, JsonFields measurement) {
    JsonFields facts = measurement.object("instrument");
    List<Double> azimuths = facts.numbers("beam_azimuths_deg", -360, 360);
    Instrument instrument =
        new Instrument(
            facts.text("serial", ""),
            facts.number("frequency_khz", 1, 1e5, Double.NaN),
            facts.number("beam_angle_deg", 1, 45),
            azimuths.size() == 4 ? azimuths : List.of(45.0, 135.0, 225.0, 315.0),
            facts.number("draft_m", 0, 20),
            facts.number("sound_speed_used_mps", 1300, 1700, Double.NaN),
            facts.number("declination_deg", -360, 360, 0),
            facts.number("heading_offset_deg", -360, 360, 0));
    String frame = profiler.oneOf("frame", List.of("earth", "ship", "instrument", "beam"), "earth");
    for (String fact : List.of("site", "party", "remarks", "stage", "rating", "water")) {
      measurement.has(fact); // handed on as it is; the reader of measurement.json judges it
    }
    return new Profiler(
        instrument,
        Frame.valueOf(frame.toUpperCase(Locale.ROOT)),
        profiler.number("blank_m", 0, 100, 0.25),
        profiler.number("cell_m", 0.001, 50, 0.25),
        (int) profiler.whole("cells", 1, 1000, 40),
        profiler.number("sound_speed_mps", 1300, 1700, Double.NaN),
        profiler.number("temperature_degc", -5, 60, Double.NaN),
        profiler.flag("vertical_beam", false),
        profiler.flag("quality_columns", false));
  }

  private static Noise noise(JsonFields noise) {
    return new Noise(
        noise.number("water_mps", 0, 10, 0),
        noise.number("boat_mps", 0, 10, 0),
        noise.number("depth_share", 0, 1, 0),
        noise.number("turbulence_share", 0, 1, 0),
        noise.number("turbulence_s", 0.01, 3600, 10));
  }

  private static Faults faults(JsonFields faults) {
    Map<Fault, Double> rates = new EnumMap<>(Fault.class);
    for (Fault fault : Fault.values()) {
      rates.put(fault, faults.number(fault.key(), 0, 1, 0));
    }
    return new Faults(
        rates,
        faults.number("spike_mps", 0, 20, 1),
        faults.flag("side_lobes", false),
        (int) faults.whole("bad_beam", 0, 4, 0));
  }
}
