package org.crossreach.evidence;

import java.util.List;
import java.util.Locale;

/**
 * What the hidden cells say about one unmeasured zone.
 *
 * @param chosen how the chosen law predicts
 * @param best how the law that predicts best does
 * @param finding what follows
 */
public record Verdict(Prediction chosen, Prediction best, Finding finding) {

  /** A lead of fewer standard errors than this could be chance. */
  private static final double STANDARD_ERRORS = 2;

  /** A bias of the zone that is smaller by less than this (%) is not worth a change. */
  private static final double WORTHWHILE_PCT = 0.5;

  /**
   * Laws whose scores differ by less than this (%) count as equal; the one that comes first is
   * taken, so that one exponent for all passes goes before one for each.
   */
  private static final double CHANCE_PCT = 0.05;

  /** What follows from the predictions. */
  public enum Finding {
    /** The chosen law predicts best, or as well as any. */
    SUPPORTS,
    /** Another law predicts better, and not by chance. */
    FAVOURS_ANOTHER,
    /** Another law predicts better, but it may be chance. */
    CANNOT_TELL,
    /** No cells could be hidden. */
    NO_EVIDENCE
  }

  static Verdict of(Prediction chosen, List<Prediction> all) {
    if (chosen.blocks().size() < 4 || !Double.isFinite(chosen.score())) {
      return new Verdict(chosen, chosen, Finding.NO_EVIDENCE);
    }
    Prediction best = best(chosen, all);
    double gain = Math.abs(chosen.biasPct()) - Math.abs(best.biasPct());
    Finding finding =
        best == chosen || best.candidate().same(chosen.candidate()) || gain < WORTHWHILE_PCT
            ? Finding.SUPPORTS
            : best.leadOver(chosen) > STANDARD_ERRORS
                ? Finding.FAVOURS_ANOTHER
                : Finding.CANNOT_TELL;
    return new Verdict(chosen, best, finding);
  }

  /**
   * The law with the smallest score; of those whose lead over each other may be chance the one that
   * amplifies noise least.
   */
  private static Prediction best(Prediction chosen, List<Prediction> all) {
    Prediction least = chosen;
    for (Prediction each : all) {
      if (each.score() < least.score() - CHANCE_PCT) {
        least = each;
      }
    }
    Prediction best = least;
    for (Prediction each : all) {
      if (each.standardErrorPct() < best.standardErrorPct() - CHANCE_PCT
          && !(least.leadOver(each) > STANDARD_ERRORS)) {
        best = each;
      }
    }
    return best;
  }

  /** The finding as one sentence. */
  public String sentence() {
    String zone = chosen.candidate().zone().name().toLowerCase(Locale.ROOT);
    return switch (finding) {
      case SUPPORTS ->
          String.format(
              Locale.ROOT,
              "%s: the hidden cells support %s, with %s of their discharge",
              zone,
              chosen.candidate().label(),
              error(chosen));
      case FAVOURS_ANOTHER ->
          String.format(
              Locale.ROOT,
              "%s: the hidden cells favour %s, with %s of their discharge, over %s with %s",
              zone,
              best.candidate().label(),
              error(best),
              chosen.candidate().label(),
              error(chosen));
      case CANNOT_TELL ->
          String.format(
              Locale.ROOT,
              "%s: the hidden cells cannot tell %s (%s) from %s (%s)",
              zone,
              best.candidate().label(),
              error(best),
              chosen.candidate().label(),
              error(chosen));
      case NO_EVIDENCE -> zone + ": too few columns have cells to hide; there is no evidence";
    };
  }

  private static String error(Prediction prediction) {
    return String.format(
        Locale.ROOT,
        "a bias of %+.1f ± %.1f %%",
        prediction.biasPct(),
        prediction.standardErrorPct());
  }
}
