/**
 * Discharge of each pass, and the reduction of a whole measurement.
 *
 * <p>Comes in: a measurement and its settings. Goes out: a {@link
 * org.crossreach.discharge.Reduction} with one {@link org.crossreach.discharge.PassDischarge} for
 * each pass. Start at {@link org.crossreach.discharge.Reducer}. Called by {@code agreement} and
 * what follows it.
 */
package org.crossreach.discharge;
