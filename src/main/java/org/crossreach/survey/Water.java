package org.crossreach.survey;

/**
 * Independent readings of the water at the site.
 *
 * @param temperatureCheckDegC water temperature by an independent thermometer (deg C), NaN when not
 *     read
 * @param salinityPpt salinity (parts per thousand), 0 for fresh water
 */
public record Water(double temperatureCheckDegC, double salinityPpt) {}
