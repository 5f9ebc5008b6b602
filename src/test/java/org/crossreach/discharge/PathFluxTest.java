package org.crossreach.discharge;

import static org.crossreach.discharge.Crossing.edge;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.settings.Method;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensemble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The flux through the boat's own path is the cross product of water and boat velocity, whatever
 * the path, the course and the frame.
 *
 * <p>Validation: Gordon 1989, J. Hydraul. Eng. 115(7) 925; Simpson and Oltmann 1993, USGS
 * Water-Supply Paper 2395.
 */
class PathFluxTest {

  private static final Edge NONE = edge(0, Edge.WALL);

  /**
   * Water (0.15, 1.20) m/s and boat (0.80, 0.10) m/s: 0.945 m²/s downstream for a start at the left
   * bank, the same with both turned by 37 degrees.
   */
  @ParameterizedTest
  @CsvSource({"0", "37", "-120"})
  void crossProductOfOneEnsemble(double turnDeg) throws Exception {
    double c = Math.cos(Math.toRadians(turnDeg));
    double s = Math.sin(Math.toRadians(turnDeg));
    double depth = 4;
    List<Ensemble> two = new ArrayList<>();
    for (int i = 0; i < 2; i++) {
      two.add(
          Ensemble.uniform(
              i,
              c * 0.80 - s * 0.10,
              s * 0.80 + c * 0.10,
              depth - Crossing.DRAFT_M,
              c * 0.15 - s * 1.20,
              s * 0.15 + c * 1.20));
    }
    PassDischarge pass =
        Crossing.reduce(Ensemble.record(two), Bank.LEFT, NONE, NONE, settings(Method.PATH_FLUX));
    double thickness = thickness(pass);
    assertEquals(0.945, pass.zones().measured() / thickness, 1e-12);
  }

  private static double thickness(PassDischarge pass) {
    var column = pass.section().newColumn();
    pass.section().read(1, pass.section().newRow(), column);
    return column.upperM(0) - column.lowerM(column.size() - 1);
  }

  /**
   * The field of the stream function {@code psi = 6 y + 40 sin(2 pi x/200) sin(pi y/100)} between
   * banks y = 0 and 100 carries 600 m³/s per metre of depth through every path. Midpoint sums over
   * 100 straight segments give 600.0016 on the diagonal x = 0.5 y and 599.9977 on the curve x = 20
   * sin(2 pi y/100), printed to four decimals. Banks: flow towards +x, so y runs from right to
   * left.
   */
  @ParameterizedTest
  @CsvSource({"diagonal,600.0016", "curve,599.9977"})
  void everyPathFromBankToBankCarriesTheSame(String path, double perMetre) throws Exception {
    int segments = 100;
    double depth = 4;
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i <= segments; i++) {
      double y1 = 100.0 * i / segments;
      double y0 = i == 0 ? y1 : 100.0 * (i - 1) / segments;
      double x1 = x(path, y1);
      double x0 = x(path, y0);
      double x = (x0 + x1) / 2;
      double y = (y0 + y1) / 2;
      all.add(
          Ensemble.uniform(
              i,
              x1 - x0,
              y1 - y0,
              depth - Crossing.DRAFT_M,
              6
                  + 40
                      * Math.PI
                      / 100
                      * Math.sin(2 * Math.PI * x / 200)
                      * Math.cos(Math.PI * y / 100),
              -40
                  * 2
                  * Math.PI
                  / 200
                  * Math.cos(2 * Math.PI * x / 200)
                  * Math.sin(Math.PI * y / 100)));
    }
    PassDischarge pass =
        Crossing.reduce(Ensemble.record(all), Bank.RIGHT, NONE, NONE, settings(Method.PATH_FLUX));
    assertEquals(perMetre, pass.zones().measured() / thickness(pass), 0.5e-4);
  }

  private static double x(String path, double y) {
    return path.equals("diagonal") ? 0.5 * y : 20 * Math.sin(2 * Math.PI * y / 100);
  }

  /** A closed loop in steady flow carries nothing; a long way out and a short way back. */
  @Test
  void closedLoopCarriesNothing() throws Exception {
    Crossing loop =
        new Crossing(x -> 5, x -> 1)
            .go(10, 0, 60, 20, 50)
            .go(60, 20, 60, -10, 30)
            .go(60, -10, 10, 0, 40)
            .go(10, 0, 9, 0, 1);
    PassDischarge pass = loop.reduce(Bank.RIGHT, NONE, NONE, settings(Method.PATH_FLUX));
    double onlyTheLastMetre = 5.0;
    assertEquals(onlyTheLastMetre, pass.totalM3s(), 1e-9);
  }

  /** With bottom track a heading error turns water and boat alike and cancels exactly. */
  @ParameterizedTest
  @CsvSource({"PATH_FLUX", "SECTION_NORMAL"})
  void headingErrorCancelsWithBottomTrack(Method method) throws Exception {
    List<Ensemble> straight = new ArrayList<>();
    List<Ensemble> turned = new ArrayList<>();
    double c = Math.cos(Math.toRadians(5));
    double s = Math.sin(Math.toRadians(5));
    for (int i = 0; i < 30; i++) {
      straight.add(Ensemble.uniform(i, 1.0, 0.1, 4, 0.2, 1.1));
      turned.add(
          Ensemble.uniform(i, c + s * 0.1, -s + c * 0.1, 4, c * 0.2 + s * 1.1, -s * 0.2 + c * 1.1));
    }
    assertEquals(
        Crossing.reduce(Ensemble.record(straight), Bank.LEFT, NONE, NONE, settings(method))
            .totalM3s(),
        Crossing.reduce(Ensemble.record(turned), Bank.LEFT, NONE, NONE, settings(method))
            .totalM3s(),
        1e-11);
  }

  private static Settings settings(Method method) {
    return Settings.defaults().withScreening(Screening.off()).withMethod(method);
  }
}
