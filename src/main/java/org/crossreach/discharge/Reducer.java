package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.crossreach.profile.Transports;
import org.crossreach.profile.VerticalChoice;
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
    return integrate(
            laid, List.of(settings), List.of(Exponents.of(laid, settings.exponent(), threads)))
        .get(0);
  }

  /**
   * Integrates laid passes by several choices at once, which costs little more than one.
   *
   * @param laid as for the other method
   * @param choices as for the other method; their exponents are not looked at
   * @param exponents for each of the choices the exponents of the laid passes
   * @return a reduction for each of the choices, in their order
   */
  public List<Reduction> integrate(
      LaidMeasurement laid, List<Settings> choices, List<Exponents> exponents) {
    List<Integer> places = IntStream.range(0, laid.passes().size()).boxed().toList();
    List<List<PassDischarge>> byPass =
        Workers.map(
            places,
            threads,
            place -> discharges(laid.passes().get(place), place, choices, exponents));
    List<Reduction> reductions = new ArrayList<>();
    for (int choice = 0; choice < choices.size(); choice++) {
      List<PassDischarge> passes = new ArrayList<>();
      for (List<PassDischarge> pass : byPass) {
        passes.add(pass.get(choice));
      }
      reductions.add(new Reduction(laid.measurement(), choices.get(choice), passes, laid.notes()));
    }
    return reductions;
  }

  private static List<PassDischarge> discharges(
      LaidPass laid, int place, List<Settings> choices, List<Exponents> exponents) {
    List<VerticalChoice> verticals = new ArrayList<>();
    for (int choice = 0; choice < choices.size(); choice++) {
      Settings settings = choices.get(choice);
      verticals.add(
          new VerticalChoice(
              settings.top(),
              settings.bottom(),
              exponents.get(choice).passes().get(place).value()));
    }
    List<Transports> transports = Transports.all(laid.section(), verticals);
    List<PassDischarge> discharges = new ArrayList<>();
    for (int choice = 0; choice < choices.size(); choice++) {
      discharges.add(
          discharge(
              laid,
              choices.get(choice),
              exponents.get(choice).passes().get(place),
              transports.get(choice)));
    }
    return discharges;
  }

  private static PassDischarge discharge(
      LaidPass laid, Settings settings, Exponents.Chosen exponent, Transports transports) {
    Pass pass = laid.pass();
    Section section = laid.section();
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
