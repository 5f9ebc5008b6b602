package org.crossreach.discharge;

import org.crossreach.profile.Transports;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.survey.Edge;

/**
 * Discharge of the unmeasured water beside a bank, {@code Q = C V d L}.
 *
 * @param dischargeM3s discharge, positive downstream (m³/s)
 * @param areaM2 area of the edge in the section (m²)
 * @param velocityMps V, depth-mean normal velocity beside the edge (m/s)
 * @param depthM d, depth beside the edge (m)
 * @param ensembles number of ensembles over which velocity and depth are averaged
 */
public record EdgeEstimate(
    double dischargeM3s, double areaM2, double velocityMps, double depthM, int ensembles) {

  /**
   * Estimates the edge at one end of a pass from the usable ensembles nearest to it.
   *
   * @param edge distance and coefficient, or the discharge itself
   * @param atStart whether the edge lies where the pass began
   * @param section the pass on its line
   * @param transports at least one column with usable cells of its own
   * @param wanted number of ensembles to average over; all there are when there are fewer
   */
  static EdgeEstimate of(
      Edge edge, boolean atStart, Section section, Transports transports, int wanted) {
    double velocity = 0;
    double depth = 0;
    int count = 0;
    int step = atStart ? 1 : -1;
    for (int i = atStart ? 0 : section.size() - 1;
        i >= 0 && i < section.size() && count < wanted;
        i += step) {
      if (transports.own(i)) {
        velocity += transports.total(Component.NORMAL, i) / section.depthM(i);
        depth += section.depthM(i);
        count++;
      }
    }
    velocity /= count;
    depth /= count;
    double discharge =
        Double.isNaN(edge.dischargeM3s())
            ? edge.coefficient() * velocity * depth * edge.distanceM()
            : edge.dischargeM3s();
    double area = shapeFactor(edge) * depth * edge.distanceM();
    return new EdgeEstimate(discharge, area, velocity, depth, count);
  }

  /**
   * Area of the edge over depth times distance: one half for a triangle, 1 at a wall, between them
   * linear in the coefficient, and one half where only the discharge was given.
   */
  private static double shapeFactor(Edge edge) {
    if (Double.isNaN(edge.coefficient())) {
      return 0.5;
    }
    double share = (edge.coefficient() - Edge.SLOPING) / (Edge.WALL - Edge.SLOPING);
    return 0.5 + 0.5 * Math.max(0, Math.min(1, share));
  }
}
