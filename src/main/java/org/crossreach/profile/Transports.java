package org.crossreach.profile;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.survey.Gaps;

/**
 * What flows through each column of a section per unit width (m²/s), by zone and component.
 *
 * <p>A column without a usable cell takes its depth-mean velocity, zone by zone, from the nearest
 * columns that have one on both sides, linear in the distance along the boat's track, times its own
 * depth. Immutable; safe to share between threads.
 */
public final class Transports {

  private static final Zone[] ZONES = Zone.values();
  private static final Component[] COMPONENTS = Component.values();

  private final double[][] values;
  private final double[][] gaps;
  private final boolean[] own;

  /** What flows through one zone by one law: one column of values for each component. */
  private record Flow(Zone zone, VelocityLaw law, double exponent, double[][] values) {

    static Flow of(Zone zone, VelocityLaw law, double exponent, int size) {
      return new Flow(zone, law, exponent, missing(size));
    }

    boolean isBy(Zone wanted, VelocityLaw other, double otherExponent) {
      return zone == wanted
          && law.getClass() == other.getClass()
          && (exponent == otherExponent || !law.takesExponent());
    }

    void put(Column column, Component component, int ensemble) {
      values[component.ordinal()][ensemble] =
          zone == Zone.TOP
              ? Laws.top(law, column, component, exponent)
              : Laws.bottom(law, column, component, exponent);
    }
  }

  /**
   * Integrates every column of a section.
   *
   * @param section the section
   * @param choice how the unmeasured water is estimated
   */
  public static Transports of(Section section, VerticalChoice choice) {
    return all(section, List.of(choice)).get(0);
  }

  /**
   * Integrates every column of a section by several choices, reading each column once and using
   * each law with each exponent once.
   *
   * @param section the section
   * @param choices how the unmeasured water is estimated
   * @return as many as there are choices, in their order
   */
  public static List<Transports> all(Section section, List<VerticalChoice> choices) {
    int size = section.size();
    List<Flow> flows = new ArrayList<>();
    List<Flow> tops = new ArrayList<>();
    List<Flow> bottoms = new ArrayList<>();
    for (VerticalChoice each : choices) {
      tops.add(flow(flows, Zone.TOP, Laws.of(each.top()), each.exponent(), size));
      bottoms.add(flow(flows, Zone.BOTTOM, Laws.of(each.bottom()), each.exponent(), size));
    }
    boolean[] own = new boolean[size];
    double[][] measured = missing(size);
    double[][] gaps = missing(size);
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < size; i++) {
      section.read(i, row, column);
      own[i] = column.size() > 0;
      for (int c = 0; own[i] && c < COMPONENTS.length; c++) {
        gaps[c][i] = MeasuredZone.throughGaps(column, COMPONENTS[c]);
        measured[c][i] = MeasuredZone.throughCells(column, COMPONENTS[c]) + gaps[c][i];
        for (Flow flow : flows) {
          flow.put(column, COMPONENTS[c], i);
        }
      }
    }
    fillColumns(section, own, measured);
    for (Flow flow : flows) {
      fillColumns(section, own, flow.values());
    }
    List<Transports> all = new ArrayList<>();
    for (int choice = 0; choice < choices.size(); choice++) {
      all.add(
          new Transports(
              tops.get(choice).values(), measured, bottoms.get(choice).values(), gaps, own));
    }
    return all;
  }

  private static Flow flow(
      List<Flow> flows, Zone zone, VelocityLaw law, double exponent, int size) {
    for (Flow each : flows) {
      if (each.isBy(zone, law, exponent)) {
        return each;
      }
    }
    Flow flow = Flow.of(zone, law, exponent, size);
    flows.add(flow);
    return flow;
  }

  private static double[][] missing(int size) {
    double[][] columns = new double[COMPONENTS.length][size];
    for (double[] each : columns) {
      Arrays.fill(each, Double.NaN);
    }
    return columns;
  }

  private Transports(
      double[][] top, double[][] measured, double[][] bottom, double[][] gaps, boolean[] own) {
    values = new double[ZONES.length * COMPONENTS.length][];
    for (Component component : COMPONENTS) {
      values[index(Zone.TOP, component)] = top[component.ordinal()];
      values[index(Zone.MEASURED, component)] = measured[component.ordinal()];
      values[index(Zone.BOTTOM, component)] = bottom[component.ordinal()];
    }
    this.gaps = gaps;
    this.own = own;
  }

  private static void fillColumns(Section section, boolean[] own, double[][] columns) {
    double[] length = section.track().lengthsM();
    for (double[] column : columns) {
      double[] perDepth = new double[own.length];
      for (int i = 0; i < own.length; i++) {
        perDepth[i] = column[i] / section.depthM(i);
      }
      double[] filled = Gaps.fillLinear(perDepth, length);
      for (int i = 0; i < own.length; i++) {
        if (!own[i]) {
          column[i] = filled[i] * section.depthM(i);
        }
      }
    }
  }

  private static int index(Zone zone, Component component) {
    return zone.ordinal() * COMPONENTS.length + component.ordinal();
  }

  /** Number of columns. */
  public int size() {
    return own.length;
  }

  /** Whether a column has usable cells of its own; otherwise it was filled in. */
  public boolean own(int ensemble) {
    return own[ensemble];
  }

  /** Number of columns with usable cells of their own. */
  public int ownCount() {
    int count = 0;
    for (boolean each : own) {
      count += each ? 1 : 0;
    }
    return count;
  }

  /** Transport through one zone of a column per unit width (m²/s), signed as the component. */
  public double zone(Zone zone, Component component, int ensemble) {
    return values[index(zone, component)][ensemble];
  }

  /**
   * The part of the measured zone's transport that flows through filled gaps between cells (m²/s);
   * NaN in a column without cells of its own.
   */
  public double gaps(Component component, int ensemble) {
    return gaps[component.ordinal()][ensemble];
  }

  /** Transport through the whole column per unit width (m²/s). */
  public double total(Component component, int ensemble) {
    double sum = 0;
    for (Zone zone : ZONES) {
      sum += zone(zone, component, ensemble);
    }
    return sum;
  }
}
