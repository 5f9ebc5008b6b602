/**
 * Pages that are kept: one PDF for a pass, one for a measurement.
 *
 * <p>Comes in: a result, one of its passes, and options. Goes out: a PDF/A that an archive can keep
 * and a screen reader can read. Start at {@link org.crossreach.report.pdf.TransectPdf} and {@link
 * org.crossreach.report.pdf.MeasurementPdf}; each is a list of sections. Called by {@code archive}
 * and {@code cli}.
 */
package org.crossreach.report.pdf;
