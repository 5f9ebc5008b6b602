package org.crossreach.agreement;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.survey.Note;

/** What a person should look at before the passes are averaged. */
final class AgreementNotes {

  /**
   * Fewest passes of steady flow, in reciprocal pairs. Source: Oberg, Morlock and Caldwell 2005,
   * USGS Scientific Investigations Report 2005-5183.
   */
  private static final int FEWEST_PASSES = 4;

  /**
   * Largest departure of a pass from the mean (%). Source: Oberg, Morlock and Caldwell 2005, USGS
   * Scientific Investigations Report 2005-5183 (from memory).
   */
  private static final double LARGEST_DEPARTURE_PCT = 5;

  /**
   * Shortest exposure in steady flow (s). Source: USGS Office of Surface Water Technical Memorandum
   * 2011.08 (from memory).
   */
  private static final double SHORTEST_EXPOSURE_S = 720;

  private AgreementNotes() {}

  static List<Note> of(Summary summary, List<PassDischarge> passes) {
    List<Note> notes = new ArrayList<>();
    if (summary.passesUsed() < FEWEST_PASSES) {
      add(
          notes,
          "few-passes",
          summary.passesUsed() + " used, " + FEWEST_PASSES + " are usual in steady flow");
    }
    if (summary.directions().leftToRight() != summary.directions().rightToLeft()) {
      add(
          notes,
          "unpaired-passes",
          summary.directions().leftToRight()
              + " from the left bank and "
              + summary.directions().rightToLeft()
              + " from the right: a bias by direction does not cancel");
    }
    if (summary.exposureS() < SHORTEST_EXPOSURE_S) {
      add(
          notes,
          "short-exposure",
          Math.round(summary.exposureS())
              + " s in all, "
              + Math.round(SHORTEST_EXPOSURE_S)
              + " s are usual in steady flow");
    }
    addDepartures(summary, passes, notes);
    return notes;
  }

  private static void addDepartures(Summary summary, List<PassDischarge> passes, List<Note> notes) {
    List<String> departing = new ArrayList<>();
    for (PassDischarge each : passes) {
      double departure = summary.dischargeM3s().deviationPct(each.totalM3s());
      if (Math.abs(departure) > LARGEST_DEPARTURE_PCT) {
        departing.add(String.format(Locale.ROOT, "%s (%+.1f %%)", each.pass().name(), departure));
      }
    }
    if (!departing.isEmpty()) {
      add(
          notes,
          "departing-passes",
          String.format(
              Locale.ROOT,
              "%d of %d passes depart by more than %.0f %% from the mean: %s",
              departing.size(),
              passes.size(),
              LARGEST_DEPARTURE_PCT,
              String.join(", ", departing)));
    }
  }

  private static void add(List<Note> notes, String code, String text) {
    notes.add(new Note(Note.Level.CAUTION, code, text));
  }
}
