package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.profile.Zone;

/**
 * What the hidden cells say about one unmeasured zone.
 *
 * @param zone {@link Zone#TOP} or {@link Zone#BOTTOM}
 * @param ranked the candidates from the best to the worst; those that cannot be told from the best
 *     stand first, the steadiest one at their head
 * @param law the law that the evidence favours; empty when it cannot tell
 */
public record ZoneEvidence(Zone zone, List<CandidateEvidence> ranked, Optional<String> law) {

  /** A bias that is larger by no more than this (% of the zone) is no worse. */
  private static final double NEGLIGIBLE_PCT = 0.2;

  public ZoneEvidence {
    ranked = List.copyOf(ranked);
  }

  /** The evidence on a candidate. */
  public CandidateEvidence on(Candidate candidate) {
    return ranked.stream()
        .filter(each -> each.candidate().equals(candidate))
        .findFirst()
        .orElseThrow();
  }

  /**
   * Ranks the candidates of a zone.
   *
   * @param resamples what every candidate errs
   * @param sharePct share of the zone in the whole discharge (%)
   */
  static ZoneEvidence of(Zone zone, Resamples resamples, double sharePct) {
    List<Integer> members = new ArrayList<>();
    for (int t = 0; t < resamples.candidates().size(); t++) {
      if (resamples.candidates().get(t).zone() == zone) {
        members.add(t);
      }
    }
    int n = members.size();
    double[] error = new double[n];
    double[] scatter = new double[n];
    double[][] drawn = new double[Resamples.COUNT][n];
    for (int k = 0; k < n; k++) {
      error[k] = Math.abs(resamples.biasPct(members.get(k)));
      // Of one law, the exponent that is least free.
      scatter[k] =
          resamples.scatterPct(members.get(k))
              * (1 + 1e-3 * resamples.candidates().get(members.get(k)).freedom());
      for (int r = 0; r < Resamples.COUNT; r++) {
        drawn[r][k] = Math.abs(resamples.biasPct(members.get(k), r));
      }
    }
    Contest contest = Contest.of(error, drawn, NEGLIGIBLE_PCT, scatter);
    List<CandidateEvidence> ranked = new ArrayList<>();
    for (int k : contest.order()) {
      int t = members.get(k);
      ranked.add(
          new CandidateEvidence(
              resamples.candidates().get(t),
              resamples.biasPct(t),
              resamples.half95Pct(t),
              resamples.scatterPct(t),
              contest.equal().contains(k)));
    }
    boolean told = resamples.columns() >= Comparison.FEWEST_COLUMNS;
    String law = ranked.get(0).candidate().law();
    for (int k : contest.equal()) {
      int t = members.get(k);
      told &=
          resamples.candidates().get(t).law().equals(law)
              || difference(resamples, members.get(contest.first()), t) * sharePct / 100
                  <= Comparison.SAME_PCT;
    }
    return new ZoneEvidence(zone, ranked, told ? Optional.of(law) : Optional.empty());
  }

  /** How far two predictions may lie apart (% of the zone), with 95 % certainty. */
  private static double difference(Resamples resamples, int one, int other) {
    double[] apart = new double[Resamples.COUNT];
    for (int r = 0; r < apart.length; r++) {
      apart[r] = Math.abs(resamples.biasPct(one, r) - resamples.biasPct(other, r));
    }
    return Contest.most(apart);
  }
}
