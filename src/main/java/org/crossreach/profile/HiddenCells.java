package org.crossreach.profile;

import java.util.Arrays;
import java.util.List;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;

/**
 * Measured cells that are hidden from the laws, predicted by them from the rest, and compared.
 *
 * <p>In every column with at least {@value #FEWEST_CELLS} usable cells as many of the uppermost (or
 * lowermost) cells are hidden as the unmeasured zone beyond them is thick, to the nearest cell, but
 * at least one, and never so many that fewer than {@value #FEWEST_LEFT} are left. Velocities are
 * along the pass's axis of flow. Each column counts with the width that the boat covered in it, and
 * with the direction in which its neighbours flow together, so that an error that makes the flow
 * too strong is positive either way; its own noise has no say in that. Immutable.
 */
public final class HiddenCells {

  /** Fewest cells that are left to a law: with fewer the three-point law is not itself. */
  public static final int FEWEST_LEFT = 6;

  /** Fewest usable cells of a column that counts. */
  public static final int FEWEST_CELLS = FEWEST_LEFT + 1;

  /** Columns on each side whose flow decides on the direction. */
  private static final int NEIGHBOURS = 15;

  private final List<LawTrial> trials;
  private final double[][] measured;
  private final double[][] error;

  private HiddenCells(List<LawTrial> trials, double[][] measured, double[][] error) {
    this.trials = List.copyOf(trials);
    this.measured = measured;
    this.error = error;
  }

  /**
   * Hides and predicts the cells of a pass.
   *
   * @param section the pass on its line
   * @param direction the pass's axis of flow
   * @param trials what is tried; for the surface or the bed each
   */
  public static HiddenCells of(Section section, FlowDirection direction, List<LawTrial> trials) {
    double[][] measured = new double[Zone.values().length][section.size()];
    double[][] error = new double[trials.size()][section.size()];
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    Column rest = section.newColumn();
    double[] flow = new double[section.size()];
    int counted = 0;
    for (int i = 0; i < section.size(); i++) {
      section.read(i, row, column);
      double width = Math.abs(section.progressM(i));
      if (column.size() < FEWEST_CELLS || section.depthFilled(i) || !(width > 0)) {
        continue;
      }
      column.turnTo(direction.normal(), direction.along());
      for (Zone zone : new Zone[] {Zone.TOP, Zone.BOTTOM}) {
        int hidden = hidden(column, zone);
        int from = zone == Zone.TOP ? 0 : column.size() - hidden;
        rest.takePart(
            column,
            zone == Zone.TOP ? hidden : 0,
            zone == Zone.TOP ? column.size() : column.size() - hidden);
        double factor = width * Math.signum(MeasuredZone.throughCells(rest, Component.NORMAL));
        double truth = 0;
        for (int j = from; j < from + hidden; j++) {
          truth += column.velocityMps(Component.NORMAL, j) * column.heightM(j);
        }
        measured[zone.ordinal()][counted] = width * truth;
        for (int t = 0; t < error.length; t++) {
          if (trials.get(t).zone() == zone) {
            error[t][counted] =
                width * (predicted(trials.get(t), column, rest, from, hidden) - truth);
          }
        }
      }
      flow[counted] = width * MeasuredZone.throughCells(column, Component.NORMAL);
      counted++;
    }
    double[] sign = signs(Arrays.copyOf(flow, counted));
    for (int z = 0; z < measured.length; z++) {
      measured[z] = signed(measured[z], sign);
    }
    for (int t = 0; t < error.length; t++) {
      error[t] = signed(error[t], sign);
    }
    return new HiddenCells(trials, measured, error);
  }

  /** Which way the neighbours of each column flow together, without the column itself: 1 or -1. */
  private static double[] signs(double[] flow) {
    double[] sign = new double[flow.length];
    double sum = 0;
    for (int i = 0; i < Math.min(flow.length, NEIGHBOURS); i++) {
      sum += flow[i];
    }
    for (int i = 0; i < flow.length; i++) {
      sum += i + NEIGHBOURS < flow.length ? flow[i + NEIGHBOURS] : 0;
      sum -= i - NEIGHBOURS - 1 >= 0 ? flow[i - NEIGHBOURS - 1] : 0;
      sign[i] = sum - flow[i] < 0 ? -1 : 1;
    }
    return sign;
  }

  private static double[] signed(double[] values, double[] sign) {
    double[] signed = new double[sign.length];
    for (int i = 0; i < sign.length; i++) {
      signed[i] = sign[i] * values[i];
    }
    return signed;
  }

  private static int hidden(Column column, Zone zone) {
    int size = column.size();
    double thickness =
        zone == Zone.TOP ? column.depthM() - column.upperM(0) : column.lowerM(size - 1);
    double cell = column.heightM(zone == Zone.TOP ? 0 : size - 1);
    return Math.max(1, Math.min(size - FEWEST_LEFT, (int) Math.round(thickness / cell)));
  }

  /** Transport through the hidden cells by a law, run by run of joined cells (m²/s). */
  private static double predicted(
      LawTrial trial, Column column, Column rest, int from, int hidden) {
    double sum = 0;
    int first = from;
    for (int j = from; j < from + hidden; j++) {
      if (j == from + hidden - 1 || !column.joined(j)) {
        sum +=
            trial
                .law()
                .transport(
                    rest,
                    Component.NORMAL,
                    trial.exponent(),
                    column.lowerM(j),
                    column.upperM(first));
        first = j + 1;
      }
    }
    return sum;
  }

  /** What was tried. */
  public List<LawTrial> trials() {
    return trials;
  }

  /** Number of columns that count. */
  public int columns() {
    return measured[0].length;
  }

  /** What was measured in the hidden cells of a column times its width (m³/s), from 0. */
  public double measuredM3s(Zone zone, int column) {
    return measured[zone.ordinal()][column];
  }

  /** Prediction minus measurement in the hidden cells of a column times its width (m³/s). */
  public double errorM3s(int trial, int column) {
    return error[trial][column];
  }

  /** How many neighbouring columns belong in a block, by the errors that reach furthest. */
  public int blockLength() {
    int length = 1;
    for (double[] each : error) {
      length = Math.max(length, BlockLength.of(each));
    }
    return length;
  }
}
