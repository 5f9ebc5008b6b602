/**
 * Pictures of a result.
 *
 * <p>Comes in: a result, one of its passes, and the reader's units. Goes out: {@linkplain
 * org.crossreach.report.chart.Picture pictures} that draw themselves into a PDF, a PNG or an SVG.
 * Start at {@link org.crossreach.report.chart.Charts}, the list of them all. Called by {@code
 * report.pdf}, {@code archive} and {@code cli}.
 */
package org.crossreach.report.chart;
