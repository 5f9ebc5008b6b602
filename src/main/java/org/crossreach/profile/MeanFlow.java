package org.crossreach.profile;

import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/** The mean direction of flow of a pass. */
public final class MeanFlow {

  private MeanFlow() {}

  /**
   * Unit vector of the mean flow through the usable cells, in the section's axes: its part normal
   * to the section, positive downstream, and its part along it, positive to the right bank. Where
   * nothing flows it points downstream.
   */
  public static double[] direction(Section section) {
    double normal = 0;
    double along = 0;
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < section.size(); i++) {
      section.read(i, row, column);
      for (int j = 0; j < column.size(); j++) {
        normal += column.velocityMps(Component.NORMAL, j) * column.heightM(j);
        along += column.velocityMps(Component.ALONG, j) * column.heightM(j);
      }
    }
    double size = Math.hypot(normal, along);
    return size > 0 ? new double[] {normal / size, along / size} : new double[] {1, 0};
  }
}
