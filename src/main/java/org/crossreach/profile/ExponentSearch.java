package org.crossreach.profile;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds the exponent at which something is largest, by Brent's method.
 *
 * <p>Near its top a function is known to about the square root of the rounding error, so that an
 * exponent is found to 1e-7 or so of itself at best.
 */
final class ExponentSearch {

  private static final double ACCURACY = 1e-9;
  private static final int MOST_EVALUATIONS = 300;

  private ExponentSearch() {}

  /**
   * The place of the only top of a function.
   *
   * @param function what is to be large
   * @param lowest where the search begins
   * @param highest where it ends; one of the two ends when the function has no top between
   */
  static double top(UnivariateFunction function, double lowest, double highest) {
    return new BrentOptimizer(ACCURACY, ACCURACY)
        .optimize(
            new MaxEval(MOST_EVALUATIONS),
            GoalType.MAXIMIZE,
            new UnivariateObjectiveFunction(function),
            new SearchInterval(lowest, highest))
        .getPoint();
  }
}
