package org.crossreach.profile;

import java.util.Arrays;
import org.apache.commons.math3.util.FastMath;
import org.crossreach.screen.RobustScale;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * The columns of one pass, laid out for fitting one exponent with an amplitude for each column.
 *
 * <p>The velocity of a cell is modelled as {@code U (upper^(m+1) - lower^(m+1)) / (height H^m)}:
 * the power law's mean over the cell. For a given exponent m the best amplitude U of a column is
 * linear; what the model explains of the squares, {@code (sum w u g)^2 / sum w g^2}, depends on the
 * exponent alone, and errors of equal size in all cells add the same to it whatever the exponent,
 * so that they do not shift its top.
 */
public final class ColumnFit {

  /** Fewest usable cells with which a column says something about an exponent. */
  static final int FEWEST_CELLS = 4;

  /** Most columns that are looked at; of a longer pass every n-th, evenly spread. */
  private static final int MOST_COLUMNS = 1000;

  /** Lowest exponent that is searched. */
  static final double LOWEST = 0.01;

  /** Step and number of the exponents at which the sum over the columns is known. */
  private static final double STEP = 0.04;

  private static final int NODES = 21;

  /** Highest exponent that is searched. */
  static final double HIGHEST = LOWEST + STEP * (NODES - 1);

  /** Nodes through which the sum is interpolated: its error is below 1e-8 of the whole. */
  private static final int NEIGHBOURS = 6;

  /**
   * Residuals within 3 robust standard deviations count in full and beyond 6 not at all, linear
   * between: 0.3 % of Gaussian errors lose weight, so that the fit stays least squares for them.
   */
  private static final double FULL = 3;

  private static final double NONE = 6;

  private static final int BLOCK = 20;
  private static final int MOST_REWEIGHTINGS = 3;

  /** An exponent that moves by less than this from one weighting to the next has settled. */
  private static final double SETTLED = 5e-4;

  private int columns;
  private int[] firstCell;
  private double[] velocity;
  private double[] upper;
  private double[] lower;
  private double[] weight;
  private Powers base;
  private Powers step;
  private final FlowDirection direction;
  private final double[] total = new double[NODES];
  private double[][] byColumn;

  /** A power of the edges of every cell; cells that touch share one. */
  private record Powers(double[] upper, double[] lower) {}

  private ColumnFit(int columns, int cells, FlowDirection direction) {
    this.direction = direction;
    firstCell = new int[columns + 1];
    velocity = new double[columns * cells];
    upper = new double[columns * cells];
    lower = new double[columns * cells];
  }

  /**
   * Lays out the columns of a pass and gives less weight to cells that lie far from its own best
   * exponent.
   *
   * @param section the pass on its line
   */
  public static ColumnFit of(Section section) {
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    int step = 1 + (section.size() - 1) / MOST_COLUMNS;
    FlowDirection direction = FlowDirection.of(section, step);
    ColumnFit fit =
        new ColumnFit(1 + (section.size() - 1) / step, section.pass().maxCells(), direction);
    for (int i = 0; i < section.size(); i += step) {
      section.read(i, row, column);
      if (column.size() >= FEWEST_CELLS && !section.depthFilled(i)) {
        fit.add(column);
      }
    }
    fit.settle();
    return fit;
  }

  private void add(Column column) {
    int j = firstCell[columns];
    for (int k = 0; k < column.size(); k++, j++) {
      velocity[j] =
          direction.normal() * column.velocityMps(Component.NORMAL, k)
              + direction.along() * column.velocityMps(Component.ALONG, k);
      upper[j] = column.upperM(k) / column.depthM();
      lower[j] = column.lowerM(k) / column.depthM();
    }
    columns++;
    firstCell[columns] = j;
  }

  private void settle() {
    int cells = firstCell[columns];
    velocity = Arrays.copyOf(velocity, cells);
    upper = Arrays.copyOf(upper, cells);
    lower = Arrays.copyOf(lower, cells);
    firstCell = Arrays.copyOf(firstCell, columns + 1);
    weight = new double[cells];
    Arrays.fill(weight, 1);
    base = powers(LOWEST + 1);
    step = powers(STEP);
    byColumn = new double[columns][NODES];
    sumUp();
    double before = Double.NaN;
    for (int r = 0; r < MOST_REWEIGHTINGS && columns > 0; r++) {
      double exponent = ExponentSearch.top(this::explained, LOWEST, HIGHEST);
      if (Math.abs(exponent - before) < SETTLED) {
        break;
      }
      reweight(exponent);
      sumUp();
      before = exponent;
    }
  }

  private Powers powers(double exponent) {
    Powers powers = new Powers(new double[upper.length], new double[upper.length]);
    for (int j = 0; j < upper.length; j++) {
      powers.upper[j] =
          j > 0 && upper[j] == lower[j - 1]
              ? powers.lower[j - 1]
              : FastMath.pow(upper[j], exponent);
      powers.lower[j] = FastMath.pow(lower[j], exponent);
    }
    return powers;
  }

  /** The axis of flow along which the velocities are taken. */
  public FlowDirection direction() {
    return direction;
  }

  /** Number of columns. */
  int columns() {
    return columns;
  }

  /** What the model explains of the weighted squares of all columns (m²/s²), interpolated. */
  double explained(double exponent) {
    return new Interpolation(exponent).of(total);
  }

  /** Lagrange's polynomial through the values at the nodes around an exponent. */
  private static final class Interpolation {
    private final int first;
    private final double[] factor = new double[NEIGHBOURS];

    Interpolation(double exponent) {
      double place = (exponent - LOWEST) / STEP;
      first =
          Math.max(0, Math.min(NODES - NEIGHBOURS, (int) Math.floor(place) - NEIGHBOURS / 2 + 1));
      for (int k = 0; k < NEIGHBOURS; k++) {
        factor[k] = 1;
        for (int other = 0; other < NEIGHBOURS; other++) {
          factor[k] *= other == k ? 1 : (place - first - other) / (k - other);
        }
      }
    }

    double of(double[] atNodes) {
      double sum = 0;
      for (int k = 0; k < NEIGHBOURS; k++) {
        sum += factor[k] * atNodes[first + k];
      }
      return sum;
    }
  }

  /** Sums at every node; powers step from node to node by a multiplication. */
  private void sumUp() {
    Arrays.fill(total, 0);
    double[] product = new double[NODES];
    double[] square = new double[NODES];
    for (int c = 0; c < columns; c++) {
      Arrays.fill(product, 0);
      Arrays.fill(square, 0);
      for (int j = firstCell[c]; j < firstCell[c + 1]; j++) {
        double high = base.upper[j];
        double low = base.lower[j];
        double perHeight = 1 / (upper[j] - lower[j]);
        for (int k = 0; k < NODES; k++) {
          double shape = (high - low) * perHeight;
          product[k] += weight[j] * velocity[j] * shape;
          square[k] += weight[j] * shape * shape;
          high *= step.upper[j];
          low *= step.lower[j];
        }
      }
      for (int k = 0; k < NODES; k++) {
        byColumn[c][k] = square[k] > 0 ? product[k] * product[k] / square[k] : 0;
        total[k] += byColumn[c][k];
      }
    }
  }

  /**
   * What the model explains of the weighted squares of each column (m²/s²), for three exponents,
   * interpolated.
   *
   * @param exponent the middle one
   * @param apart distance of the others
   * @return for each column the value below, at and above the middle
   */
  double[][] explainedAround(double exponent, double apart) {
    double[][] explained = new double[columns][3];
    for (int side = 0; side < 3; side++) {
      Interpolation interpolation = new Interpolation(exponent + (side - 1) * apart);
      for (int c = 0; c < columns; c++) {
        explained[c][side] = interpolation.of(byColumn[c]);
      }
    }
    return explained;
  }

  private double amplitude(int column, double[] shapes) {
    double product = 0;
    double square = 0;
    for (int j = firstCell[column]; j < firstCell[column + 1]; j++) {
      product += weight[j] * velocity[j] * shapes[j];
      square += weight[j] * shapes[j] * shapes[j];
    }
    return square > 0 ? product / square : 0;
  }

  private void reweight(double exponent) {
    double[] residual = new double[velocity.length];
    Powers powers = powers(exponent + 1);
    for (int j = 0; j < residual.length; j++) {
      residual[j] = (powers.upper[j] - powers.lower[j]) / (upper[j] - lower[j]);
    }
    for (int c = 0; c < columns; c++) {
      double amplitude = amplitude(c, residual);
      for (int j = firstCell[c]; j < firstCell[c + 1]; j++) {
        residual[j] = velocity[j] - amplitude * residual[j];
      }
    }
    double sigma = RobustScale.of(residual.clone(), residual.length).sigma();
    for (int j = 0; j < residual.length; j++) {
      double size = sigma > 0 ? Math.abs(residual[j]) / sigma : 0;
      weight[j] = Math.max(0, Math.min(1, (NONE - size) / (NONE - FULL)));
    }
  }

  /**
   * Share of blocks of {@value #BLOCK} neighbouring columns, by their flow, whose upper and lower
   * halves flow in opposite directions (0 to 1).
   */
  double reversingShare() {
    double reversing = 0;
    double all = 0;
    for (int from = 0; from < columns; from += BLOCK) {
      double above = 0;
      double below = 0;
      for (int c = from; c < Math.min(columns, from + BLOCK); c++) {
        for (int j = firstCell[c]; j < firstCell[c + 1]; j++) {
          double transport = weight[j] * velocity[j] * (upper[j] - lower[j]);
          if (upper[j] + lower[j] > 1) {
            above += transport;
          } else {
            below += transport;
          }
        }
      }
      double size = Math.abs(above) + Math.abs(below);
      all += size;
      reversing += above * below < 0 ? size : 0;
    }
    return all > 0 ? reversing / all : 0;
  }
}
