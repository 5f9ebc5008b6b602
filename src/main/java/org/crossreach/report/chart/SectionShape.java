package org.crossreach.report.chart;

import org.crossreach.discharge.EdgeEstimate;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.section.Section;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;

/**
 * Where the ensembles of a pass stand along the section (m from the left bank).
 *
 * <p>Each ensemble covers the way that the boat came along the line during it. Where the boat went
 * back, two ensembles cover the same place.
 */
final class SectionShape {

  private final PassDischarge pass;
  private final Section section;
  private final double widthM;

  SectionShape(PassDischarge pass) {
    this.pass = pass;
    this.section = pass.section();
    this.widthM = pass.geometry().widthM();
  }

  /** Number of ensembles. */
  int size() {
    return section.size();
  }

  Section section() {
    return section;
  }

  /** Width from bank to bank (m). */
  double widthM() {
    return widthM;
  }

  /** Distance of the boat from the left bank at the end of an ensemble (m). */
  double stationM(int ensemble) {
    return section.startBank() == Bank.LEFT
        ? pass.pass().leftEdge().distanceM() + section.distanceM(ensemble)
        : widthM - pass.pass().rightEdge().distanceM() - section.distanceM(ensemble);
  }

  /** The end nearer to the left bank of what an ensemble covers (m). */
  double fromM(int ensemble) {
    return Math.min(stationM(Math.max(0, ensemble - 1)), stationM(ensemble));
  }

  /** The end nearer to the right bank of what an ensemble covers (m). */
  double toM(int ensemble) {
    return Math.max(stationM(Math.max(0, ensemble - 1)), stationM(ensemble));
  }

  /** Station of the measured water's end at the left edge (m). */
  double leftEndM() {
    return pass.pass().leftEdge().distanceM();
  }

  /** Station of the measured water's end at the right edge (m). */
  double rightEndM() {
    return widthM - pass.pass().rightEdge().distanceM();
  }

  /**
   * Depth at the left bank itself over that beside the edge: 0 where the edge slopes to nothing, 1
   * at a wall.
   */
  double leftBankShare() {
    return bankShare(pass.pass().leftEdge(), pass.leftEdge());
  }

  /** As {@link #leftBankShare}, at the right bank. */
  double rightBankShare() {
    return bankShare(pass.pass().rightEdge(), pass.rightEdge());
  }

  /** The share with which a straight bed gives the edge's area. */
  private static double bankShare(Edge edge, EdgeEstimate estimate) {
    double rectangle = edge.distanceM() * estimate.depthM();
    return rectangle > 0 ? Math.max(0, 2 * estimate.areaM2() / rectangle - 1) : 0;
  }
}
