package org.crossreach.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.settings.Exponent;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Method;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.Simulation;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Without noise, and with banks that obey their coefficients, every pass of a virtual river gives
 * its exact discharge within 0.05 %, from either bank, with the default screens on.
 *
 * <p>Validation: the exact discharge is a quadrature of the river's functions, not of the samples.
 */
class ExactDischargeTest {

  private static final double WITHIN = 0.0005;

  @ParameterizedTest
  @CsvSource({"0,0", "0,4", "10,2", "-20,4", "30,4", "-30,0"})
  void sectionNormalWithAnySkewAndWobble(double skew, double wobble) throws Exception {
    assertExact(
        new Rivers().skew(skew).wobble(wobble).recipe(),
        Settings.defaults().withMethod(Method.SECTION_NORMAL),
        WITHIN);
  }

  /**
   * A field without skew obeys continuity for a wobbling path, one with skew for a straight one.
   */
  @ParameterizedTest
  @CsvSource({"0,0", "0,4", "20,0", "-30,0"})
  void pathFluxOnFieldsThatObeyContinuity(double skew, double wobble) throws Exception {
    assertExact(
        new Rivers().skew(skew).wobble(wobble).recipe(),
        Settings.defaults().withMethod(Method.PATH_FLUX),
        WITHIN);
  }

  @Test
  void constantTopOverConstantWater() throws Exception {
    assertExact(
        new Rivers()
            .vertical(
                "{\"law\": \"constant-above\", \"exponent\": 0.16666666666666667, \"share\": 0.6}")
            .recipe(),
        Settings.defaults().withTop(TopLaw.CONSTANT),
        0.003);
  }

  /**
   * Log law over z0 = 1 mm in 5 m of water, measured from 0.5 to 4.5 m above the bed: the exponent
   * 0.197296 recovers the total (derived from the two laws' integrals).
   */
  @Test
  void logLawWithTheExponentThatIsRightForTheTotal() throws Exception {
    assertExact(
        new Rivers()
            .canal()
            .vertical("{\"law\": \"logarithmic\", \"roughness_m\": 0.001}")
            .recipe(),
        Settings.defaults().withExponent(new Exponent(ExponentRule.FIXED, 0.197296)),
        0.003);
  }

  private static void assertExact(Recipe recipe, Settings settings, double share) throws Exception {
    Simulation simulation = Simulation.run(recipe);
    double exact = simulation.truth().dischargeM3s();
    for (PassDischarge pass : new Reducer(1).reduce(simulation.measurement(), settings).passes()) {
      assertEquals(exact, pass.totalM3s(), share * exact, pass.pass().startBank().name());
      assertEquals(simulation.truth().areaM2(), pass.geometry().areaM2(), 0.05 * exact, "area");
      assertEquals(simulation.truth().widthM(), pass.geometry().widthM(), 1e-5, "width");
    }
  }
}
