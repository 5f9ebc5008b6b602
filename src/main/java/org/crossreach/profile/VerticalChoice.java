package org.crossreach.profile;

import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;

/**
 * How the unmeasured water of a column is estimated.
 *
 * @param top law for the water near the surface
 * @param bottom law for the water near the bed
 * @param exponent exponent of the power law (1/6 → 0.1667)
 */
public record VerticalChoice(TopLaw top, BottomLaw bottom, double exponent) {}
