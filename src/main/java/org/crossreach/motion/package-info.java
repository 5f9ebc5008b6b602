/**
 * The boat's velocity over the bed and its track.
 *
 * <p>Comes in: a screened pass. Goes out: a {@link org.crossreach.motion.Track} without gaps. Start
 * at {@link org.crossreach.motion.Track#of}. Called by {@code section}.
 */
package org.crossreach.motion;
