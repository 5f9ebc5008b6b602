package org.crossreach.report.chart;

import java.util.function.DoubleUnaryOperator;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;

/**
 * The chosen laws laid through the median profile of a pass: velocity over column mean at a height
 * over depth.
 *
 * @param bins the median profile, with at least one filled layer
 * @param exponent exponent of the power law
 */
record LawCurves(ProfileBins bins, double exponent) {

  private static final int FEWEST_FOR_THREE_POINT = 6;
  private static final double LOWEST_FIFTH = 0.2;

  /** The law near the surface. */
  DoubleUnaryOperator of(TopLaw law) {
    return switch (law) {
      case POWER -> power(0, ProfileBins.LAYERS);
      case CONSTANT -> constant();
      case THREE_POINT -> threePoint();
    };
  }

  /** The law near the bed. */
  DoubleUnaryOperator of(BottomLaw law) {
    return switch (law) {
      case POWER -> power(0, ProfileBins.LAYERS);
      case NO_SLIP -> power(0, lowestFifth());
    };
  }

  /** The power law that carries what the layers carry. */
  private DoubleUnaryOperator power(int from, int to) {
    double carried = 0;
    double divisor = 0;
    for (int layer = from; layer < to; layer++) {
      if (bins.filled(layer)) {
        carried += bins.quantile(layer, 0.5) / ProfileBins.LAYERS;
        divisor += raised(layer + 1) - raised(layer);
      }
    }
    double amplitude = (exponent + 1) * carried / divisor;
    return height -> amplitude * StrictMath.pow(height, exponent);
  }

  /** Height of a layer's lower edge to the power m + 1. */
  private double raised(int layer) {
    return StrictMath.pow((double) layer / ProfileBins.LAYERS, exponent + 1);
  }

  /** One past the last layer of the lowest fifth, or past the lowest filled one. */
  private int lowestFifth() {
    int lowest = 0;
    while (!bins.filled(lowest)) {
      lowest++;
    }
    int end = lowest + 1;
    while (end < ProfileBins.LAYERS && ProfileBins.height(end) <= LOWEST_FIFTH) {
      end++;
    }
    return end;
  }

  private int highest() {
    int highest = ProfileBins.LAYERS - 1;
    while (!bins.filled(highest)) {
      highest--;
    }
    return highest;
  }

  private DoubleUnaryOperator constant() {
    double velocity = bins.quantile(highest(), 0.5);
    return height -> velocity;
  }

  private DoubleUnaryOperator threePoint() {
    int highest = highest();
    if (highest < FEWEST_FOR_THREE_POINT
        || !bins.filled(highest - 1)
        || !bins.filled(highest - 2)) {
      return constant();
    }
    double middle = bins.quantile(highest - 1, 0.5);
    double slope =
        (bins.quantile(highest, 0.5) - bins.quantile(highest - 2, 0.5)) * ProfileBins.LAYERS / 2;
    double mean = (bins.quantile(highest, 0.5) + middle + bins.quantile(highest - 2, 0.5)) / 3;
    return height -> mean + slope * (height - ProfileBins.height(highest - 1));
  }
}
