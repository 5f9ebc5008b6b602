package org.crossreach.report;

import java.io.IOException;
import java.io.OutputStream;
import org.crossreach.notation.JsonText;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.settings.SectionLine;
import org.crossreach.settings.Settings;

/** Writes settings under the keys of {@code settings.json}, so that they can be read again. */
public final class SettingsJson {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-settings/1";

  private SettingsJson() {}

  /**
   * Writes a whole {@code settings.json}.
   *
   * @param settings the choices
   * @param target receives UTF-8; it is left open
   */
  public static void write(Settings settings, OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      json.object(() -> members(settings, json));
    }
  }

  /** Writes the members of the settings object. */
  public static void members(Settings settings, JsonText json) throws IOException {
    json.text("format", FORMAT);
    json.text("boat_velocity", settings.boatVelocity().key());
    json.text("method", settings.method().key());
    json.object("section", () -> line(settings.section(), json));
    json.object("depth", () -> json.text("source", settings.depth().key()));
    json.text("top", settings.top().key());
    json.text("bottom", settings.bottom().key());
    json.object(
        "exponent",
        () -> {
          json.text("rule", settings.exponent().rule().key());
          json.number("value", settings.exponent().value());
        });
    json.whole("edge_ensembles", settings.edgeEnsembles());
    json.object("screening", () -> screening(settings.screening(), json));
    json.object(
        "sound_speed",
        () -> {
          json.text("formula", settings.soundSpeed().formula().key());
          json.number("temperature_degc", settings.soundSpeed().temperatureDegC());
        });
    json.text("moving_bed", settings.movingBed().key());
    json.object("uncertainty", () -> {});
  }

  private static void line(SectionLine section, JsonText json) throws IOException {
    switch (section.kind()) {
      case EACH_PASS -> json.text("line", "each-pass");
      case COMMON -> json.text("line", "common");
      case AZIMUTH -> json.object("line", () -> json.number("azimuth_deg", section.azimuthDeg()));
    }
  }

  private static void screening(Screening screening, JsonText json) throws IOException {
    limit("error_velocity_mps", screening.errorVelocity(), json);
    limit("vertical_velocity_mps", screening.verticalVelocity(), json);
    limit("correlation", screening.correlation(), json);
    limit("intensity_db", screening.intensity(), json);
    limit("good_pct", screening.goodPct(), json);
    json.flag("three_beam", screening.threeBeam());
    limit("spikes_mps", screening.spikes(), json);
    limit("bottom_error_velocity_mps", screening.bottomErrorVelocity(), json);
    limit("bottom_vertical_velocity_mps", screening.bottomVerticalVelocity(), json);
    limit("boat_speed_mps", screening.boatSpeed(), json);
    limit("depth_beams", screening.depthBeams(), json);
    json.whole("minimum_cells", screening.minimumCells());
    json.number("leave_out_top_m", screening.leaveOutTopM());
    json.objects(
        "exclusions",
        screening.exclusions(),
        (Exclusion exclusion) -> {
          json.text("pass", exclusion.pass());
          json.whole("from_ensemble", exclusion.fromEnsemble());
          json.whole("to_ensemble", exclusion.toEnsemble());
          json.text("reason", exclusion.reason());
        });
  }

  private static void limit(String name, Limit limit, JsonText json) throws IOException {
    switch (limit.kind()) {
      case OFF -> json.text(name, "off");
      case AUTO -> json.text(name, "auto");
      case GIVEN -> json.number(name, limit.value());
    }
  }
}
