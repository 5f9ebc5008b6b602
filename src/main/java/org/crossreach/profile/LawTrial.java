package org.crossreach.profile;

/**
 * A law that is tried on cells that are hidden from it.
 *
 * @param zone {@link Zone#TOP} or {@link Zone#BOTTOM}
 * @param law the law
 * @param exponent exponent of the power law (1/6 → 0.1667)
 */
public record LawTrial(Zone zone, VelocityLaw law, double exponent) {}
