package org.crossreach.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Vertical laws are scaled to a mean of 1 and integrate as their closed forms. */
class VerticalLawsTest {

  static Stream<VerticalLaw> laws() {
    return Stream.of(
        VerticalLaws.power(0.2),
        VerticalLaws.logarithmic(0.001),
        VerticalLaws.constantAbove(0.2, 0.7),
        VerticalLaws.windAbove(0.2, 0.8, 0.6),
        VerticalLaws.roughBelow(0.15, 0.2, 0.5));
  }

  @ParameterizedTest
  @MethodSource("laws")
  void transportGrowsFromNothingToTheDepth(VerticalLaw law) {
    assertEquals(0, law.below(0, 4), 1e-15);
    assertEquals(4, law.below(4, 4), 1e-12);
    double before = 0;
    for (int i = 1; i <= 400; i++) {
      double here = law.below(i / 100.0, 4);
      assertEquals(before, here, 0.02, "a step in velocity at " + i);
      assertEquals(true, here >= before);
      before = here;
    }
  }

  /** No step in velocity where the pieces of a law meet. */
  @Test
  void piecesJoin() {
    VerticalLaw law = VerticalLaws.roughBelow(0.15, 0.2, 0.5);
    assertEquals(velocity(law, 0.2 - 1e-6), velocity(law, 0.2 + 1e-6), 1e-4);
    VerticalLaw wind = VerticalLaws.windAbove(0.2, 0.8, 0.6);
    assertEquals(velocity(wind, 0.8 - 1e-6), velocity(wind, 0.8 + 1e-6), 1e-4);
    assertEquals(0.6 * velocity(wind, 0.8), velocity(wind, 1 - 1e-7), 1e-4);
  }

  private static double velocity(VerticalLaw law, double share) {
    return (law.below(share + 1e-8, 1) - law.below(share - 1e-8, 1)) / 2e-8;
  }

  /**
   * Validation: log law with friction velocity 0.05 m/s, kappa 0.41, z0 1 mm, depth 5 m: mean
   * 0.916755267 m/s; 0.318085860 m²/s below 0.5 m, 0.516185234 above 4.5 m, to 9 decimals.
   */
  @Test
  void logarithmicLawInItsClosedForm() {
    VerticalLaw law = VerticalLaws.logarithmic(0.001);
    double mean = 0.916755267;
    assertEquals(0.318085860, mean * law.below(0.5, 5), 1e-9);
    assertEquals(3.749505243, mean * (law.below(4.5, 5) - law.below(0.5, 5)), 3e-9);
    assertEquals(0.516185234, mean * (5 - law.below(4.5, 5)), 1e-9);
  }

  /** Validation: power law of 1/6, 5 m: 4.081023338 m²/s from 0.5 to 4.5 m, to 9 decimals. */
  @Test
  void powerLawInItsClosedForm() {
    VerticalLaw law = VerticalLaws.power(1 / 6.0);
    assertEquals(4.081023338, law.below(4.5, 5) - law.below(0.5, 5), 1e-9);
  }
}
