package org.crossreach.evidence;

import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.profile.ExponentFit;

/**
 * Every combination of laws and exponent rule for one measurement, and the evidence.
 *
 * @param chosen the result by the chosen settings
 * @param combinations what each combination makes of it
 * @param exponent the exponent fitted to all used passes
 * @param columns number of columns with hidden cells in the used passes
 * @param top evidence near the surface, of all used passes
 * @param bottom evidence near the bed, of all used passes
 * @param passes what each pass alone says
 * @param verdict what to do
 */
public record Comparison(
    Result chosen,
    List<CombinationResult> combinations,
    ExponentFit exponent,
    int columns,
    ZoneEvidence top,
    ZoneEvidence bottom,
    List<PassEvidence> passes,
    Verdict verdict) {

  /**
   * What cannot be told apart counts as one when the discharges differ by no more than this (%).
   */
  static final double SAME_PCT = 0.5;

  /** With fewer columns that can hide cells nothing is said. */
  static final int FEWEST_COLUMNS = 30;

  public Comparison {
    combinations = List.copyOf(combinations);
    passes = List.copyOf(passes);
  }

  /** The combination that the settings have chosen. */
  public Combination chosenCombination() {
    return Combination.of(chosen.reduction().settings());
  }

  /** What a combination makes of the measurement. */
  public CombinationResult of(Combination combination) {
    return combinations.stream()
        .filter(each -> each.combination().equals(combination))
        .findFirst()
        .orElseThrow();
  }

  /** The evidence on the law of a combination near the surface. */
  public CandidateEvidence evidenceAtTop(Combination combination) {
    return top.on(combination.atTop());
  }

  /** The evidence on the law of a combination near the bed. */
  public CandidateEvidence evidenceAtBottom(Combination combination) {
    return bottom.on(combination.atBottom());
  }
}
