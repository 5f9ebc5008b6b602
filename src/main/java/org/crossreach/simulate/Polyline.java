package org.crossreach.simulate;

import java.util.List;

/** A quantity by station as straight pieces; two points at one station make a step. */
public final class Polyline {

  private final double[] station;
  private final double[] value;

  /**
   * A point of the line.
   *
   * @param stationM distance from the left end of the section (m)
   * @param value the quantity there
   */
  public record Point(double stationM, double value) {}

  /**
   * Joins points.
   *
   * @param points at least two, stations not decreasing
   */
  public Polyline(List<Point> points) {
    station = points.stream().mapToDouble(Point::stationM).toArray();
    value = points.stream().mapToDouble(Point::value).toArray();
    if (station.length < 2) {
      throw new IllegalArgumentException("points must be at least two, not " + station.length);
    }
    for (int i = 1; i < station.length; i++) {
      if (!(station[i] >= station[i - 1])) {
        throw new IllegalArgumentException(
            "stations must not decrease, as " + station[i] + " does");
      }
    }
  }

  /** First station (m). */
  public double firstM() {
    return station[0];
  }

  /** Last station (m). */
  public double lastM() {
    return station[station.length - 1];
  }

  /** The stations of all points (m). */
  public double[] stationsM() {
    return station.clone();
  }

  /** The quantity at a station; before the first and after the last point that of the point. */
  public double at(double stationM) {
    if (stationM <= station[0]) {
      return value[0];
    }
    for (int i = 1; i < station.length; i++) {
      if (stationM < station[i]) {
        double share = (stationM - station[i - 1]) / (station[i] - station[i - 1]);
        return value[i - 1] + share * (value[i] - value[i - 1]);
      }
    }
    return value[value.length - 1];
  }
}
