package org.crossreach.report.chart;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The measured cells of a pass by their height: velocity over the mean of the whole column, in
 * layers of equal share of the depth. Quantiles are exact to {@value #STEP}.
 */
final class ProfileBins {

  /** Number of layers. */
  static final int LAYERS = 20;

  private static final double LOWEST = -2;
  private static final double HIGHEST = 4;
  private static final double STEP = 0.002;
  private static final int STEPS = (int) Math.round((HIGHEST - LOWEST) / STEP);

  /** A layer with fewer than this share of the cells of the fullest one says nothing. */
  private static final double FEWEST = 0.2;

  private final int[][] counts = new int[LAYERS][STEPS];
  private final int[] total = new int[LAYERS];
  private double meanTop;
  private double meanBottom;

  static ProfileBins of(PassDischarge pass) {
    return of(List.of(pass));
  }

  /** The cells of several passes together; at least one column has usable cells. */
  static ProfileBins of(List<PassDischarge> passes) {
    ProfileBins bins = new ProfileBins();
    int columns = 0;
    for (PassDischarge each : passes) {
      columns += bins.add(each);
    }
    bins.meanTop /= columns;
    bins.meanBottom /= columns;
    return bins;
  }

  /** Adds the cells of a pass and returns the number of its columns. */
  private int add(PassDischarge pass) {
    Section section = pass.section();
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    int columns = 0;
    for (int i = 0; i < section.size(); i++) {
      if (!pass.transports().own(i)) {
        continue;
      }
      section.read(i, row, column);
      double mean = pass.transports().total(Component.NORMAL, i) / column.depthM();
      for (int j = 0; j < column.size() && mean != 0; j++) {
        add(column.centreM(j) / column.depthM(), column.velocityMps(Component.NORMAL, j) / mean);
      }
      meanTop += column.upperM(0) / column.depthM();
      meanBottom += column.lowerM(column.size() - 1) / column.depthM();
      columns++;
    }
    return columns;
  }

  private void add(double height, double ratio) {
    int layer = Math.min(LAYERS - 1, (int) (height * LAYERS));
    int step = (int) Math.floor((ratio - LOWEST) / STEP);
    counts[layer][Math.max(0, Math.min(STEPS - 1, step))]++;
    total[layer]++;
  }

  /** Middle of a layer as a share of the depth above the bed; layer 0 lies on the bed. */
  static double height(int layer) {
    return (layer + 0.5) / LAYERS;
  }

  /** Whether a layer has enough cells to speak of. */
  boolean filled(int layer) {
    int most = 0;
    for (int each : total) {
      most = Math.max(most, each);
    }
    return total[layer] > 0 && total[layer] >= FEWEST * most;
  }

  /**
   * Number of cells of a layer between two ratios of velocity over column mean, the upper one not
   * included.
   */
  int count(int layer, double from, double to) {
    int count = 0;
    int end = Math.min(STEPS, (int) Math.round((to - LOWEST) / STEP));
    for (int s = Math.max(0, (int) Math.round((from - LOWEST) / STEP)); s < end; s++) {
      count += counts[layer][s];
    }
    return count;
  }

  /**
   * A quantile of velocity over column mean in a layer.
   *
   * @param layer a layer with cells
   * @param share 0 to 1 (0.5 → the median)
   */
  double quantile(int layer, double share) {
    double wanted = share * total[layer];
    int sum = 0;
    for (int s = 0; s < STEPS; s++) {
      sum += counts[layer][s];
      if (sum >= wanted && sum > 0) {
        return LOWEST + (s + 0.5) * STEP;
      }
    }
    return Double.NaN;
  }

  /** Upper edge of the highest usable cell as a share of the depth above the bed, mean. */
  double meanTop() {
    return meanTop;
  }

  /** Lower edge of the lowest usable cell as a share of the depth above the bed, mean. */
  double meanBottom() {
    return meanBottom;
  }
}
