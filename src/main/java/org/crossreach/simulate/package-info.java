/**
 * Virtual rivers whose discharge is known exactly.
 *
 * <p>Comes in: a recipe. Goes out: a measurement as an instrument would have recorded it, and the
 * truth beside it. Start at {@link org.crossreach.simulate.Simulation}. Called by {@code cli} and
 * by tests.
 */
package org.crossreach.simulate;
