package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Four slant beams of any layout give the components that made them, an error velocity that only
 * disagreement makes, and three of them still give the components.
 *
 * <p>Validation: geometry of four crossed beams, worked out independently in double precision and
 * printed to nine decimals, there with beams 1 and 2 to starboard and port, 3 and 4 forward and
 * backward and radial velocities positive AWAY from the face; noise gains printed to six decimals.
 * Source of the formulas: Lu and Lueck 1999, Journal of Atmospheric and Oceanic Technology 16,
 * 1556; Gilcoto and others 2009, the same journal 26, 2642 (both from memory).
 */
class BeamLayoutTest {

  /** Half the ninth decimal, through the gain of a horizontal component at 20 degrees, 2.07. */
  private static final double NINE_DECIMALS = 2e-9;

  private static final List<Double> CROSSED = List.of(90.0, 270.0, 0.0, 180.0);

  @ParameterizedTest
  @CsvSource({
    "20, 0.295035512, -0.389004774, -0.217994703, 0.124025441",
    "25, 0.377302872, -0.467933651, -0.256624520, 0.165993742",
    "30, 0.456698730, -0.543301270, -0.293301270, 0.206698730"
  })
  void solvesTheVectorsOfCrossedBeams(
      double angle, double away1, double away2, double away3, double away4) {
    double[] v = solve(new BeamLayout(angle, CROSSED), -1, -away1, -away2, -away3, -away4);
    assertEquals(1.0, v[0], NINE_DECIMALS);
    assertEquals(-0.5, v[1], NINE_DECIMALS);
    assertEquals(0.05, v[2], NINE_DECIMALS);
    assertEquals(0, v[3], NINE_DECIMALS);
  }

  @Test
  void showsAnErrorOfOneBeamAndForgetsItWithoutThatBeam() {
    BeamLayout layout = new BeamLayout(20, CROSSED);
    double wrong = -(-0.389004774 + 0.05);
    double[] all = solve(layout, -1, -0.295035512, wrong, 0.217994703, -0.124025441);
    assertEquals(0.926904890, all[0], NINE_DECIMALS);
    assertEquals(-0.5, all[1], NINE_DECIMALS);
    assertEquals(0.036697778, all[2], NINE_DECIMALS);
    assertEquals(0.051686048, Math.abs(all[3]), NINE_DECIMALS);

    double[] three = solve(layout, 1, -0.295035512, wrong, 0.217994703, -0.124025441);
    assertEquals(1.0, three[0], NINE_DECIMALS);
    assertEquals(-0.5, three[1], NINE_DECIMALS);
    assertEquals(0.05, three[2], NINE_DECIMALS);
    assertTrue(Double.isNaN(three[3]), "three beams have no error velocity");
  }

  @ParameterizedTest
  @CsvSource({
    "20, 2.067442, 0.532089, 3.580914",
    "25, 1.673157, 0.551689, 2.897993",
    "30, 1.414214, 0.577350, 2.449490"
  })
  void errorVelocityIsAsNoisyAsAHorizontalComponent(
      double angle, double horizontal, double vertical, double threeBeam) {
    BeamLayout layout = new BeamLayout(angle, CROSSED);
    double[] gain = gains(layout, -1);
    assertEquals(horizontal, gain[0], 0.5e-6);
    assertEquals(horizontal, gain[1], 0.5e-6);
    assertEquals(vertical, gain[2], 0.5e-6);
    assertEquals(horizontal, gain[3], 0.5e-6);
    assertEquals(threeBeam, gains(layout, 1)[0], 0.5e-6);
  }

  /** Standard deviation of each component for beams of standard deviation 1. */
  private static double[] gains(BeamLayout layout, int left) {
    double[] squares = new double[4];
    for (int b = 0; b < 4; b++) {
      if (b != left) {
        double[] unit = new double[4];
        unit[b] = 1;
        double[] response = solve(layout, left, unit);
        for (int c = 0; c < 4; c++) {
          squares[c] += response[c] * response[c];
        }
      }
    }
    for (int c = 0; c < 4; c++) {
      squares[c] = Math.sqrt(squares[c]);
    }
    return squares;
  }

  @Test
  void undoesEveryLayoutWithAndWithoutEachBeam() {
    Random random = new Random(20);
    for (int trial = 0; trial < 200; trial++) {
      double angle = 15 + 20 * random.nextDouble();
      double turn = 360 * random.nextDouble();
      double[] azimuths = new double[4];
      for (int b = 0; b < 4; b++) {
        azimuths[b] = turn + 90 * b + 30 * random.nextDouble();
      }
      BeamLayout layout =
          new BeamLayout(angle, List.of(azimuths[0], azimuths[1], azimuths[2], azimuths[3]));
      double[] v = {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()};
      double[] towards = towards(angle, azimuths, v);
      for (int left = -1; left < 4; left++) {
        double[] solved = solve(layout, left, towards);
        for (int c = 0; c < 3; c++) {
          // Least squares of 20 degree beams lose three digits at the most.
          assertEquals(v[c], solved[c], 1e-12, "component " + c + " without beam " + left);
        }
        assertEquals(left < 0 ? 0 : Double.NaN, solved[3], 1e-12);
      }
    }
  }

  private static double[] towards(double angleDeg, double[] azimuthsDeg, double[] v) {
    double t = Math.toRadians(angleDeg);
    double[] radial = new double[4];
    for (int b = 0; b < 4; b++) {
      double a = Math.toRadians(azimuthsDeg[b]);
      radial[b] =
          -(Math.sin(t) * Math.sin(a) * v[0]
              + Math.sin(t) * Math.cos(a) * v[1]
              - Math.cos(t) * v[2]);
    }
    return radial;
  }

  @Test
  void hasNothingToSayWithTwoBeamsMissing() {
    double[] v = solve(new BeamLayout(20, CROSSED), 0, Double.NaN, Double.NaN, 0.1, 0.2);
    for (double component : v) {
      assertTrue(Double.isNaN(component));
    }
  }

  @Test
  void refusesBeamsThatDoNotSpanTheAxes() {
    assertThrows(
        IllegalArgumentException.class, () -> new BeamLayout(20, List.of(0.0, 180.0, 0.0, 180.0)));
    assertThrows(IllegalArgumentException.class, () -> new BeamLayout(0, CROSSED));
    assertThrows(IllegalArgumentException.class, () -> new BeamLayout(20, List.of(0.0, 90.0)));
  }

  private static double[] solve(BeamLayout layout, int left, double... beams) {
    double[][] rows = new double[4][];
    for (int b = 0; b < 4; b++) {
      rows[b] = new double[] {beams[b]};
    }
    layout.solve(rows[0], rows[1], rows[2], rows[3], 1, left);
    return new double[] {rows[0][0], rows[1][0], rows[2][0], rows[3][0]};
  }
}
