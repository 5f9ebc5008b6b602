package org.crossreach.profile;

import java.util.Arrays;
import org.crossreach.screen.VelocityRow;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Section;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;
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

  private final double[][] values = new double[ZONES.length * COMPONENTS.length][];
  private final double[][] gaps = new double[COMPONENTS.length][];
  private final boolean[] own;

  /**
   * Integrates every column of a section.
   *
   * @param section the section
   * @param top law for the water near the surface
   * @param bottom law for the water near the bed
   * @param exponent exponent of the power law (1/6 → 0.1667)
   */
  public static Transports of(Section section, TopLaw top, BottomLaw bottom, double exponent) {
    Transports transports = new Transports(section.size());
    transports.integrate(section, Laws.of(top), Laws.of(bottom), exponent);
    transports.fillColumns(section);
    return transports;
  }

  private Transports(int size) {
    own = new boolean[size];
    for (double[][] columns : new double[][][] {values, gaps}) {
      for (int c = 0; c < columns.length; c++) {
        columns[c] = new double[size];
        Arrays.fill(columns[c], Double.NaN);
      }
    }
  }

  private void integrate(Section section, VelocityLaw top, VelocityLaw bottom, double exponent) {
    VelocityRow row = section.newRow();
    Column column = section.newColumn();
    for (int i = 0; i < own.length; i++) {
      section.read(i, row, column);
      own[i] = column.size() > 0;
      if (!own[i]) {
        continue;
      }
      for (Component component : COMPONENTS) {
        double throughGaps = MeasuredZone.throughGaps(column, component);
        gaps[component.ordinal()][i] = throughGaps;
        values[index(Zone.TOP, component)][i] = Laws.top(top, column, component, exponent);
        values[index(Zone.MEASURED, component)][i] =
            MeasuredZone.throughCells(column, component) + throughGaps;
        values[index(Zone.BOTTOM, component)][i] = Laws.bottom(bottom, column, component, exponent);
      }
    }
  }

  private void fillColumns(Section section) {
    double[] length = section.track().lengthsM();
    for (double[] column : values) {
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
