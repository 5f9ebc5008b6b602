/**
 * Decides which samples of a pass may be used, and keeps the reason for each that may not.
 *
 * <p>Comes in: recorded ensembles, the instrument, the water and the settings. Goes out: a {@link
 * org.crossreach.screen.ScreenedPass}, the same samples on true east and north and on the true
 * speed of sound, with one reason each and an {@link org.crossreach.screen.Accounting}; nothing is
 * deleted. Start at {@link org.crossreach.screen.Screen}. Called by {@code motion} and what follows
 * it.
 */
package org.crossreach.screen;
