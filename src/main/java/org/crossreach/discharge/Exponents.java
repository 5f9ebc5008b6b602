package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.crossreach.profile.ExponentFit;
import org.crossreach.section.Section;
import org.crossreach.settings.Exponent;
import org.crossreach.survey.Note;

/**
 * The exponent of each laid pass by the rule that was chosen.
 *
 * @param passes in the order of the laid passes
 */
public record Exponents(List<Chosen> passes) {

  public Exponents {
    passes = List.copyOf(passes);
  }

  /**
   * The exponent of one pass.
   *
   * @param value the exponent in use
   * @param fit what was fitted, empty when the exponent is fixed or the data could not tell it
   * @param notes why a fit was not taken
   */
  public record Chosen(double value, Optional<ExponentFit> fit, List<Note> notes) {

    static Chosen fixed(double value) {
      return new Chosen(value, Optional.empty(), List.of());
    }

    private static Chosen of(ExponentFit fit, double fallback) {
      if (fit.refusal().isEmpty()) {
        return new Chosen(fit.value(), Optional.of(fit), List.of());
      }
      Note note =
          new Note(
              Note.Level.CAUTION,
              "exponent-not-fitted",
              "the exponent could not be fitted and stays at "
                  + Math.round(1e4 * fallback) / 1e4
                  + ": "
                  + fit.refusal().get());
      return new Chosen(fallback, Optional.empty(), List.of(note));
    }
  }

  /**
   * Finds the exponents.
   *
   * @param laid the passes on their lines; unused ones do not count in a fit to all
   * @param exponent the rule, and the value that is fixed or stands in for a fit
   * @param threads how many passes are fitted side by side
   */
  public static Exponents of(LaidMeasurement laid, Exponent exponent, int threads) {
    int count = laid.passes().size();
    return switch (exponent.rule()) {
      case FIXED -> new Exponents(Collections.nCopies(count, Chosen.fixed(exponent.value())));
      case FIT_PASS ->
          new Exponents(
              Workers.map(
                  laid.passes(),
                  threads,
                  each -> Chosen.of(ExponentFit.of(List.of(each.section())), exponent.value())));
      case FIT_ALL -> {
        List<Section> used = new ArrayList<>();
        for (LaidPass each : laid.passes()) {
          if (each.pass().used()) {
            used.add(each.section());
          }
        }
        yield new Exponents(
            Collections.nCopies(count, Chosen.of(ExponentFit.of(used), exponent.value())));
      }
    };
  }
}
