package org.crossreach.ingest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.crossreach.settings.BoatVelocity;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Method;
import org.crossreach.settings.MovingBed;
import org.crossreach.settings.Screening;
import org.crossreach.settings.SectionLine;
import org.crossreach.settings.Settings;
import org.crossreach.settings.SoundSpeed;
import org.crossreach.settings.SoundSpeedFormula;
import org.crossreach.settings.TopLaw;
import org.crossreach.survey.UnusableInput;

/**
 * Reads the choices of {@code settings.json}.
 *
 * <p>Every key is optional: what is not said stays as it was, by default as {@link
 * Settings#defaults()}. A choice that this version does not have is a problem that lists those it
 * has.
 */
public final class SettingsFile {

  static final String NAME = "settings.json";
  static final String FORMAT = "crossreach-settings/1";

  private static final PhysicalRange AZIMUTH = PhysicalRange.DIRECTION;
  private static final PhysicalRange DEPARTURE = new PhysicalRange(0, 20, "m/s");
  private static final PhysicalRange DEPTH_SHARE = new PhysicalRange(0.001, 10, "");
  private static final PhysicalRange LEFT_OUT = new PhysicalRange(0, 100, "m");
  private static final PhysicalRange EXPONENT =
      new PhysicalRange(Exponent.LOWEST, Exponent.HIGHEST, "");
  private static final int MOST_EDGE_ENSEMBLES = 1000;

  private SettingsFile() {}

  /**
   * Reads the choices of a measurement.
   *
   * @param folder the measurement's folder
   * @return what its {@code settings.json} says, the defaults when there is none
   * @throws UnusableInput with every problem of the file
   * @throws IOException when the file cannot be read from its disk
   */
  public static Settings read(Path folder) throws UnusableInput, IOException {
    Path file = folder.resolve(NAME);
    if (!Files.exists(file)) {
      return Settings.defaults();
    }
    FileProblems problems = new FileProblems(NAME);
    byte[] bytes = StoredFile.bytes(file, problems);
    Settings settings = of(JsonTree.parse(bytes, problems), problems, Settings.defaults(), null);
    problems.throwIfAny();
    return settings;
  }

  /**
   * Overrides choices by those that a text says.
   *
   * @param text JSON with the keys of {@code settings.json}
   * @param fileName how problems call the text
   * @param base the choices that hold where the text says nothing
   * @throws UnusableInput with every problem of the text
   */
  public static Settings parse(String text, String fileName, Settings base) throws UnusableInput {
    FileProblems problems = new FileProblems(fileName);
    Settings settings = of(JsonTree.parse(text, problems), problems, base, null);
    problems.throwIfAny();
    return settings;
  }

  /**
   * Reads choices from JSON.
   *
   * @param passes names of the passes that can be excluded from, {@code null} when unknown
   */
  static Settings of(
      Optional<JsonNode> json, FileProblems problems, Settings base, Set<String> passes) {
    JsonFields root = JsonFields.of(json, problems);
    root.oneOf("format", List.of(FORMAT), "");
    Settings settings =
        new Settings(
            root.choice("boat_velocity", BoatVelocity.class, base.boatVelocity()),
            root.choice("method", Method.class, base.method()),
            root.findObject("section").map(SettingsFile::section).orElse(base.section()),
            root.findObject("depth")
                .map(depth -> depth.choice("source", DepthSource.class, base.depth()))
                .orElse(base.depth()),
            root.choice("top", TopLaw.class, base.top()),
            root.choice("bottom", BottomLaw.class, base.bottom()),
            root.findObject("exponent")
                .map(exponent -> exponent(exponent, base.exponent()))
                .orElse(base.exponent()),
            (int) root.whole("edge_ensembles", 1, MOST_EDGE_ENSEMBLES, base.edgeEnsembles()),
            root.findObject("screening")
                .map(screening -> screening(screening, base.screening(), passes))
                .orElse(base.screening()),
            root.findObject("sound_speed")
                .map(soundSpeed -> soundSpeed(soundSpeed, base.soundSpeed()))
                .orElse(base.soundSpeed()),
            root.choice("moving_bed", MovingBed.class, base.movingBed()));
    root.findObject("uncertainty");
    root.finish();
    return settings;
  }

  private static SectionLine section(JsonFields section) {
    JsonNode line = section.find("line").orElse(null);
    boolean direct = section.has("azimuth_deg");
    if (direct && line != null) {
      section.refuse("line", line.phrase(), "none beside azimuth_deg", "remove one of the two");
      return SectionLine.EACH_PASS;
    }
    if (direct) {
      return azimuth(section);
    }
    if (line instanceof JsonNode.Members) {
      return section.findObject("line").map(SettingsFile::azimuth).orElseThrow();
    }
    if (line != null && !(line instanceof JsonNode.Text)) {
      section.refuse(
          "line", line.phrase(), "\"each-pass\", \"common\" or {\"azimuth_deg\": …}", "");
      return SectionLine.EACH_PASS;
    }
    return section.oneOf("line", List.of("each-pass", "common"), "each-pass").equals("common")
        ? SectionLine.COMMON
        : SectionLine.EACH_PASS;
  }

  private static SectionLine azimuth(JsonFields fields) {
    double azimuth = fields.number("azimuth_deg", AZIMUTH);
    return Double.isNaN(azimuth) ? SectionLine.EACH_PASS : SectionLine.ofAzimuth(azimuth);
  }

  private static Exponent exponent(JsonFields exponent, Exponent base) {
    return new Exponent(
        exponent.choice("rule", ExponentRule.class, base.rule()),
        exponent.number("value", EXPONENT, base.value()));
  }

  private static SoundSpeed soundSpeed(JsonFields soundSpeed, SoundSpeed base) {
    return new SoundSpeed(
        soundSpeed.choice("formula", SoundSpeedFormula.class, base.formula()),
        soundSpeed.number("temperature_degc", PhysicalRange.TEMPERATURE, base.temperatureDegC()));
  }

  private static Screening screening(JsonFields fields, Screening base, Set<String> passes) {
    return new Screening(
        limit(fields, "error_velocity_mps", DEPARTURE, base.errorVelocity()),
        limit(fields, "vertical_velocity_mps", DEPARTURE, base.verticalVelocity()),
        limit(fields, "correlation", PhysicalRange.CORRELATION, base.correlation()),
        limit(fields, "intensity_db", PhysicalRange.INTENSITY, base.intensity()),
        limit(fields, "good_pct", PhysicalRange.PERCENTAGE, base.goodPct()),
        fields.flag("three_beam", base.threeBeam()),
        limit(fields, "spikes_mps", DEPARTURE, base.spikes()),
        limit(fields, "bottom_error_velocity_mps", DEPARTURE, base.bottomErrorVelocity()),
        limit(fields, "bottom_vertical_velocity_mps", DEPARTURE, base.bottomVerticalVelocity()),
        limit(fields, "boat_speed_mps", DEPARTURE, base.boatSpeed()),
        limit(fields, "depth_beams", DEPTH_SHARE, base.depthBeams()),
        (int) fields.whole("minimum_cells", 1, EnsembleColumn.MOST_CELLS, base.minimumCells()),
        fields.number("leave_out_top_m", LEFT_OUT, base.leaveOutTopM()),
        fields.has("exclusions") ? exclusions(fields, passes) : base.exclusions());
  }

  private static Limit limit(JsonFields fields, String key, PhysicalRange range, Limit base) {
    JsonNode node = fields.find(key).orElse(null);
    if (node == null) {
      return base;
    }
    if (node instanceof JsonNode.Text text && text.text().equals("off")) {
      return Limit.OFF;
    }
    if (node instanceof JsonNode.Text text && text.text().equals("auto")) {
      return Limit.AUTO;
    }
    if (node instanceof JsonNode.Number number && range.holds(number.value())) {
      return Limit.of(number.value());
    }
    fields.refuse(key, node.phrase(), "\"off\", \"auto\" or " + range.phrase(), "");
    return base;
  }

  private static List<Exclusion> exclusions(JsonFields fields, Set<String> passes) {
    List<Exclusion> exclusions = new ArrayList<>();
    for (JsonFields exclusion : fields.findObjects("exclusions")) {
      String pass = exclusion.text("pass");
      long from = exclusion.whole("from_ensemble", 0, (long) PhysicalRange.NUMBER.highest());
      long to = exclusion.whole("to_ensemble", 0, (long) PhysicalRange.NUMBER.highest());
      String reason = exclusion.text("reason");
      if (passes != null && exclusion.has("pass") && !passes.contains(pass)) {
        exclusion.refuse("pass", Quoted.of(pass), JsonFields.oneOfPhrase(List.copyOf(passes)), "");
      }
      if (exclusion.has("to_ensemble") && to < from) {
        exclusion.refuse(
            "to_ensemble", Long.toString(to), "at least from_ensemble, which is " + from, "");
      } else if (exclusion.has("reason") && reason.isBlank()) {
        exclusion.refuse("reason", "an empty text", "why the ensembles are left out", "");
      } else if (!reason.isBlank() && to >= from) {
        exclusions.add(new Exclusion(pass, from, to, reason));
      }
    }
    return exclusions;
  }
}
