package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.report.Decimals;
import org.crossreach.report.Quantity;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Site;
import org.crossreach.survey.Stage;

/** Facts that all passes of a measurement share. */
final class MeasurementFacts {

  private MeasurementFacts() {}

  /** Site, party and stage. */
  static void addSite(Facts facts, Subject subject) {
    Site site = subject.measurement().site();
    facts
        .add("Site number", site.number())
        .add("Position (WGS 84)", position(site))
        .add("Party", String.join(", ", subject.measurement().party()));
    subject.measurement().stage().ifPresent(stage -> facts.add("Stage", stage(subject, stage)));
  }

  /** Profiler and water. */
  static void addInstrument(Facts facts, Subject subject) {
    Instrument instrument = subject.measurement().instrument();
    facts
        .add(
            "Profiler",
            (instrument.serial().isBlank() ? "" : instrument.serial() + ", ")
                + number(instrument.frequencyKhz(), " kHz")
                + ", beams at "
                + number(instrument.beamAngleDeg(), "°"))
        .add("Draft", subject.with(Quantity.LENGTH, instrument.draftM(), 2))
        .add(
            "North",
            "declination "
                + number(instrument.declinationDeg(), "°")
                + ", offset "
                + number(instrument.headingOffsetDeg(), "°"))
        .add("Water temperature check", temperature(subject))
        .add("Salinity", number(subject.measurement().water().salinityPpt(), " ppt"));
  }

  private static String temperature(Subject subject) {
    double degrees = subject.measurement().water().temperatureCheckDegC();
    return Double.isNaN(degrees) ? "" : number(degrees, " °C");
  }

  private static String position(Site site) {
    if (Double.isNaN(site.latitudeDeg()) || Double.isNaN(site.longitudeDeg())) {
      return "";
    }
    Decimals six = new Decimals(6);
    return six.of(Math.abs(site.latitudeDeg()))
        + (site.latitudeDeg() < 0 ? "° S, " : "° N, ")
        + six.of(Math.abs(site.longitudeDeg()))
        + (site.longitudeDeg() < 0 ? "° W" : "° E");
  }

  private static String stage(Subject subject, Stage stage) {
    List<Stage.Reading> readings = stage.readings();
    if (readings.isEmpty()) {
      return stage.datum();
    }
    Stage.Reading first = readings.get(0);
    Stage.Reading last = readings.get(readings.size() - 1);
    String text = at(subject, first);
    if (readings.size() > 1) {
      text += " to " + at(subject, last);
    }
    return stage.datum().isBlank() ? text : text + " above " + stage.datum();
  }

  private static String at(Subject subject, Stage.Reading reading) {
    return subject.with(Quantity.LENGTH, reading.stageM(), 3)
        + " at "
        + Subject.clock(reading.time()).substring(0, 5);
  }

  private static String number(double value, String unit) {
    return Plain.number(value) + unit;
  }
}
