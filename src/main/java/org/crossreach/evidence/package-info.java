/**
 * Evidence for the choice of extrapolation: what the laws predict for cells that were measured, and
 * what every choice makes of the discharge.
 *
 * <p>Comes in: a measurement whose passes are laid on their lines, and the chosen settings. Goes
 * out: a {@link org.crossreach.evidence.Comparison}. Start at {@link
 * org.crossreach.evidence.Comparison#of}. Called by {@code report} and {@code cli}.
 */
package org.crossreach.evidence;
