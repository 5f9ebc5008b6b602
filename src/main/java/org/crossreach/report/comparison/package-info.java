/**
 * A comparison of extrapolation choices for people and machines.
 *
 * <p>Comes in: a comparison. Goes out: the console's table, JSON and CSV. Start at {@link
 * org.crossreach.report.comparison.ComparisonText}. Called by {@code cli}.
 */
package org.crossreach.report.comparison;
