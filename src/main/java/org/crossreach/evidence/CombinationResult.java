package org.crossreach.evidence;

import org.crossreach.agreement.Spread;
import org.crossreach.discharge.Reduction;

/**
 * What a combination makes of the measurement.
 *
 * @param combination laws and rule
 * @param reduction the passes by this combination
 * @param dischargeM3s spread of the used passes' discharges (m³/s)
 * @param changePct its mean discharge minus that of the chosen settings, in percent of the latter
 * @param topPct share of the zone near the surface in the mean discharge (%)
 * @param bottomPct share of the zone near the bed in the mean discharge (%)
 * @param expectedErrorPct error to be expected in the discharge by the hidden cells: the sizes of
 *     the two zones' biases, weighted with the zones' shares (%); NaN without evidence
 */
public record CombinationResult(
    Combination combination,
    Reduction reduction,
    Spread dischargeM3s,
    double changePct,
    double topPct,
    double bottomPct,
    double expectedErrorPct) {}
