package org.crossreach.survey;

/**
 * Where a measurement was made.
 *
 * @param name name of the site, may be empty
 * @param number number of the site in the owner's register, may be empty
 * @param river name of the river, may be empty
 * @param latitudeDeg latitude (deg, WGS 84, north positive), NaN when not recorded
 * @param longitudeDeg longitude (deg, WGS 84, east positive), NaN when not recorded
 */
public record Site(
    String name, String number, String river, double latitudeDeg, double longitudeDeg) {}
