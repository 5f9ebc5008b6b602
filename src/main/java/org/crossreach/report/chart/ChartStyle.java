package org.crossreach.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;

/**
 * Every colour, font and line of the pictures and pages. Sizes are in points (1/72 inch).
 *
 * @param ink text and the lines that matter
 * @param quiet axes, secondary text
 * @param faint grid lines and rules
 * @param wash pale areas behind something
 * @param paper the ground
 * @param water what was measured
 * @param deep emphasis
 * @param earth bed and banks
 * @param ground bed and banks, as an area
 * @param alarm cautions and faults, always beside a word or sign that says the same
 * @param title title of a picture
 * @param label names of axes
 * @param tick numbers and keys
 * @param top pattern of the extrapolated water near the surface
 * @param bottom pattern of the extrapolated water near the bed
 * @param edge pattern of the estimated water beside the banks
 */
public record ChartStyle(
    Color ink,
    Color quiet,
    Color faint,
    Color wash,
    Color paper,
    Color water,
    Color deep,
    Color earth,
    Color ground,
    Color alarm,
    Font title,
    Font label,
    Font tick,
    Hatch top,
    Hatch bottom,
    Hatch edge) {

  private static final ChartStyle STANDARD =
      new ChartStyle(
          /* ink= */ new Color(0x1C2730),
          /* quiet= */ new Color(0x5E6B75),
          /* faint= */ new Color(0xD5DBDF),
          /* wash= */ new Color(0xF1F3F4),
          /* paper= */ Color.WHITE,
          /* water= */ new Color(0x7FA3B5),
          /* deep= */ new Color(0x0E4A5C),
          /* earth= */ new Color(0x8A7B68),
          /* ground= */ new Color(0xECE7E0),
          /* alarm= */ new Color(0xA63D1E),
          /* title= */ Face.MEDIUM.size(9),
          /* label= */ Face.REGULAR.size(7),
          /* tick= */ Face.REGULAR.size(7),
          /* top= */ new Hatch(1, 3.2, 0.45, false),
          /* bottom= */ new Hatch(-1, 3.2, 0.45, false),
          /* edge= */ new Hatch(1, 4.4, 0.35, true));

  /** The one look of all reports. */
  public static ChartStyle standard() {
    return STANDARD;
  }

  /** A solid line (pt). */
  public Stroke line(double width) {
    return new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  }

  /** A broken line (pt). */
  public Stroke dashed(double width, double dash, double gap) {
    return new BasicStroke(
        (float) width,
        BasicStroke.CAP_BUTT,
        BasicStroke.JOIN_ROUND,
        /* miterlimit= */ 4f,
        new float[] {(float) dash, (float) gap},
        /* dash_phase= */ 0f);
  }
}
