package org.crossreach.profile;

import java.util.function.DoubleUnaryOperator;
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
   * A function for the optimiser. A class of its own, since lambdas of an interface that was
   * compiled for a very old Java break the archive of classes with which the program starts.
   */
  private record Objective(DoubleUnaryOperator function) implements UnivariateFunction {
    @Override
    public double value(double exponent) {
      return function.applyAsDouble(exponent);
    }
  }

  /**
   * The place of the only top of a function.
   *
   * @param function what is to be large
   * @param lowest where the search begins
   * @param highest where it ends; one of the two ends when the function has no top between
   */
  static double top(DoubleUnaryOperator function, double lowest, double highest) {
    return new BrentOptimizer(ACCURACY, ACCURACY)
        .optimize(
            new MaxEval(MOST_EVALUATIONS),
            GoalType.MAXIMIZE,
            new UnivariateObjectiveFunction(new Objective(function)),
            new SearchInterval(lowest, highest))
        .getPoint();
  }
}
