/**
 * What the measured cells say about the choice of laws and exponent for the unmeasured water.
 *
 * <p>Comes in: a measurement and its chosen settings. Goes out: a {@link
 * org.crossreach.evidence.Comparison} of every combination of laws and exponent rules, with the
 * errors each makes on hidden cells and a {@link org.crossreach.evidence.Verdict}. Start at {@link
 * org.crossreach.evidence.Comparer}. Called by {@code report} and what follows it.
 */
package org.crossreach.evidence;
