package org.crossreach.report.result;

import java.io.IOException;
import java.util.Locale;
import java.util.Optional;
import org.crossreach.discharge.FilledShare;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.notation.JsonText;
import org.crossreach.screen.Accounting;
import org.crossreach.screen.FoundLimit;
import org.crossreach.screen.Reason;
import org.crossreach.screen.Run;
import org.crossreach.screen.SoundSpeedCorrection;
import org.crossreach.screen.Tally;

/** What became of the samples of a pass: seen, rejected and why, filled and how. */
final class AccountingObject {

  private AccountingObject() {}

  static void write(PassDischarge pass, JsonText json) throws IOException {
    Accounting accounting = pass.section().pass().accounting();
    json.object(
        "accounting",
        () -> {
          json.object("cells", () -> tally(accounting.cells(), json));
          json.object("bottom_track", () -> tally(accounting.bottomTrack(), json));
          json.object("depths", () -> tally(accounting.depths(), json));
          json.whole("depths_replaced", accounting.depthsReplaced());
          json.whole("three_beam_cells", accounting.threeBeamCells());
          json.whole("three_beam_bottom_track", accounting.threeBeamBottomTrack());
          json.whole("unsound_beam", accounting.unsoundBeam());
          json.objects("limits", accounting.limits(), each -> limit(each, json));
          run("longest_without_water", accounting.longestWithoutWater(), json);
          run("longest_without_bottom_track", accounting.longestWithoutBottomTrack(), json);
          json.object("filled_pct", () -> filled(pass.geometry().filled(), json));
          soundSpeed(accounting.soundSpeed(), json);
        });
  }

  private static void tally(Tally tally, JsonText json) throws IOException {
    json.whole("recorded", tally.recorded());
    json.whole("used", tally.used());
    json.object(
        "rejected",
        () -> {
          for (Reason reason : Reason.values()) {
            if (reason != Reason.NONE && tally.of(reason) > 0) {
              json.whole(reason.key(), tally.of(reason));
            }
          }
        });
  }

  private static void limit(FoundLimit limit, JsonText json) throws IOException {
    json.text("screen", limit.criterion().key());
    json.text("kind", limit.kind().name().toLowerCase(Locale.ROOT));
    json.number("centre", limit.centre());
    json.number("limit", limit.value());
  }

  private static void run(String name, Optional<Run> run, JsonText json) throws IOException {
    if (run.isEmpty()) {
      json.nothing(name);
      return;
    }
    json.object(
        name,
        () -> {
          json.whole("ensembles", run.get().ensembles());
          json.whole("from_ensemble", run.get().fromEnsemble());
          json.whole("to_ensemble", run.get().toEnsemble());
          json.number("duration_s", run.get().durationS());
        });
  }

  private static void filled(FilledShare filled, JsonText json) throws IOException {
    json.number("columns", filled.columnsPct());
    json.number("boat_velocities", filled.boatVelocitiesPct());
    json.number("depths", filled.depthsPct());
    json.number("gaps", filled.gapsPct());
  }

  private static void soundSpeed(Optional<SoundSpeedCorrection> correction, JsonText json)
      throws IOException {
    if (correction.isEmpty()) {
      json.nothing("sound_speed");
      return;
    }
    SoundSpeedCorrection sound = correction.get();
    json.object(
        "sound_speed",
        () -> {
          json.text("formula", sound.formula());
          json.text("temperature_source", sound.temperatureSource());
          json.number("temperature_degc", sound.temperatureDegC());
          json.number("salinity_ppt", sound.salinityPpt());
          json.number("used_mps", sound.usedMps());
          json.number("true_mps", sound.trueMps());
        });
  }
}
