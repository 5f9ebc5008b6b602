package org.crossreach.profile;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.screen.RobustScale;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The usable cells of many columns, laid out for fitting one exponent with an amplitude for each
 * column.
 *
 * <p>The velocity of a cell is modelled as {@code U (upper^(m+1) - lower^(m+1)) / (height H^m)},
 * the power law's mean over the cell, with the depth-mean velocity U of its column. For a given
 * exponent the best U is linear; what remains depends on the exponent alone.
 */
final class ColumnFit {

  /** Fewest usable cells with which a column says something about an exponent. */
  static final int FEWEST_CELLS = 4;

  /** Most columns of one pass that are looked at; of a longer pass every n-th. */
  private static final int MOST_COLUMNS = 1500;

  private final int[] firstCell;
  private final double[] logDepth;
  private final double[] velocity;
  private final double[] logUpper;
  private final double[] logLower;
  private final double[] height;
  private final double[] weight;
  private double stiffness = 1;

  private ColumnFit(List<double[]> columns) {
    firstCell = new int[columns.size() + 1];
    for (int c = 0; c < columns.size(); c++) {
      firstCell[c + 1] = firstCell[c] + (columns.get(c).length - 1) / 3;
    }
    int cells = firstCell[columns.size()];
    logDepth = new double[columns.size()];
    velocity = new double[cells];
    logUpper = new double[cells];
    logLower = new double[cells];
    height = new double[cells];
    weight = new double[cells];
    for (int c = 0; c < columns.size(); c++) {
      double[] packed = columns.get(c);
      logDepth[c] = Math.log(packed[0]);
      for (int j = firstCell[c], p = 1; j < firstCell[c + 1]; j++, p += 3) {
        velocity[j] = packed[p];
        logUpper[j] = Math.log(packed[p + 1]);
        logLower[j] = Math.log(packed[p + 2]);
        height[j] = packed[p + 1] - packed[p + 2];
        weight[j] = 1;
      }
    }
  }

  /**
   * The columns of some passes, velocities along each pass's own mean direction of flow.
   *
   * @param sections the passes on their lines
   */
  static ColumnFit of(List<Section> sections) {
    List<double[]> columns = new ArrayList<>();
    for (Section section : sections) {
      double[] direction = MeanFlow.direction(section);
      VelocityRow row = section.newRow();
      Column column = section.newColumn();
      int step = 1 + (section.size() - 1) / MOST_COLUMNS;
      for (int i = 0; i < section.size(); i += step) {
        section.read(i, row, column);
        if (column.size() >= FEWEST_CELLS && !section.depthFilled(i)) {
          columns.add(packed(column, direction));
        }
      }
    }
    return new ColumnFit(columns);
  }

  private static double[] packed(Column column, double[] direction) {
    double[] packed = new double[1 + 3 * column.size()];
    packed[0] = column.depthM();
    for (int j = 0; j < column.size(); j++) {
      packed[1 + 3 * j] =
          direction[0] * column.velocityMps(Component.NORMAL, j)
              + direction[1] * column.velocityMps(Component.ALONG, j);
      packed[2 + 3 * j] = column.upperM(j);
      packed[3 + 3 * j] = column.lowerM(j);
    }
    return packed;
  }

  /** Number of columns. */
  int columns() {
    return logDepth.length;
  }

  /**
   * What the model explains of the weighted squares of a column (m²/s²), by the best amplitude: the
   * larger, the better the exponent.
   */
  double explained(int column, double exponent) {
    double product = 0;
    double square = 0;
    for (int j = firstCell[column]; j < firstCell[column + 1]; j++) {
      double shape = shape(column, j, exponent);
      product += weight[j] * velocity[j] * shape;
      square += weight[j] * shape * shape;
    }
    return square > 0 ? product * product / square : 0;
  }

  /** What the model explains of all columns (m²/s²). */
  double explained(double exponent) {
    double sum = 0;
    for (int c = 0; c < columns(); c++) {
      sum += explained(c, exponent);
    }
    return sum;
  }

  private double amplitude(int column, double exponent) {
    double product = 0;
    double square = 0;
    for (int j = firstCell[column]; j < firstCell[column + 1]; j++) {
      double shape = shape(column, j, exponent);
      product += weight[j] * velocity[j] * shape;
      square += weight[j] * shape * shape;
    }
    return square > 0 ? product / square : 0;
  }

  private double shape(int column, int j, double exponent) {
    double upper = Math.exp((exponent + 1) * logUpper[j] - exponent * logDepth[column]);
    double lower = Math.exp((exponent + 1) * logLower[j] - exponent * logDepth[column]);
    return (upper - lower) / height[j];
  }

  /** Share of columns whose upper and lower halves flow in opposite directions (0 to 1). */
  double reversingShare() {
    int reversing = 0;
    for (int c = 0; c < columns(); c++) {
      int middle = (firstCell[c] + firstCell[c + 1]) / 2;
      double upper = mean(firstCell[c], middle);
      double lower = mean(middle, firstCell[c + 1]);
      reversing += upper * lower < 0 ? 1 : 0;
    }
    return columns() == 0 ? 0 : (double) reversing / columns();
  }

  private double mean(int from, int to) {
    double sum = 0;
    for (int j = from; j < to; j++) {
      sum += velocity[j];
    }
    return sum / (to - from);
  }

  /**
   * Gives less weight to cells that lie far from the model, by Tukey's biweight at {@code 4.685}
   * robust standard deviations (95 % efficient on Gaussian errors; Holland and Welsch 1977,
   * doi:10.1080/03610927708827533).
   */
  void reweight(double exponent) {
    double[] residual = new double[velocity.length];
    for (int c = 0; c < columns(); c++) {
      double amplitude = amplitude(c, exponent);
      for (int j = firstCell[c]; j < firstCell[c + 1]; j++) {
        residual[j] = velocity[j] - amplitude * shape(c, j, exponent);
      }
    }
    double limit = 4.685 * RobustScale.of(residual.clone(), residual.length).sigma();
    double slopes = 0;
    double weights = 0;
    for (int j = 0; j < residual.length; j++) {
      double share = limit > 0 ? residual[j] / limit : 0;
      double rest = Math.max(0, 1 - share * share);
      weight[j] = rest * rest;
      weights += weight[j];
      slopes += rest > 0 ? rest * (1 - 5 * share * share) : 0;
    }
    stiffness = weights > 0 ? slopes / weights : 1;
  }

  /**
   * How much the fit really gives way to the data, over what it would with weights that were given
   * beforehand (0 to 1): the mean slope of the influence function over the mean weight. Standard
   * errors by given weights are to be divided by it.
   */
  double stiffness() {
    return stiffness;
  }
}
