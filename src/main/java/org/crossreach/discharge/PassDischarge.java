package org.crossreach.discharge;

import java.util.List;
import java.util.Optional;
import org.crossreach.profile.ExponentFit;
import org.crossreach.profile.Transports;
import org.crossreach.section.Section;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;

/**
 * Discharge of one pass and how it came about.
 *
 * @param pass what was recorded
 * @param columns discharge of every column, by the chosen method
 * @param exponent exponent of the power law that was used
 * @param fit how the exponent was fitted; empty when it is fixed or could not be fitted
 * @param zones discharge by zone, by the chosen method (m³/s)
 * @param otherMethodTotalM3s total discharge by the method that was not chosen (m³/s)
 * @param leftEdge the left edge's estimate
 * @param rightEdge the right edge's estimate
 * @param geometry width, area, directions, speeds and shares
 * @param notes what is to be said about the pass
 */
public record PassDischarge(
    Pass pass,
    ColumnDischarge columns,
    double exponent,
    Optional<ExponentFit> fit,
    ZoneDischarge zones,
    double otherMethodTotalM3s,
    EdgeEstimate leftEdge,
    EdgeEstimate rightEdge,
    PassGeometry geometry,
    List<Note> notes) {

  public PassDischarge {
    notes = List.copyOf(notes);
  }

  /** Total discharge (m³/s), positive downstream. */
  public double totalM3s() {
    return zones.total();
  }

  /** Total discharge over the area of the section (m/s). */
  public double meanVelocityMps() {
    return totalM3s() / geometry.areaM2();
  }

  /** The pass on its line. */
  public Section section() {
    return columns.section();
  }

  /** What flows through each column per unit width. */
  public Transports transports() {
    return columns.transports();
  }
}
