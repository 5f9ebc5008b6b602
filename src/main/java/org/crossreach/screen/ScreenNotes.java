package org.crossreach.screen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.settings.Exclusion;
import org.crossreach.survey.Note;

/** What a person should look at in the screened samples of a pass. */
final class ScreenNotes {

  /** Tilt of the instrument from which on a note is given (deg). At 5 deg 1 - cos is 0.4 %. */
  private static final double TILT_DEG = 5;

  /** Share of the ensembles that must tilt so far for the note (%). */
  private static final double TILTED_PCT = 5;

  /** Share of three-beam solutions from which on a note is given (%). */
  private static final double THREE_BEAM_PCT = 5;

  /** Share of ensembles without something from which on it is a caution (%, common practice). */
  private static final double LOST_PCT = 10;

  /** Length of a run without something from which on it is a caution (s, common practice). */
  private static final double LOST_RUN_S = 10;

  /** Offset of the error velocity from which on a beam may be steadily off (m/s). */
  private static final double ERROR_OFFSET_MPS = 0.1;

  private final List<Note> notes;

  /**
   * Starts with the notes on the speed of sound.
   *
   * @param first notes that come first
   */
  ScreenNotes(List<Note> first) {
    notes = new ArrayList<>(first);
  }

  List<Note> all() {
    return notes;
  }

  private void note(Note.Level level, String code, String text) {
    notes.add(new Note(level, code, text));
  }

  void attitude(Attitude attitude, int size) {
    if (attitude.headingsFilled() > 0) {
      note(
          Note.Level.CAUTION,
          "heading-filled",
          attitude.headingsFilled()
              + " of "
              + size
              + " ensembles have no heading: taken from their neighbours");
    }
    if (attitude.tilts() && !attitude.tiltKnown()) {
      note(
          Note.Level.CAUTION,
          "tilt-unknown",
          "the record has no pitch or no roll: the boat is taken as level");
    }
    double largest = 0;
    int tilted = 0;
    for (int i = 0; i < size; i++) {
      double tilt = attitude.tiltDeg(i);
      tilted += tilt > TILT_DEG ? 1 : 0;
      largest = Math.max(largest, Double.isNaN(tilt) ? 0 : tilt);
    }
    if (tilted > TILTED_PCT / 100 * size) {
      note(
          Note.Level.NOTE,
          "tilt",
          percent(tilted, size)
              + " of the ensembles tilt by more than "
              + Rounded.of(TILT_DEG, 0)
              + " deg, up to "
              + Rounded.of(largest, 1)
              + " deg: cells and depths are taken at their recorded heights");
    }
  }

  void exclusions(List<Exclusion> applied, int excludedEnsembles) {
    for (Exclusion each : applied) {
      note(
          Note.Level.NOTE,
          "excluded",
          "ensembles "
              + each.fromEnsemble()
              + " to "
              + each.toEnsemble()
              + " left out: "
              + each.reason());
    }
    if (!applied.isEmpty() && excludedEnsembles == 0) {
      note(
          Note.Level.CAUTION,
          "excluded-nothing",
          "the pass has no ensemble with a number that is to be left out");
    }
  }

  void beams(Accounting accounting, int unsoundBottomBeam) {
    if (accounting.unsoundBeam() > 0) {
      note(
          Note.Level.CAUTION,
          "unsound-beam",
          "beam "
              + accounting.unsoundBeam()
              + " measures no velocity of the water: left out, three beams are used");
    }
    if (unsoundBottomBeam > 0) {
      note(
          Note.Level.CAUTION,
          "unsound-beam",
          "beam "
              + unsoundBottomBeam
              + " measures no velocity of the bed: left out, three beams are used");
    }
    long used = accounting.cells().used();
    if (accounting.threeBeamCells() > THREE_BEAM_PCT / 100 * used) {
      note(
          Note.Level.NOTE,
          "three-beam",
          percent(accounting.threeBeamCells(), used)
              + " of the used cells rest on three beams and have no error velocity");
    }
    for (FoundLimit each : accounting.limits()) {
      if (each.criterion() == Criterion.ERROR_VELOCITY
          && Math.abs(each.centre()) > ERROR_OFFSET_MPS) {
        note(
            Note.Level.CAUTION,
            "error-velocity-offset",
            "the error velocity has a median of "
                + Rounded.of(each.centre(), 2)
                + " m/s: a beam may be blocked or its angle wrong");
      }
    }
  }

  void lost(Accounting accounting, long withoutWater) {
    int ensembles = accounting.ensembles();
    lost("lost-water", "no usable cell", withoutWater, ensembles, accounting.longestWithoutWater());
    lost(
        "lost-bottom-track",
        "no usable bottom track",
        accounting.bottomTrack().rejected(),
        ensembles,
        accounting.longestWithoutBottomTrack());
    if (accounting.depthsFilled() > LOST_PCT / 100 * ensembles) {
      note(
          Note.Level.CAUTION,
          "lost-depth",
          percent(accounting.depthsFilled(), ensembles)
              + " of the ensembles have no usable depth: filled in along the track");
    }
  }

  private void lost(String code, String what, long without, int ensembles, Optional<Run> longest) {
    if (longest.isEmpty()) {
      return;
    }
    Run run = longest.get();
    boolean caution = without > LOST_PCT / 100 * ensembles || run.durationS() > LOST_RUN_S;
    if (caution) {
      note(
          Note.Level.CAUTION,
          code,
          percent(without, ensembles)
              + " of the ensembles have "
              + what
              + "; the longest run takes "
              + Rounded.of(run.durationS(), 1)
              + " s, ensembles "
              + run.fromEnsemble()
              + " to "
              + run.toEnsemble());
    }
  }

  private static String percent(double part, double whole) {
    return Rounded.of(100 * part / whole, 1) + " %";
  }
}
