package org.crossreach.screen;

import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_1_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_2_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_3_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_BEAM_4_M;
import static org.crossreach.survey.EnsembleQuantity.DEPTH_VERTICAL_M;

import org.crossreach.settings.DepthSource;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/** Depths below the transducer face as the beams gave them. */
final class BeamDepths {

  private static final EnsembleQuantity[] SLANT = {
    DEPTH_BEAM_1_M, DEPTH_BEAM_2_M, DEPTH_BEAM_3_M, DEPTH_BEAM_4_M
  };

  private BeamDepths() {}

  /**
   * Depth below the face by the chosen beams, or by the others where the chosen ones have none (m).
   *
   * @return one depth per ensemble, NaN where no beam has one
   */
  static double[] chosen(Ensembles ensembles, DepthSource source) {
    double[] depth = new double[ensembles.size()];
    for (int i = 0; i < depth.length; i++) {
      double vertical = ensembles.value(DEPTH_VERTICAL_M, i);
      double slant =
          source == DepthSource.SLANT_INVERSE_DISTANCE
              ? harmonicMean(ensembles, i)
              : mean(ensembles, i);
      double first = source == DepthSource.VERTICAL ? vertical : slant;
      double second = source == DepthSource.VERTICAL ? slant : vertical;
      depth[i] = Double.isNaN(first) ? second : first;
    }
    return depth;
  }

  /**
   * Shallowest valid depth of any beam below the face (m), linear in time where an ensemble has
   * none.
   */
  static double[] shallowest(Ensembles ensembles) {
    double[] depth = new double[ensembles.size()];
    for (int i = 0; i < depth.length; i++) {
      double least = ensembles.value(DEPTH_VERTICAL_M, i);
      for (EnsembleQuantity beam : SLANT) {
        double value = ensembles.value(beam, i);
        if (!(value >= least)) {
          least = Double.isNaN(value) ? least : value;
        }
      }
      depth[i] = least;
    }
    return depth;
  }

  /** Arithmetic mean of the valid slant beams (m), NaN when there is none. */
  private static double mean(Ensembles ensembles, int i) {
    double sum = 0;
    int count = 0;
    for (EnsembleQuantity beam : SLANT) {
      double value = ensembles.value(beam, i);
      if (!Double.isNaN(value)) {
        sum += value;
        count++;
      }
    }
    return count == 0 ? Double.NaN : sum / count;
  }

  /** Inverse-distance weighted mean of the valid slant beams (m), NaN when there is none. */
  private static double harmonicMean(Ensembles ensembles, int i) {
    double sum = 0;
    int count = 0;
    for (EnsembleQuantity beam : SLANT) {
      double value = ensembles.value(beam, i);
      if (!Double.isNaN(value)) {
        sum += 1 / value;
        count++;
      }
    }
    return count == 0 ? Double.NaN : count / sum;
  }
}
