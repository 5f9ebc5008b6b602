package org.crossreach.screen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.settings.SoundSpeed;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Note;
import org.crossreach.survey.Water;

/**
 * The correction of a record that was made with another speed of sound than the water had.
 *
 * <p>With r the true over the used speed of sound at the transducer face: velocities of water and
 * bottom, depths below the face, first cell and cell size are multiplied by r; the draft is not.
 * Horizontal velocity needs no profile of the speed of sound, since sin(angle)/c is conserved along
 * a beam; distances are taken as in uniform water. With bottom tracking discharge goes with r³,
 * with another boat velocity with r². A record that does not state the speed it used is not
 * corrected.
 *
 * <p>Source: principle in ISO 24578:2021, 4.5; powers derived.
 *
 * @param ratio r of every ensemble
 * @param correction what was done, if anything
 * @param notes what a person should know
 */
record SoundSpeedScreen(
    SoundRatio ratio, Optional<SoundSpeedCorrection> correction, List<Note> notes) {

  /**
   * Largest difference between the recorded temperature and an independent one that goes without
   * remark (deg C, common practice). At 10 deg C 2 deg C are 0.5 % of the speed of sound and 1.6 %
   * of the discharge.
   */
  private static final double TEMPERATURES_AGREE_DEGC = 2;

  static SoundSpeedScreen of(
      Ensembles ensembles,
      double[] elapsedS,
      Instrument instrument,
      Water water,
      SoundSpeed choice) {
    List<Note> notes = new ArrayList<>();
    WaterTemperature temperature = WaterTemperature.of(ensembles, elapsedS, water, choice);
    departure(temperature, water, notes);
    double used = instrument.soundSpeedUsedMps();
    if (Double.isNaN(used)) {
      return new SoundSpeedScreen(SoundRatio.NONE, Optional.empty(), notes);
    }
    if (temperature.source() == WaterTemperature.Source.UNKNOWN) {
      notes.add(
          new Note(
              Note.Level.CAUTION,
              "sound-speed-uncorrected",
              "the record used "
                  + Rounded.of(used, 1)
                  + " m/s, but no temperature of the water is known to correct it by"));
      return new SoundSpeedScreen(SoundRatio.NONE, Optional.empty(), notes);
    }
    double salinity = water.salinityPpt();
    SoundSpeedLaw law = SoundSpeedLaws.of(choice.formula(), salinity);
    double[] degC = temperature.degC();
    double[] ratio = new double[degC.length];
    double sumC = 0;
    double sumT = 0;
    boolean covered = true;
    for (int i = 0; i < degC.length; i++) {
      double c = law.metresPerSecond(degC[i], salinity);
      covered &= law.covers(degC[i], salinity);
      ratio[i] = c / used;
      sumC += c;
      sumT += degC[i];
    }
    SoundSpeedCorrection correction =
        new SoundSpeedCorrection(
            SoundSpeedLaws.chosen(choice.formula(), salinity).key(),
            temperature.source().key(),
            sumT / degC.length,
            salinity,
            used,
            sumC / degC.length);
    describe(correction, covered, notes);
    return new SoundSpeedScreen(new SoundRatio(ratio), Optional.of(correction), notes);
  }

  private static void departure(WaterTemperature temperature, Water water, List<Note> notes) {
    double difference = temperature.sensorMeanDegC() - water.temperatureCheckDegC();
    if (Math.abs(difference) > TEMPERATURES_AGREE_DEGC) {
      notes.add(
          new Note(
              Note.Level.CAUTION,
              "temperature-departs",
              "the recorded temperature departs by "
                  + Rounded.of(difference, 1)
                  + " deg C from the check of "
                  + Rounded.of(water.temperatureCheckDegC(), 1)
                  + " deg C, more than "
                  + Rounded.of(TEMPERATURES_AGREE_DEGC, 0)
                  + " deg C"));
    }
  }

  private static void describe(SoundSpeedCorrection correction, boolean covered, List<Note> notes) {
    notes.add(
        new Note(
            Note.Level.NOTE,
            "sound-speed-corrected",
            "from "
                + Rounded.of(correction.usedMps(), 1)
                + " to "
                + Rounded.of(correction.trueMps(), 1)
                + " m/s by "
                + correction.formula()
                + " at "
                + Rounded.of(correction.temperatureDegC(), 1)
                + " deg C ("
                + correction.temperatureSource()
                + "): velocities and depths x "
                + Rounded.of(correction.ratio(), 4)));
    if (correction.temperatureSource().equals(WaterTemperature.Source.CHECK.key())) {
      notes.add(
          new Note(
              Note.Level.NOTE,
              "temperature-by-check",
              "the record has no temperature: the speed of sound rests on the check alone"));
    }
    if (!covered) {
      notes.add(
          new Note(
              Note.Level.CAUTION,
              "sound-speed-range",
              correction.formula() + " is not meant for such water: choose another formula"));
    }
  }
}
