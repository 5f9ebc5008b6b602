/**
 * The recorded facts of one measurement: site, instrument, passes, edges and the ensembles.
 *
 * <p>Comes in: what the importers read. Goes out: immutable records, and the ensembles as primitive
 * columns in SI units with NaN for a missing value. Start at {@link
 * org.crossreach.survey.Measurement}. Every package may use this one; it knows no other.
 */
package org.crossreach.survey;
