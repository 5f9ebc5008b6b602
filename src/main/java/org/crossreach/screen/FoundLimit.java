package org.crossreach.screen;

import org.crossreach.settings.Limit;

/**
 * The limit by which a screen judged a pass.
 *
 * @param criterion which screen
 * @param kind whether the limit was found in the pass or given; never {@link Limit.Kind#OFF}
 * @param centre median that departures are counted from, NaN where the limit is a lowest value or
 *     departures are counted from neighbours
 * @param value the limit in the criterion's unit; NaN when the record holds nothing to judge by
 */
public record FoundLimit(Criterion criterion, Limit.Kind kind, double centre, double value) {}
