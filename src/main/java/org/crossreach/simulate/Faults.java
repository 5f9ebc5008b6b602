package org.crossreach.simulate;

import java.util.Map;

/**
 * How often samples go wrong.
 *
 * @param rates share of ensembles or cells that each fault strikes (0.05 = 5 %); absent is 0
 * @param spikeMps size of a spike of velocity (m/s)
 * @param sideLobes whether cells below the side-lobe limit carry the bed's own velocity
 * @param badBeam number of a beam that measures nothing, 1 to 4; 0 for none
 */
public record Faults(Map<Fault, Double> rates, double spikeMps, boolean sideLobes, int badBeam) {

  /** Nothing goes wrong. */
  public static final Faults NONE = new Faults(Map.of(), 1, false, 0);

  public Faults {
    rates = Map.copyOf(rates);
  }

  /** Share of ensembles or cells that a fault strikes. */
  double rate(Fault fault) {
    return rates.getOrDefault(fault, 0.0);
  }
}
