/**
 * The vertical: laws of velocity near the surface and the bed, and the transport of each column.
 *
 * <p>Comes in: a section. Goes out: {@link org.crossreach.profile.Transports}, what flows through
 * each column per unit width. Start at {@link org.crossreach.profile.Laws}. Called by {@code
 * discharge} and what follows it.
 */
package org.crossreach.profile;
