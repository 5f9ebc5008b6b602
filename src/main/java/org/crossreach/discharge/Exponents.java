package org.crossreach.discharge;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.crossreach.profile.ColumnFit;
import org.crossreach.profile.ExponentFit;
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
   * @param threads how many passes are laid out side by side
   */
  public static Exponents of(LaidMeasurement laid, Exponent exponent, int threads) {
    return switch (exponent.rule()) {
      case FIXED -> fixed(laid, exponent.value());
      case FIT_PASS -> fitted(passFits(columns(laid, threads), threads), exponent.value());
      case FIT_ALL ->
          fitted(
              Collections.nCopies(laid.passes().size(), fitToAll(laid, columns(laid, threads))),
              exponent.value());
    };
  }

  /** The columns of each laid pass, laid out for fitting. */
  public static List<ColumnFit> columns(LaidMeasurement laid, int threads) {
    return Workers.map(laid.passes(), threads, each -> ColumnFit.of(each.section()));
  }

  /** A fit to each pass alone. */
  public static List<ExponentFit> passFits(List<ColumnFit> columns, int threads) {
    return Workers.map(columns, threads, each -> ExponentFit.of(List.of(each)));
  }

  /** A fit to all used passes together. */
  public static ExponentFit fitToAll(LaidMeasurement laid, List<ColumnFit> columns) {
    return ExponentFit.of(
        IntStream.range(0, columns.size())
            .filter(p -> laid.passes().get(p).pass().used())
            .mapToObj(columns::get)
            .toList());
  }

  /** One exponent for each laid pass. */
  public static Exponents fixed(LaidMeasurement laid, double value) {
    return new Exponents(Collections.nCopies(laid.passes().size(), Chosen.fixed(value)));
  }

  /**
   * The fitted exponents, where the data could tell them.
   *
   * @param fits the fit for each laid pass
   * @param fallback what stands in for a fit that the data could not tell
   */
  public static Exponents fitted(List<ExponentFit> fits, double fallback) {
    return new Exponents(fits.stream().map(each -> Chosen.of(each, fallback)).toList());
  }
}
