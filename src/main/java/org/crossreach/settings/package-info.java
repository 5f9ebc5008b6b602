/**
 * The choices by which a measurement is reduced, with their defaults and ranges.
 *
 * <p>Comes in: what {@code settings.json} and the command line say. Goes out: one immutable {@link
 * org.crossreach.settings.Settings}, written into every result. Start at {@link
 * org.crossreach.settings.Settings#defaults()}. Every package may use this one; it knows no other.
 */
package org.crossreach.settings;
