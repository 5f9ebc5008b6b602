/**
 * The section across the river: the line, the depths and the velocities normal to the line.
 *
 * <p>Comes in: a track with its screened samples, and the line. Goes out: a {@link
 * org.crossreach.section.Section}, read column by column. Start at {@link
 * org.crossreach.section.Section#of}. Called by {@code profile} and what follows it.
 */
package org.crossreach.section;
