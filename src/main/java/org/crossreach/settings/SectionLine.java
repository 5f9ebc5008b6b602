package org.crossreach.settings;

/**
 * Which straight line the velocities are projected on.
 *
 * @param kind how the line is found
 * @param azimuthDeg azimuth of the line clockwise from true north (deg), either way along it; NaN
 *     unless the kind is {@link Kind#AZIMUTH}
 */
public record SectionLine(Kind kind, double azimuthDeg) {

  /** How the line is found. */
  public enum Kind {
    /** Each pass's own line from its start to its end. */
    EACH_PASS,
    /** One direction for all passes: that of the sum of their lines. */
    COMMON,
    /** A given azimuth. */
    AZIMUTH
  }

  public static final SectionLine EACH_PASS = new SectionLine(Kind.EACH_PASS, Double.NaN);
  public static final SectionLine COMMON = new SectionLine(Kind.COMMON, Double.NaN);

  public SectionLine {
    if ((kind == Kind.AZIMUTH) == Double.isNaN(azimuthDeg)) {
      throw new IllegalArgumentException("azimuthDeg belongs to AZIMUTH and to nothing else");
    }
  }

  /** The line with a given azimuth (deg clockwise from true north). */
  public static SectionLine ofAzimuth(double azimuthDeg) {
    return new SectionLine(Kind.AZIMUTH, azimuthDeg);
  }
}
