package org.crossreach.profile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The power law through the cells gives at every depth the velocity that the closed form does.
 *
 * <p>Validation: {@code u/U = (m + 1) (z/H)^m} at the depths of the point methods of ISO 748, and
 * the mean of two and of three points there. The table is derived from that formula; tolerance is
 * half of its last digit.
 */
class PowerLawRatiosTest {

  private static final double DEPTH = 5;
  private static final double HALF_OF_LAST_DIGIT = 0.5e-6;

  @ParameterizedTest(name = "m = 1/{0}")
  @CsvSource({
    "4, 0.800000, 0.590400, 0.994088, 1.009051, 1.001570, 1.182177, 0.845897, 1.051121",
    "5, 0.833333, 0.598122, 0.999064, 1.008679, 1.003872, 1.147623, 0.871366, 1.044661",
    "6, 0.857143, 0.603431, 1.001437, 1.008127, 1.004782, 1.124075, 0.889621, 1.039382",
    "7, 0.875000, 0.607304, 1.002636, 1.007556, 1.005096, 1.107000, 0.903342, 1.035113",
    "8, 0.888889, 0.610256, 1.003252, 1.007020, 1.005136, 1.094054, 0.914032, 1.031630",
    "10, 0.909091, 0.614457, 1.003688, 1.006100, 1.004894, 1.075726, 0.929605, 1.026336",
    "12, 0.923077, 0.617303, 1.003692, 1.005367, 1.004529, 1.063375, 0.940402, 1.022531",
  })
  void followsTheClosedForm(
      double inverse,
      double surfaceFactor,
      double depthOfMean,
      double at6,
      double twoPoint,
      double threePoint,
      double at2,
      double inverseAt2,
      double at5) {
    double m = 1 / inverse;
    Column column = OneColumn.of(DEPTH, z -> DEPTH * Math.pow(z / DEPTH, m + 1));
    assertEquals(surfaceFactor, 1 / velocity(column, m, 0), HALF_OF_LAST_DIGIT);
    assertEquals(1, velocity(column, m, depthOfMean), 2e-6, "the depth is rounded");
    assertEquals(at6, velocity(column, m, 0.6), HALF_OF_LAST_DIGIT);
    assertEquals(at2, velocity(column, m, 0.2), HALF_OF_LAST_DIGIT);
    assertEquals(inverseAt2, 1 / velocity(column, m, 0.2), HALF_OF_LAST_DIGIT);
    assertEquals(at5, velocity(column, m, 0.5), HALF_OF_LAST_DIGIT);
    double two = (velocity(column, m, 0.2) + velocity(column, m, 0.8)) / 2;
    assertEquals(twoPoint, two, HALF_OF_LAST_DIGIT);
    assertEquals(threePoint, (two + velocity(column, m, 0.6)) / 2, HALF_OF_LAST_DIGIT);
  }

  /** Velocity over depth-mean velocity, as the transport through a thin layer. */
  private static double velocity(Column column, double m, double depthShare) {
    double height = DEPTH * (1 - depthShare);
    double half = 1e-4;
    return new PowerLaw().transport(column, Component.NORMAL, m, height - half, height + half)
        / (2 * half);
  }
}
