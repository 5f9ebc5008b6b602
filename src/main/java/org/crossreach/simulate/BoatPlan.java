package org.crossreach.simulate;

import org.apache.commons.math3.util.FastMath;

/**
 * How the boat crosses: held still, then across with changing speed and a wobble, then held still.
 *
 * @param ensembleS time between ensembles (s)
 * @param ensembles number of ensembles while the boat moves
 * @param holdEnsembles number of ensembles while it is held at each bank
 * @param speedChange how much the speed changes along the way, as a share of its mean (0.2 = 20 %)
 * @param wobbleM largest departure from the straight way, up- and downstream (m)
 * @param wobbles number of wobbles along the way
 * @param leftEdgeM distance from the left edge of the water at which the boat turns (m)
 * @param rightEdgeM distance from the right edge of the water at which the boat turns (m)
 */
public record BoatPlan(
    double ensembleS,
    int ensembles,
    int holdEnsembles,
    double speedChange,
    double wobbleM,
    double wobbles,
    double leftEdgeM,
    double rightEdgeM) {

  /** Number of ensembles of a pass; the first one has no displacement. */
  int size() {
    return 1 + holdEnsembles + ensembles + holdEnsembles;
  }

  /** Share of the way done at the end of an ensemble, 0 to 1, as if from the left bank. */
  private double shareAt(double ensemble) {
    double s = FastMath.max(0, FastMath.min(1, (ensemble - holdEnsembles) / ensembles));
    double w = 2 * FastMath.PI;
    return s - speedChange * FastMath.sin(w * s) / w;
  }

  /** Station of the boat at the end of an ensemble (m). */
  double stationM(River river, boolean fromLeft, double ensemble) {
    double left = river.bed().firstM() + leftEdgeM;
    double right = river.bed().lastM() - rightEdgeM;
    double share = shareAt(ensemble);
    return fromLeft ? left + share * (right - left) : right + share * (left - right);
  }

  /** Distance of the boat downstream of the section at the end of an ensemble (m). */
  double downstreamM(double ensemble) {
    double share = shareAt(ensemble);
    return wobbleM
        * FastMath.sin(2 * FastMath.PI * wobbles * share)
        * FastMath.sin(FastMath.PI * share);
  }
}
