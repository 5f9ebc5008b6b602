package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Site;
import org.crossreach.survey.UnusableInput;
import org.crossreach.survey.Water;

/**
 * A hand-made crossing of a river that flows north: stations run east from the left bank, velocity
 * follows a power law with exponent 1/6, draft, blank and cells are 0.25 m each, 20 degree beams.
 */
final class Crossing {

  static final double DRAFT_M = 0.25;
  private static final double CELL_M = 0.25;
  private static final double FIRST_CELL_M = 0.375;
  private static final double EXPONENT = 1 / 6.0;

  /** A quantity by station (m from the left bank). */
  interface ByStation {
    double at(double stationM);
  }

  private final ByStation depthM;
  private final ByStation meanVelocityMps;
  private final List<double[]> path = new ArrayList<>();

  Crossing(ByStation depthM, ByStation meanVelocityMps) {
    this.depthM = depthM;
    this.meanVelocityMps = meanVelocityMps;
  }

  /**
   * The boat goes straight from one place to another in some steps of one second; places are
   * station and distance downstream (m).
   */
  Crossing go(double fromX, double fromY, double toX, double toY, int steps) {
    if (path.isEmpty()) {
      path.add(new double[] {fromX, fromY});
    }
    for (int s = 1; s <= steps; s++) {
      double share = (double) s / steps;
      path.add(new double[] {fromX + share * (toX - fromX), fromY + share * (toY - fromY)});
    }
    return this;
  }

  /** The boat is held where it is for some ensembles. */
  Crossing hold(double x, double y, int steps) {
    return go(x, y, x, y, steps);
  }

  Ensembles ensembles() {
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i < path.size(); i++) {
      double[] here = path.get(i);
      double[] before = path.get(Math.max(0, i - 1));
      all.add(ensemble(i, here[0] - before[0], here[1] - before[1], (here[0] + before[0]) / 2));
    }
    return Ensemble.record(all);
  }

  private Ensemble ensemble(int i, double boatEast, double boatNorth, double station) {
    double depth = depthM.at(station);
    double mean = meanVelocityMps.at(station);
    double[] east = new double[40];
    double[] north = new double[40];
    for (int k = 0; k < north.length; k++) {
      double upper = depth - DRAFT_M - FIRST_CELL_M + CELL_M / 2 - k * CELL_M;
      double lower = upper - CELL_M;
      north[k] =
          lower < 0
              ? Double.NaN
              : mean
                  * depth
                  * (Math.pow(upper / depth, EXPONENT + 1) - Math.pow(lower / depth, EXPONENT + 1))
                  / CELL_M;
      east[k] = Double.isNaN(north[k]) ? Double.NaN : 0;
    }
    return new Ensemble(i, boatEast, boatNorth, depth - DRAFT_M, FIRST_CELL_M, CELL_M, east, north);
  }

  PassDischarge reduce(Bank start, Edge left, Edge right) throws UnusableInput {
    return reduce(start, left, right, Settings.defaults().withScreening(Screening.off()));
  }

  PassDischarge reduce(Bank start, Edge left, Edge right, Settings settings) throws UnusableInput {
    return reduce(ensembles(), start, left, right, settings);
  }

  static PassDischarge reduce(
      Ensembles ensembles, Bank start, Edge left, Edge right, Settings settings)
      throws UnusableInput {
    Pass pass =
        new Pass("pass-01", "pass-01.csv", start, true, "", left, right, ensembles, List.of());
    return new Reducer(1).reduce(measurement(List.of(pass)), settings).passes().get(0);
  }

  static Measurement measurement(List<Pass> passes) {
    return new Measurement(
        "hand-made",
        new Site("", "", "", Double.NaN, Double.NaN),
        List.of(),
        "",
        Optional.empty(),
        Optional.empty(),
        new Water(Double.NaN, 0),
        new Instrument("", 1200, 20, List.of(), DRAFT_M, Double.NaN, 0, 0),
        passes,
        List.of(),
        List.of());
  }

  static Edge edge(double distanceM, double coefficient) {
    return new Edge(distanceM, coefficient, Double.NaN);
  }
}
