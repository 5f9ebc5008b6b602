/**
 * What people and machines read: the console's table, JSON, CSV, charts and PDF.
 *
 * <p>Comes in: a reduction with its agreement. Goes out: text and files; nothing is computed here
 * but the conversion to the reader's {@link org.crossreach.report.Units}. Start at {@link
 * org.crossreach.report.ProgramVersion} for what every result names. Only {@code archive} and
 * {@code cli} may use this package.
 */
package org.crossreach.report;
