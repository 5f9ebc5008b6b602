package org.crossreach.report.chart;

import java.awt.Color;

/** Mixes two colours. */
final class Tint {

  private Tint() {}

  /** The colour at a share of the way from one to another (0 to 1). */
  static Color between(Color from, Color to, double share) {
    return new Color(
        mixed(from.getRed(), to.getRed(), share),
        mixed(from.getGreen(), to.getGreen(), share),
        mixed(from.getBlue(), to.getBlue(), share));
  }

  private static int mixed(int from, int to, double share) {
    return (int) Math.round(from + share * (to - from));
  }
}
