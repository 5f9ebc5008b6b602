package org.crossreach.simulate;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;

/**
 * What a virtual river really carries.
 *
 * @param dischargeM3s discharge, mean over the durations of the passes (m³/s)
 * @param leftEdgeM3s of it between the left edge of the water and the boat's turning point (m³/s)
 * @param rightEdgeM3s of it between the right edge of the water and the boat's turning point (m³/s)
 * @param widthM width of the water surface (m)
 * @param areaM2 area of the section (m²)
 * @param passes the truth of each pass
 */
public record Truth(
    double dischargeM3s,
    double leftEdgeM3s,
    double rightEdgeM3s,
    double widthM,
    double areaM2,
    List<PassTruth> passes) {

  public Truth {
    passes = List.copyOf(passes);
  }

  /**
   * The truth of one pass.
   *
   * @param name name of the pass
   * @param dischargeM3s discharge, mean over the duration of the pass (m³/s)
   * @param struck the samples that each fault struck: ensemble numbers from 0, or {@code ensemble x
   *     cells + cell} for faults of cells
   */
  public record PassTruth(String name, double dischargeM3s, Map<Fault, BitSet> struck) {

    public PassTruth {
      struck = Map.copyOf(struck);
    }
  }

  /** The truth of a recipe, by quadrature of its functions. */
  static Truth of(Recipe recipe, List<Map<Fault, BitSet>> struck) {
    River river = recipe.river();
    double left = river.bed().firstM();
    double right = river.bed().lastM();
    double whole = river.dischargeM3s(left, right);
    double factorSum = 0;
    List<PassTruth> passes = new ArrayList<>();
    for (int pass = 0; pass < recipe.passes(); pass++) {
      double from = recipe.passStartS(pass);
      double factor = river.time().mean(from, from + recipe.durationS());
      factorSum += factor;
      passes.add(new PassTruth(Simulation.passName(pass), whole * factor, struck.get(pass)));
    }
    double factor = factorSum / recipe.passes();
    return new Truth(
        whole * factor,
        factor * river.dischargeM3s(left, left + recipe.boat().leftEdgeM()),
        factor * river.dischargeM3s(right - recipe.boat().rightEdgeM(), right),
        river.widthM(),
        river.areaM2(left, right),
        passes);
  }
}
