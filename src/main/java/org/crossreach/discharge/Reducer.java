package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.crossreach.profile.Transports;
import org.crossreach.profile.Zone;
import org.crossreach.section.Section;
import org.crossreach.settings.Method;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.UnusableInput;

/**
 * Reduces measurements: from recorded facts and choices to the discharge of each pass.
 *
 * @param threads how many passes are worked on side by side, at least 1
 */
public record Reducer(int threads) {

  public Reducer {
    if (threads < 1) {
      throw new IllegalArgumentException("threads must be at least 1, not " + threads);
    }
  }

  /** Works on as many passes side by side as there are processors. */
  public static Reducer onAllProcessors() {
    return new Reducer(Runtime.getRuntime().availableProcessors());
  }

  /**
   * Reduces a measurement.
   *
   * @param measurement what was recorded
   * @param settings the choices
   * @throws UnusableInput when a used pass has no usable ensemble or never moves along its line,
   *     with every such pass
   */
  public Reduction reduce(Measurement measurement, Settings settings) throws UnusableInput {
    return integrate(lay(measurement, settings), settings);
  }

  /**
   * Screens the passes and lays them on their lines.
   *
   * @throws UnusableInput as {@link #reduce}
   */
  public LaidMeasurement lay(Measurement measurement, Settings settings) throws UnusableInput {
    return new PassLayer(measurement, settings, threads).lay();
  }

  /**
   * Integrates laid passes.
   *
   * @param laid passes laid with the same boat velocity, section, depth and screening
   * @param settings the choices of laws, exponent, method and edges
   */
  public Reduction integrate(LaidMeasurement laid, Settings settings) {
    return integrate(laid, settings, Exponents.of(laid, settings.exponent(), threads));
  }

  /**
   * Integrates laid passes with exponents that are known already.
   *
   * @param laid as for the other method
   * @param settings as for the other method; its exponent is not looked at
   * @param exponents the exponent of each laid pass
   */
  public Reduction integrate(LaidMeasurement laid, Settings settings, Exponents exponents) {
    List<Integer> places = IntStream.range(0, laid.passes().size()).boxed().toList();
    List<PassDischarge> passes =
        Workers.map(
            places,
            threads,
            place -> discharge(laid.passes().get(place), settings, exponents.passes().get(place)));
    return new Reduction(laid.measurement(), settings, passes, laid.notes());
  }

  private static PassDischarge discharge(
      LaidPass laid, Settings settings, Exponents.Chosen exponent) {
    Pass pass = laid.pass();
    Section section = laid.section();
    Transports transports =
        Transports.of(section, settings.top(), settings.bottom(), exponent.value());
    int wanted = settings.edgeEnsembles();
    boolean leftFirst = pass.startBank() == Bank.LEFT;
    EdgeEstimate left = EdgeEstimate.of(pass.leftEdge(), leftFirst, section, transports, wanted);
    EdgeEstimate right = EdgeEstimate.of(pass.rightEdge(), !leftFirst, section, transports, wanted);
    ColumnDischarge columns = new ColumnDischarge(section, transports, settings.method());
    ColumnDischarge others = new ColumnDischarge(section, transports, other(settings.method()));
    return new PassDischarge(
        pass,
        columns,
        exponent.value(),
        exponent.fit(),
        zones(columns, left, right),
        zones(others, left, right).total(),
        left,
        right,
        PassGeometry.of(
            columns, distance(pass.leftEdge(), pass.rightEdge()), left.areaM2() + right.areaM2()),
        notes(laid, exponent, transports, wanted));
  }

  private static double distance(Edge left, Edge right) {
    return left.distanceM() + right.distanceM();
  }

  private static ZoneDischarge zones(
      ColumnDischarge columns, EdgeEstimate left, EdgeEstimate right) {
    return new ZoneDischarge(
        columns.sum(Zone.TOP),
        columns.sum(Zone.MEASURED),
        columns.sum(Zone.BOTTOM),
        left.dischargeM3s(),
        right.dischargeM3s());
  }

  private static Method other(Method method) {
    return switch (method) {
      case SECTION_NORMAL -> Method.PATH_FLUX;
      case PATH_FLUX -> Method.SECTION_NORMAL;
    };
  }

  private static List<Note> notes(
      LaidPass laid, Exponents.Chosen exponent, Transports transports, int edgeEnsembles) {
    List<Note> notes = new ArrayList<>(laid.pass().notes());
    notes.addAll(laid.section().pass().notes());
    notes.addAll(exponent.notes());
    if (transports.ownCount() < edgeEnsembles) {
      notes.add(
          new Note(
              Note.Level.CAUTION,
              "few-edge-ensembles",
              "the edges rest on "
                  + transports.ownCount()
                  + " usable ensembles, "
                  + edgeEnsembles
                  + " were wanted"));
    }
    return notes;
  }
}
