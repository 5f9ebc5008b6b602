package org.crossreach.survey;

import java.util.List;

/**
 * A site's stage-discharge relation as power-law segments.
 *
 * @param segments the segments, in rising order of stage
 */
public record Rating(List<Segment> segments) {

  public Rating {
    segments = List.copyOf(segments);
  }

  /**
   * One segment, {@code Q = a (h - h0)^b} with h in m and Q in m³/s.
   *
   * @param fromStageM lowest stage of the segment (m)
   * @param toStageM highest stage of the segment (m)
   * @param a coefficient: discharge one metre above {@code h0M} (m³/s)
   * @param h0M stage of zero flow (m)
   * @param b exponent
   */
  public record Segment(double fromStageM, double toStageM, double a, double h0M, double b) {}
}
