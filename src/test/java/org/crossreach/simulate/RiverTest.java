package org.crossreach.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The exact discharge of a river is that of the closed form of its section.
 *
 * <p>Validation: sections of 100 m by 5 m whose depth-mean velocity follows {@code (d/5)^p};
 * V-shape {@code B H/(p+2)}, trapezoid with 60 m of bottom {@code 60 H + 8 H^2/(p+2)}; printed to 9
 * decimals.
 */
class RiverTest {

  @ParameterizedTest
  @CsvSource({
    "50,0,250", "50,0.16666666666666667,230.769230769", "50,0.5,200",
        "50,0.66666666666666667,187.5",
    "20,0,400", "20,0.16666666666666667,392.307692308", "20,0.5,380", "20,0.66666666666666667,375"
  })
  void dischargeOfSimpleSections(double bankWidth, double p, double discharge) {
    River river = river(bankWidth, p);
    assertEquals(discharge, river.dischargeM3s(0, 100), 0.5e-9);
    assertEquals(5 * (100 - bankWidth), river.areaM2(0, 100), 1e-9);
  }

  /** The edge of 10 m of the V-shape with p = 2/3: 1.282482, printed to six decimals. */
  @ParameterizedTest
  @CsvSource({"0,10", "90,100"})
  void dischargeOfAnEdge(double from, double to) {
    assertEquals(1.282482, river(50, 2 / 3.0).dischargeM3s(from, to), 0.5e-6);
  }

  /** Whatever the distance of the boat, the edge's coefficient is exact. */
  @ParameterizedTest
  @CsvSource({"0.5", "3", "9.9"})
  void bankLawsObeyTheirCoefficients(double distance) {
    River slope = river(new BankLaw(10, BankLaw.sloping(10, 0.3535).exponent()), 0);
    double atBoat = slope.meanVelocityMps(distance) * slope.depthM(distance) * distance;
    assertEquals(0.3535, slope.dischargeM3s(0, distance) / atBoat, 1e-9);
    River wall = river(BankLaw.wall(10, 0.91), 5);
    double beside = wall.meanVelocityMps(distance) * wall.depthM(distance) * distance;
    assertEquals(0.91, wall.dischargeM3s(0, distance) / beside, 1e-9);
  }

  private static River river(double bankWidth, double p) {
    return new River(
        90,
        new Polyline(
            List.of(
                new Polyline.Point(0, 0),
                new Polyline.Point(bankWidth, 5),
                new Polyline.Point(100 - bankWidth, 5),
                new Polyline.Point(100, 0))),
        new Polyline(List.of(new Polyline.Point(0, 1), new Polyline.Point(100, 1))),
        new BankLaw(bankWidth, p),
        new BankLaw(bankWidth, p),
        VerticalLaws.power(1 / 6.0),
        0,
        TimeFactor.STEADY);
  }

  private static River river(BankLaw left, double depthAtBank) {
    return new River(
        90,
        new Polyline(
            List.of(
                new Polyline.Point(0, depthAtBank),
                new Polyline.Point(10, 5),
                new Polyline.Point(100, 5))),
        new Polyline(List.of(new Polyline.Point(0, 1.3), new Polyline.Point(100, 1.3))),
        left,
        BankLaw.NONE,
        VerticalLaws.power(1 / 6.0),
        0,
        TimeFactor.STEADY);
  }
}
