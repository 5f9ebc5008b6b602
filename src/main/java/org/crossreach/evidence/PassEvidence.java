package org.crossreach.evidence;

import org.crossreach.profile.ExponentFit;

/**
 * What one pass alone says.
 *
 * @param pass its name
 * @param used whether it counts in the measurement
 * @param exponent the exponent fitted to it
 * @param columns number of its columns with hidden cells
 * @param top evidence near the surface
 * @param bottom evidence near the bed
 */
public record PassEvidence(
    String pass,
    boolean used,
    ExponentFit exponent,
    int columns,
    ZoneEvidence top,
    ZoneEvidence bottom) {}
