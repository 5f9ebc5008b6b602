package org.crossreach.evidence;

/**
 * How a candidate predicts the hidden cells of one zone, in percent of what was measured there.
 *
 * @param candidate the law and its rule
 * @param biasPct prediction minus measurement over all columns (%); positive when the flow would be
 *     made too strong
 * @param half95Pct half-width of the bias's 95 % interval from resampled blocks of columns (%)
 * @param scatterPct standard deviation of a single column about the bias (%)
 * @param equal whether the evidence cannot tell it from the best
 */
public record CandidateEvidence(
    Candidate candidate, double biasPct, double half95Pct, double scatterPct, boolean equal) {}
