package org.crossreach.report.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Lines of equal velocity through a field, by marching over the squares between its nodes.
 *
 * <p>Places are in nodes: (0, 0) is the lowest node at the left end.
 */
final class EqualVelocity {

  private EqualVelocity() {}

  /** Velocities at the nodes of an even grid. */
  interface Field {

    int columns();

    int rows();

    /** Velocity at a node (m/s), NaN where there is none. */
    double at(int column, int row);
  }

  /** A piece of a line inside one square. */
  private record Piece(double fromX, double fromY, double toX, double toY) {}

  /**
   * The lines of one velocity.
   *
   * @param field the field
   * @param level the velocity (m/s)
   * @return each line as x and y in turn, longest first
   */
  static List<double[]> lines(Field field, double level) {
    List<Piece> pieces = new ArrayList<>();
    for (int r = 0; r + 1 < field.rows(); r++) {
      for (int k = 0; k + 1 < field.columns(); k++) {
        addPieces(field, k, r, level, pieces);
      }
    }
    return joined(pieces);
  }

  private static void addPieces(Field field, int k, int r, double level, List<Piece> pieces) {
    double[] corner = {
      field.at(k, r) - level,
      field.at(k + 1, r) - level,
      field.at(k + 1, r + 1) - level,
      field.at(k, r + 1) - level
    };
    double[] crossing = new double[8];
    int count = 0;
    for (int side = 0; side < 4; side++) {
      double a = corner[side];
      double b = corner[(side + 1) % 4];
      if (Double.isNaN(a) || Double.isNaN(b)) {
        return;
      }
      if (a < 0 == b < 0) {
        continue;
      }
      double t = a / (a - b);
      crossing[2 * count] = k + (side == 0 ? t : side == 1 ? 1 : side == 2 ? 1 - t : 0);
      crossing[2 * count + 1] = r + (side == 0 ? 0 : side == 1 ? t : side == 2 ? 1 : 1 - t);
      count++;
    }
    for (int c = 0; c + 1 < count; c += 2) {
      pieces.add(
          new Piece(
              crossing[2 * c], crossing[2 * c + 1], crossing[2 * c + 2], crossing[2 * c + 3]));
    }
  }

  /** Joins pieces that share an end. */
  private static List<double[]> joined(List<Piece> pieces) {
    List<double[]> lines = new ArrayList<>();
    boolean[] taken = new boolean[pieces.size()];
    for (int p = 0; p < taken.length; p++) {
      if (taken[p]) {
        continue;
      }
      taken[p] = true;
      Piece first = pieces.get(p);
      double[] ahead = grown(pieces, taken, first.toX, first.toY);
      double[] behind = grown(pieces, taken, first.fromX, first.fromY);
      double[] line = new double[behind.length + ahead.length];
      for (int i = 0; i < behind.length; i += 2) {
        line[behind.length - 2 - i] = behind[i];
        line[behind.length - 1 - i] = behind[i + 1];
      }
      System.arraycopy(ahead, 0, line, behind.length, ahead.length);
      lines.add(line);
    }
    lines.sort((a, b) -> Integer.compare(b.length, a.length));
    return lines;
  }

  private static double[] grown(List<Piece> pieces, boolean[] taken, double x, double y) {
    double[] line = {x, y};
    for (int next = find(pieces, taken, x, y); next >= 0; next = find(pieces, taken, x, y)) {
      taken[next] = true;
      Piece piece = pieces.get(next);
      boolean forward = near(piece.fromX, piece.fromY, x, y);
      x = forward ? piece.toX : piece.fromX;
      y = forward ? piece.toY : piece.fromY;
      line = Arrays.copyOf(line, line.length + 2);
      line[line.length - 2] = x;
      line[line.length - 1] = y;
    }
    return line;
  }

  private static int find(List<Piece> pieces, boolean[] taken, double x, double y) {
    for (int p = 0; p < taken.length; p++) {
      Piece piece = pieces.get(p);
      if (!taken[p] && (near(piece.fromX, piece.fromY, x, y) || near(piece.toX, piece.toY, x, y))) {
        return p;
      }
    }
    return -1;
  }

  private static boolean near(double ax, double ay, double bx, double by) {
    return Math.abs(ax - bx) + Math.abs(ay - by) < 1e-9;
  }
}
