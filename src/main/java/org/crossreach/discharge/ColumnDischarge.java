package org.crossreach.discharge;

import org.crossreach.profile.Transports;
import org.crossreach.profile.Zone;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.settings.Method;

/**
 * Discharge through the column of one ensemble (m³/s), positive downstream, by a method.
 *
 * <p>Multiplied out over the boat's displacement, not its velocity: the sum over all ensembles is
 * the discharge between the first and the last one.
 *
 * @param section the pass on its line
 * @param transports what flows through each column per unit width
 * @param method how velocity and displacement are combined
 */
public record ColumnDischarge(Section section, Transports transports, Method method) {

  /** Discharge through one zone of a column (m³/s). */
  public double of(Zone zone, int ensemble) {
    return combined(
        transports.zone(zone, Component.NORMAL, ensemble),
        transports.zone(zone, Component.ALONG, ensemble),
        ensemble);
  }

  /** The part of the measured zone's discharge that flows through filled gaps (m³/s). */
  public double ofGaps(int ensemble) {
    return combined(
        transports.gaps(Component.NORMAL, ensemble),
        transports.gaps(Component.ALONG, ensemble),
        ensemble);
  }

  /** Discharge through the whole column (m³/s). */
  public double total(int ensemble) {
    return of(Zone.TOP, ensemble) + of(Zone.MEASURED, ensemble) + of(Zone.BOTTOM, ensemble);
  }

  /** Discharge through one zone of all columns (m³/s). */
  public double sum(Zone zone) {
    double sum = 0;
    for (int i = 0; i < section.size(); i++) {
      sum += of(zone, i);
    }
    return sum;
  }

  private double combined(double normal, double along, int ensemble) {
    return switch (method) {
      case SECTION_NORMAL -> normal * section.progressM(ensemble);
      case PATH_FLUX -> normal * section.progressM(ensemble) - along * section.sidewaysM(ensemble);
    };
  }
}
