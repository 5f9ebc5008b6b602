package org.crossreach.simulate;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Site;
import org.crossreach.survey.Water;

/**
 * A virtual measurement with its truth.
 *
 * @param recipe what it was made by
 * @param measurement what was recorded; of the facts it holds the instrument only
 * @param truth what the river really carries
 */
public record Simulation(Recipe recipe, Measurement measurement, Truth truth) {

  /** Makes a virtual measurement in memory. */
  public static Simulation run(Recipe recipe) {
    List<Pass> passes = new ArrayList<>();
    List<Map<Fault, BitSet>> struck = new ArrayList<>();
    for (int p = 0; p < recipe.passes(); p++) {
      PassMaker maker = new PassMaker(recipe, p);
      Ensembles ensembles = maker.make();
      struck.add(maker.struck());
      passes.add(
          new Pass(
              passName(p),
              passName(p) + ".csv",
              recipe.fromLeft(p) ? Bank.LEFT : Bank.RIGHT,
              /* used= */ true,
              /* note= */ "",
              new Edge(recipe.boat().leftEdgeM(), recipe.edges().left(), Double.NaN),
              new Edge(recipe.boat().rightEdgeM(), recipe.edges().right(), Double.NaN),
              ensembles,
              List.of()));
    }
    Measurement measurement =
        new Measurement(
            recipe.id(),
            new Site("", "", "", Double.NaN, Double.NaN),
            List.of(),
            "",
            Optional.empty(),
            Optional.empty(),
            new Water(Double.NaN, 0),
            recipe.profiler().instrument(),
            passes,
            List.of(),
            List.of());
    return new Simulation(recipe, measurement, Truth.of(recipe, struck));
  }

  /** Name of a pass, from 0: {@code pass-01} and so on. */
  static String passName(int pass) {
    return String.format(Locale.ROOT, "pass-%02d", pass + 1);
  }
}
