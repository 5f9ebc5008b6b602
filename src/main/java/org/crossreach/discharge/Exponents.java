package org.crossreach.discharge;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.crossreach.profile.ColumnFit;
import org.crossreach.profile.ExponentFit;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
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
   * @param threads how many passes are laid out side by side
   */
  public static Exponents of(LaidMeasurement laid, Exponent exponent, int threads) {
    return exponent.rule() == ExponentRule.FIXED
        ? fixed(laid, exponent)
        : of(laid, exponent, columns(laid, threads));
  }

  /** The columns of each laid pass, laid out for fitting. */
  public static List<ColumnFit> columns(LaidMeasurement laid, int threads) {
    return Workers.map(laid.passes(), threads, each -> ColumnFit.of(each.section()));
  }

  /**
   * Finds the exponents from columns that are laid out already.
   *
   * @param laid as for the other method
   * @param exponent as for the other method
   * @param columns the columns of each laid pass
   */
  public static Exponents of(LaidMeasurement laid, Exponent exponent, List<ColumnFit> columns) {
    return switch (exponent.rule()) {
      case FIXED -> fixed(laid, exponent);
      case FIT_PASS ->
          new Exponents(
              columns.stream()
                  .map(each -> Chosen.of(ExponentFit.of(List.of(each)), exponent.value()))
                  .toList());
      case FIT_ALL -> {
        List<ColumnFit> used =
            IntStream.range(0, columns.size())
                .filter(p -> laid.passes().get(p).pass().used())
                .mapToObj(columns::get)
                .toList();
        yield new Exponents(
            Collections.nCopies(columns.size(), Chosen.of(ExponentFit.of(used), exponent.value())));
      }
    };
  }

  private static Exponents fixed(LaidMeasurement laid, Exponent exponent) {
    return new Exponents(Collections.nCopies(laid.passes().size(), Chosen.fixed(exponent.value())));
  }
}
