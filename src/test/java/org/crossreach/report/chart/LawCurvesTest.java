package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.discharge.PassDischarge;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;
import org.junit.jupiter.api.Test;

/**
 * Where the water follows the power law, so do the medians and the curves drawn through them.
 *
 * <p>Closed form: u/U = (m + 1)(z/H)^m.
 */
class LawCurvesTest {

  private static final double EXPONENT = 1 / 6.0;

  private static ProfileBins bins() throws Exception {
    PassDischarge pass = new River(300, 24, 0, 1).result().reduction().passes().get(0);
    return ProfileBins.of(pass);
  }

  private static double law(double height) {
    return (EXPONENT + 1) * Math.pow(height, EXPONENT);
  }

  @Test
  void findsTheLawInTheMedians() throws Exception {
    ProfileBins bins = bins();
    int filled = 0;
    for (int layer = 0; layer < ProfileBins.LAYERS; layer++) {
      if (bins.filled(layer)) {
        // Half a layer's height moves the law by 1 % in the lowest filled layer.
        assertEquals(law(ProfileBins.height(layer)), bins.quantile(layer, 0.5), 0.02);
        assertTrue(bins.quantile(layer, 0.25) <= bins.quantile(layer, 0.75));
        filled++;
      }
    }
    assertTrue(filled > 10, "only " + filled);
  }

  @Test
  void drawsThePowerLawToSurfaceAndBed() throws Exception {
    LawCurves curves = new LawCurves(bins(), EXPONENT);
    for (double height = 0.01; height <= 1; height += 0.01) {
      assertEquals(law(height), curves.of(TopLaw.POWER).applyAsDouble(height), 0.01);
      assertEquals(law(height), curves.of(BottomLaw.POWER).applyAsDouble(height), 0.01);
      assertEquals(law(height), curves.of(BottomLaw.NO_SLIP).applyAsDouble(height), 0.02);
    }
  }

  @Test
  void drawsTheConstantLawUpright() throws Exception {
    LawCurves curves = new LawCurves(bins(), EXPONENT);
    double high = curves.of(TopLaw.CONSTANT).applyAsDouble(1);
    assertEquals(high, curves.of(TopLaw.CONSTANT).applyAsDouble(0.8));
    assertEquals(law(0.87), high, 0.02);
  }

  @Test
  void drawsTheThreePointLawStraight() throws Exception {
    var law = new LawCurves(bins(), EXPONENT).of(TopLaw.THREE_POINT);
    assertEquals(
        law.applyAsDouble(0.95), (law.applyAsDouble(0.9) + law.applyAsDouble(1)) / 2, 1e-9);
    assertEquals(law(1), law.applyAsDouble(1), 0.03);
  }

  @Test
  void knowsHowFarTheCellsReach() throws Exception {
    ProfileBins bins = bins();
    assertTrue(bins.meanTop() > 0.7 && bins.meanTop() < 1);
    assertTrue(bins.meanBottom() > 0 && bins.meanBottom() < 0.2);
  }
}
