package org.crossreach.discharge;

import static org.crossreach.discharge.Crossing.edge;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.crossreach.settings.Method;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * A crossing of a channel of simple shape gives the discharge of its closed form.
 *
 * <p>Validation: the values follow from integrating the power law over the section's shape.
 */
class WholeTransectTest {

  /**
   * A rectangle of 100 m by 5 m at 1 m/s from station 2 to 98: middle 391.778240, top 55.519740,
   * bottom 32.702020 m³/s, edges of 2 m at a wall 9.1 m³/s each. Values are printed to six
   * decimals.
   */
  @ParameterizedTest
  @EnumSource(Method.class)
  void rectangleWithWalls(Method method) throws Exception {
    PassDischarge pass =
        new Crossing(x -> 5, x -> 1)
            .hold(2, 0, 10)
            .go(2, 0, 98, 0, 96)
            .hold(98, 0, 10)
            .reduce(Bank.LEFT, edge(2, Edge.WALL), edge(2, Edge.WALL), with(method));
    assertEquals(391.778240, pass.zones().measured(), 1e-6);
    assertEquals(55.519740, pass.zones().top(), 1e-6);
    assertEquals(32.702020, pass.zones().bottom(), 1e-6);
    assertEquals(9.1, pass.zones().leftEdge(), 1e-9);
    assertEquals(9.1, pass.zones().rightEdge(), 1e-9);
    assertEquals(498.2, pass.totalM3s(), 1e-8);
    assertEquals(100, pass.geometry().widthM(), 1e-9);
    assertEquals(500, pass.geometry().areaM2(), 1e-9);
    assertEquals(498.2 / 500, pass.meanVelocityMps(), 1e-10);
    assertEquals(0, pass.geometry().flowAzimuthDeg(), 1e-9);
    assertEquals(90, pass.section().line().azimuthDeg(), 1e-9);
  }

  /**
   * A V-shape of 100 m by 5 m whose depth-mean velocity follows {@code (d/5)^(2/3)}: 187.5 m³/s, of
   * which 1.282482 in each edge of 10 m; the coefficient 0.3535 makes 1.208953 of that. The middle
   * is a midpoint sum over 400 strips: better than 1e-4 of it.
   */
  @ParameterizedTest
  @CsvSource({"LEFT", "RIGHT"})
  void triangleWithSlopingEdges(Bank start) throws Exception {
    Crossing crossing =
        new Crossing(
            x -> x < 50 ? x / 10 : (100 - x) / 10,
            x -> Math.pow((x < 50 ? x : 100 - x) / 50, 2 / 3.0));
    double from = start == Bank.LEFT ? 10 : 90;
    PassDischarge pass =
        crossing
            .hold(from, 0, 10)
            .go(from, 0, 100 - from, 0, 400)
            .hold(100 - from, 0, 10)
            .reduce(start, edge(10, Edge.SLOPING), edge(10, Edge.SLOPING));
    assertEquals(1.208953, pass.zones().leftEdge(), 1e-6);
    assertEquals(1.208953, pass.zones().rightEdge(), 1e-6);
    assertEquals(187.5 - 2 * 1.282482, pass.totalM3s() - 2 * 1.208953, 1e-4 * 187.5);
    assertEquals(100, pass.geometry().widthM(), 1e-9);
    assertEquals(250, pass.geometry().areaM2(), 1e-3);
  }

  /** Edge of 10 m, 1 m deep, 0.341995 m/s; Simpson and Oltmann 1993 (from memory): 1.208953. */
  @ParameterizedTest
  @CsvSource({"0.3535,1.208953", "0.91,3.112155", "0.5,1.709975"})
  void edgeIsCoefficientTimesVelocityDepthAndDistance(double coefficient, double discharge)
      throws Exception {
    PassDischarge pass =
        new Crossing(x -> 1, x -> 0.341995)
            .hold(10, 0, 12)
            .go(10, 0, 30, 0, 20)
            .reduce(Bank.LEFT, edge(10, coefficient), edge(0, Edge.WALL));
    assertEquals(discharge, pass.zones().leftEdge(), 1e-6);
    assertEquals(0, pass.zones().rightEdge());
  }

  @ParameterizedTest
  @EnumSource(Bank.class)
  void givenEdgeDischargeIsTakenAsItIs(Bank start) throws Exception {
    PassDischarge pass =
        new Crossing(x -> 3, x -> 1)
            .go(10, 0, 30, 0, 20)
            .reduce(start, new Edge(2, Double.NaN, 0.7), new Edge(3, Double.NaN, -0.2));
    assertEquals(0.7, pass.zones().leftEdge());
    assertEquals(-0.2, pass.zones().rightEdge());
  }

  private static Settings with(Method method) {
    return Settings.defaults().withScreening(Screening.off()).withMethod(method);
  }
}
