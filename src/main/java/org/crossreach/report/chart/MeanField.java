package org.crossreach.report.chart;

import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The measured velocities smoothed onto an even grid over the section, for lines of equal velocity.
 *
 * <p>The grid runs over the width of the measured water and over the height above the bed as a
 * share of the depth. Each node is the mean of the cells around it, weighted with their width and
 * height and falling off linearly over {@value #REACH} nodes; NaN where there is none.
 */
final class MeanField implements EqualVelocity.Field {

  static final int COLUMNS = 72;
  static final int ROWS = 24;
  private static final int REACH = 3;

  private final double[] sum = new double[COLUMNS * ROWS];
  private final double[] weight = new double[COLUMNS * ROWS];

  private MeanField() {}

  static MeanField of(SectionShape shape) {
    MeanField raw = new MeanField();
    Section section = shape.section();
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    double perMetre = COLUMNS / (shape.rightEndM() - shape.leftEndM());
    for (int i = 0; i < shape.size(); i++) {
      double middle = 0.5 * (shape.fromM(i) + shape.toM(i));
      int k = (int) Math.floor((middle - shape.leftEndM()) * perMetre);
      if (k < 0 || k >= COLUMNS) {
        continue;
      }
      section.read(i, row, column);
      double width = shape.toM(i) - shape.fromM(i);
      for (int j = 0; j < column.size(); j++) {
        int r = Math.min(ROWS - 1, (int) (column.centreM(j) / column.depthM() * ROWS));
        double share = width * column.heightM(j) / column.depthM();
        raw.sum[r * COLUMNS + k] += share * column.velocityMps(Component.NORMAL, j);
        raw.weight[r * COLUMNS + k] += share;
      }
    }
    return raw.smoothed();
  }

  private MeanField smoothed() {
    MeanField smooth = new MeanField();
    for (int r = 0; r < ROWS; r++) {
      for (int k = 0; k < COLUMNS; k++) {
        for (int dr = -REACH; dr <= REACH; dr++) {
          for (int dk = -REACH; dk <= REACH; dk++) {
            int row = r + dr;
            int column = k + dk;
            if (row < 0 || row >= ROWS || column < 0 || column >= COLUMNS) {
              continue;
            }
            double near = (REACH + 1 - Math.abs(dr)) * (REACH + 1 - Math.abs(dk));
            smooth.sum[r * COLUMNS + k] += near * sum[row * COLUMNS + column];
            smooth.weight[r * COLUMNS + k] += near * weight[row * COLUMNS + column];
          }
        }
      }
    }
    return smooth;
  }

  @Override
  public int columns() {
    return COLUMNS;
  }

  @Override
  public int rows() {
    return ROWS;
  }

  /** Velocity at a node (m/s); column from 0 at the left end, row from 0 at the bed. */
  @Override
  public double at(int column, int row) {
    int at = row * COLUMNS + column;
    return weight[at] > 0 ? sum[at] / weight[at] : Double.NaN;
  }
}
