package org.crossreach.profile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.junit.jupiter.api.Test;

/**
 * A river that follows the logarithmic law is not a power law's: what each exponent makes of it.
 *
 * <p>Validation: closed form of the logarithmic law with u* = 0.05 m/s, kappa = 0.41, z0 = 0.001 m
 * in 5 m of water, cells between 0.5 and 4.5 m. Tolerance: half of the last digit given.
 */
class LogLawTest {

  private static final double DEPTH = 5;
  private static final double ROUGHNESS = 0.001;
  private static final double FRICTION = 0.05 / 0.41;

  private static double below(double z) {
    return FRICTION * (z * Math.log(z / ROUGHNESS) - z + ROUGHNESS);
  }

  private final Column column = OneColumn.of(DEPTH, LogLawTest::below);

  private double top(double m) {
    return Laws.top(new PowerLaw(), column, Component.NORMAL, m);
  }

  private double bottom(double m) {
    return Laws.bottom(new PowerLaw(), column, Component.NORMAL, m);
  }

  @Test
  void oneSixthMissesBothZonesTheOppositeWay() {
    assertEquals(0.531350483, top(1 / 6.0), 0.5e-9);
    assertEquals(0.312973974, bottom(1 / 6.0), 0.5e-9);
    double middle = MeasuredZone.throughCells(column, Component.NORMAL);
    assertEquals(3.749505243, middle, 0.5e-9);
    double total = middle + top(1 / 6.0) + bottom(1 / 6.0);
    assertEquals(0.219325, 100 * (total / 4.583776336 - 1), 0.5e-6);
  }

  /** The exponent that recovers the total, 0.197296, is not the one that fits the cells. */
  @Test
  void anotherExponentRecoversTheTotal() {
    double total =
        MeasuredZone.throughCells(column, Component.NORMAL) + top(0.197296) + bottom(0.197296);
    assertEquals(4.583776336, total, 1e-6, "the exponent is rounded");
  }

  /**
   * The straight line through the logarithms of the velocities at the cells' centres has the slope
   * 0.134147, far from what recovers the total.
   */
  @Test
  void logarithmsOfTheVelocitiesHaveAnotherSlope() {
    double meanX = 0;
    double meanY = 0;
    for (int j = 0; j < column.size(); j++) {
      meanX += Math.log(column.centreM(j)) / column.size();
      meanY += Math.log(velocity(j)) / column.size();
    }
    double product = 0;
    double square = 0;
    for (int j = 0; j < column.size(); j++) {
      double x = Math.log(column.centreM(j)) - meanX;
      product += x * (Math.log(velocity(j)) - meanY);
      square += x * x;
    }
    assertEquals(0.134147, product / square, 0.5e-6);
  }

  private double velocity(int j) {
    return FRICTION * Math.log(column.centreM(j) / ROUGHNESS);
  }
}
