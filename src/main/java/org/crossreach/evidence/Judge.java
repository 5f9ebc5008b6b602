package org.crossreach.evidence;

import java.util.List;
import java.util.Locale;

/**
 * Holds the chosen combination against all others by the error that each is to be expected to make
 * in the discharge.
 *
 * @param resamples what every candidate errs on hidden cells
 * @param results what every combination makes of the measurement
 * @param top evidence near the surface
 * @param bottom evidence near the bed
 * @param chosen the combination of the settings
 */
record Judge(
    Resamples resamples,
    List<CombinationResult> results,
    ZoneEvidence top,
    ZoneEvidence bottom,
    Combination chosen) {

  /** An error of the discharge that is larger by no more than this (%) is no worse. */
  private static final double NEGLIGIBLE_PCT = 0.05;

  /** Error of the discharge (%) from the biases of the zones (%) and their shares (%). */
  static double error(double topBias, double topShare, double bottomBias, double bottomShare) {
    return (Math.abs(topBias) * topShare + Math.abs(bottomBias) * bottomShare) / 100;
  }

  Verdict verdict() {
    if (resamples.columns() < Comparison.FEWEST_COLUMNS) {
      return new Verdict(
          Verdict.Kind.CANNOT_TELL,
          chosen,
          0,
          "The cells cannot tell: only "
              + resamples.columns()
              + " columns have the seven usable cells that hiding some of them takes.");
    }
    Contest contest = contest();
    CombinationResult first = results.get(contest.first());
    double apart = apart(contest);
    boolean keeps = contest.equal().contains(index(chosen));
    if (apart > Comparison.SAME_PCT) {
      return cannotTell(contest, keeps, apart);
    }
    return keeps ? keep(contest) : change(first);
  }

  private Contest contest() {
    int n = results.size();
    double[] error = new double[n];
    double[] preference = new double[n];
    double[][] drawn = new double[Resamples.COUNT][n];
    for (int k = 0; k < n; k++) {
      CombinationResult each = results.get(k);
      int atTop = resamples.candidates().indexOf(each.combination().atTop());
      int atBottom = resamples.candidates().indexOf(each.combination().atBottom());
      error[k] = each.expectedErrorPct();
      for (int r = 0; r < drawn.length; r++) {
        drawn[r][k] =
            error(
                resamples.biasPct(atTop, r),
                each.topPct(),
                resamples.biasPct(atBottom, r),
                each.bottomPct());
      }
      // Among equals: the fewest changes, then the fewest exponents, then the steadiest.
      preference[k] =
          each.combination().changesFrom(chosen)
              + 1e-3 * Candidate.freedom(each.combination().rule())
              + 1e-6
                  * error(
                      resamples.scatterPct(atTop),
                      each.topPct(),
                      resamples.scatterPct(atBottom),
                      each.bottomPct());
    }
    return Contest.of(error, drawn, NEGLIGIBLE_PCT, preference);
  }

  private int index(Combination combination) {
    for (int k = 0; k < results.size(); k++) {
      if (results.get(k).combination().equals(combination)) {
        return k;
      }
    }
    throw new IllegalStateException("no result for " + combination);
  }

  /** How far the discharges of those that cannot be told apart lie apart (%). */
  private double apart(Contest contest) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (int k : contest.equal()) {
      least = Math.min(least, results.get(k).changePct());
      most = Math.max(most, results.get(k).changePct());
    }
    return most - least;
  }

  private Verdict cannotTell(Contest contest, boolean keeps, double apart) {
    int furthest = contest.first();
    for (int k : contest.equal()) {
      double change = results.get(k).changePct() - results.get(contest.first()).changePct();
      double most = results.get(furthest).changePct() - results.get(contest.first()).changePct();
      furthest = Math.abs(change) > Math.abs(most) ? k : furthest;
    }
    String sentence =
        "The cells cannot tell "
            + results.get(contest.first()).combination().text()
            + " from "
            + results.get(furthest).combination().text()
            + format(", which differ by %.1f %% of the discharge", apart)
            + (keeps ? "" : "; the chosen " + chosen.text() + " fits worse than either")
            + ".";
    return new Verdict(Verdict.Kind.CANNOT_TELL, chosen, 0, sentence);
  }

  private Verdict keep(Contest contest) {
    String reason =
        contest.equals() == 1
            ? "no other combination predicts the hidden cells as well"
            : format(
                "nothing predicts the hidden cells better, and the %d combinations that do so as"
                    + " well agree within %.1f %%",
                contest.equals(), apart(contest));
    return new Verdict(
        Verdict.Kind.KEEP,
        chosen,
        0,
        "Keep " + chosen.text() + ": " + reason + " (" + biases(chosen) + ").");
  }

  private Verdict change(CombinationResult first) {
    Combination better = first.combination();
    return new Verdict(
        Verdict.Kind.CHANGE,
        better,
        first.changePct(),
        "The cells favour "
            + better.text()
            + ": it misses hidden cells by "
            + biases(better)
            + ", the chosen "
            + chosen.text()
            + " by "
            + biases(chosen)
            + format("; it would change the discharge by %+.1f %%.", first.changePct()));
  }

  private String biases(Combination combination) {
    return bias(top.on(combination.atTop()))
        + " of the zone at the top and "
        + bias(bottom.on(combination.atBottom()))
        + " at the bottom";
  }

  private static String bias(CandidateEvidence evidence) {
    return format("%+.1f ± %.1f %%", evidence.biasPct(), evidence.half95Pct());
  }

  private static String format(String pattern, Object... values) {
    return String.format(Locale.ROOT, pattern, values);
  }
}
