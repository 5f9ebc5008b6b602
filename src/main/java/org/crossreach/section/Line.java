package org.crossreach.section;

import org.crossreach.motion.Track;
import org.crossreach.survey.Bank;

/**
 * Direction of the section line as a horizontal unit vector from the left to the right bank, as
 * seen looking downstream.
 *
 * <p>The downstream normal is the same vector turned by 90 degrees counter-clockwise seen from
 * above: a line that runs east has its downstream normal to the north.
 *
 * @param east eastward part of the unit vector from left to right
 * @param north northward part of the unit vector from left to right
 */
public record Line(double east, double north) {

  /**
   * The straight line from the start of a track to its end.
   *
   * @param track a track with {@link Track#madeGoodM()} above 0
   * @param startBank bank from which the boat started
   */
  public static Line along(Track track, Bank startBank) {
    double sign = startBank == Bank.LEFT ? 1 : -1;
    int last = track.size() - 1;
    return ofVector(sign * track.eastM(last), sign * track.northM(last));
  }

  /**
   * The line in the direction of a horizontal vector of any length above 0.
   *
   * @throws IllegalArgumentException when the vector has no direction
   */
  public static Line ofVector(double east, double north) {
    double length = Math.hypot(east, north);
    if (!(length > 0)) {
      throw new IllegalArgumentException(
          "the vector (" + east + ", " + north + ") has no direction");
    }
    return new Line(east / length, north / length);
  }

  /**
   * The line at an azimuth clockwise from north (deg), taken the way round that is nearer to this
   * line.
   */
  public Line turnedTo(double azimuthDeg) {
    Line given =
        new Line(Math.sin(Math.toRadians(azimuthDeg)), Math.cos(Math.toRadians(azimuthDeg)));
    boolean same = along(given.east, given.north) >= 0;
    return same ? given : new Line(-given.east, -given.north);
  }

  /** Azimuth from left to right, clockwise from true north (deg, 0 to 360). */
  public double azimuthDeg() {
    return azimuthDeg(east, north);
  }

  /** Azimuth of a horizontal vector, clockwise from north (deg, 0 to 360). */
  public static double azimuthDeg(double east, double north) {
    double azimuth = Math.toDegrees(Math.atan2(east, north));
    return azimuth < 0 ? azimuth + 360 : azimuth;
  }

  /** Component of a vector along the line, positive from left to right, in the vector's unit. */
  public double along(double vectorEast, double vectorNorth) {
    return vectorEast * east + vectorNorth * north;
  }

  /** Component of a vector normal to the line, positive downstream, in the vector's unit. */
  public double normal(double vectorEast, double vectorNorth) {
    return vectorNorth * east - vectorEast * north;
  }
}
