package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.agreement.Result;
import org.crossreach.notation.JsonText;
import org.crossreach.notation.TimeText;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Rating;
import org.crossreach.survey.Site;
import org.crossreach.survey.Stage;

/** The facts of the measurement, under the keys of {@code measurement.json}. */
final class MeasurementPart implements ResultPart {

  @Override
  public void write(Result result, JsonText json) throws IOException {
    Measurement measurement = result.reduction().measurement();
    json.object(
        "measurement",
        () -> {
          json.text("id", measurement.id());
          site(measurement.site(), json);
          json.texts("party", measurement.party());
          json.text("remarks", measurement.remarks());
          if (measurement.stage().isPresent()) {
            stage(measurement.stage().get(), json);
          }
          if (measurement.rating().isPresent()) {
            rating(measurement.rating().get(), json);
          }
          json.object(
              "water",
              () -> {
                json.number("temperature_check_degc", measurement.water().temperatureCheckDegC());
                json.number("salinity_ppt", measurement.water().salinityPpt());
              });
          instrument(measurement.instrument(), json);
        });
  }

  private static void site(Site site, JsonText json) throws IOException {
    json.object(
        "site",
        () -> {
          json.text("name", site.name());
          json.text("number", site.number());
          json.text("river", site.river());
          json.number("latitude_deg", site.latitudeDeg());
          json.number("longitude_deg", site.longitudeDeg());
        });
  }

  private static void stage(Stage stage, JsonText json) throws IOException {
    json.object(
        "stage",
        () -> {
          json.text("datum", stage.datum());
          json.objects(
              "readings",
              stage.readings(),
              (Stage.Reading reading) -> {
                json.text("time", TimeText.of(reading.time()));
                json.number("stage_m", reading.stageM());
              });
        });
  }

  private static void rating(Rating rating, JsonText json) throws IOException {
    json.object(
        "rating",
        () ->
            json.objects(
                "segments",
                rating.segments(),
                (Rating.Segment segment) -> {
                  json.number("from_stage_m", segment.fromStageM());
                  json.number("to_stage_m", segment.toStageM());
                  json.number("a", segment.a());
                  json.number("h0_m", segment.h0M());
                  json.number("b", segment.b());
                }));
  }

  private static void instrument(Instrument instrument, JsonText json) throws IOException {
    json.object(
        "instrument",
        () -> {
          json.text("serial", instrument.serial());
          json.number("frequency_khz", instrument.frequencyKhz());
          json.number("beam_angle_deg", instrument.beamAngleDeg());
          json.numbers(
              "beam_azimuths_deg",
              instrument.beamAzimuthsDeg().stream().mapToDouble(Double::doubleValue).toArray());
          json.number("draft_m", instrument.draftM());
          json.number("sound_speed_used_mps", instrument.soundSpeedUsedMps());
          json.number("declination_deg", instrument.declinationDeg());
          json.number("heading_offset_deg", instrument.headingOffsetDeg());
        });
  }
}
