package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Water;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * A cell is kept when its lower edge lies above {@code draft + (D - draft) cos(beam angle)}.
 *
 * <p>Validation: Simpson 2001, USGS Open-File Report 01-1 (formula from memory); limits printed to
 * six decimals.
 */
class SideLobeLimitTest {

  @ParameterizedTest
  @CsvSource({
    // D, draft, beam angle, limit below the surface
    "2,0.10,20,1.885416", "2,0.10,25,1.821985", "2,0.10,30,1.745448",
    "5,0.25,20,4.713540", "5,0.25,25,4.554962", "5,0.25,30,4.363621",
    "10,0.30,20,9.415018", "10,0.30,25,9.091186", "10,0.30,30,8.700446",
    "20,0.30,20,18.811945", "20,0.30,25,18.154263", "20,0.30,30,17.360700"
  })
  void lastCellEndsAtTheLimit(double depth, double draft, double beamAngle, double limit) {
    double justAbove = 1e-6;
    assertEquals(Reason.NONE, reasonOfCellThatEndsAt(limit - justAbove, depth, draft, beamAngle));
    assertEquals(
        Reason.SIDE_LOBE, reasonOfCellThatEndsAt(limit + justAbove, depth, draft, beamAngle));
  }

  private static Reason reasonOfCellThatEndsAt(
      double lowerEdge, double depth, double draft, double beamAngle) {
    double size = 0.25;
    double firstCell = lowerEdge - size / 2 - draft;
    Ensemble ensemble =
        new Ensemble(0, 1, 0, depth - draft, firstCell, size, new double[] {0.1}, new double[] {1});
    return new Screen(
            new Instrument("", 1200, beamAngle, List.of(), draft, Double.NaN, 0, 0),
            new Water(Double.NaN, 0),
            Settings.defaults().withScreening(Screening.off()))
        .apply("pass-01", Ensemble.record(List.of(ensemble)))
        .reason(0, 0);
  }
}
