package org.crossreach.profile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.apache.commons.math3.util.FastMath;
import org.crossreach.motion.Track;
import org.crossreach.screen.Screen;
import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.section.Line;
import org.crossreach.section.Section;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Water;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * In one vertical whose velocity follows a power law exactly, the unmeasured parts come out as the
 * closed form says.
 *
 * <p>Validation. The values follow from integrating {@code u/U = (m + 1)(z/H)^m} over the cells and
 * the parts (Chen 1991, J. Hydraul. Eng. 117(3) 371; extrapolation by Simpson and Oltmann 1993,
 * USGS Water-Supply Paper 2395), printed to 9 decimals; the tolerance is one unit of the last of
 * them.
 */
class OneVerticalOracleTest {

  private static final double LAST_DIGIT = 1e-9;

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    // case, H, draft, blank, cell, beam angle, 1/m, U, exact means?, n, z2, z1,
    //   S, top, bottom, total, constant top, three-point top
    "H5 m1/6,       5,.25,.25,.25,20, 6,1.0,true, 16,4.5,0.5, 4.081023338,0.578330628,0.340646035, 5,0.570483727,0.579101415",
    "H5 m1/7,       5,.25,.25,.25,20, 7,1.0,true, 16,4.5,0.5, 4.072932588,0.567224576,0.359842837, 5,0.560622018,0.567892597",
    "H5 m1/10,      5,.25,.25,.25,20,10,1.0,true, 16,4.5,0.5, 4.055672545,0.547163338,0.397164117, 5,0.542697943,0.547638916",
    "H5 m1/6 centre,5,.25,.25,.25,20, 6,1.0,false,16,4.5,0.5, 4.081595539,0.578411716,0.340693797, 5.000701052,0.570494510,0.579110144",
    "H2 m1/6,       2,.1,.2,.1,20,    6,1.0,true, 15,1.7,0.2, 1.518312590,0.345428997,0.136258414, 2,0.338949087,0.346204906",
    "H2 m1/6 30deg, 2,.1,.2,.1,30,    6,1.0,true, 14,1.7,0.3, 1.435893991,0.345428997,0.218677012, 2,0.338949087,0.346204906",
    "H10 m1/6,     10,.3,.5,.5,20,    6,1.2,true, 17,9.2,0.7, 10.348382172,1.112361033,0.539256795, 12,1.099463163,1.113528755"
  })
  void reproducesTheClosedForm(
      String name,
      double depth,
      double draft,
      double blank,
      double cell,
      double beamAngle,
      double inverseExponent,
      double mean,
      boolean exactMeans,
      int cells,
      double z2,
      double z1,
      double throughCells,
      double top,
      double bottom,
      double total,
      double constantTop,
      double threePointTop) {
    double m = 1 / inverseExponent;
    Column column = column(depth, draft, blank, cell, beamAngle, m, mean, exactMeans);
    assertEquals(cells, column.size());
    assertEquals(z2, column.upperM(0), 1e-12);
    assertEquals(z1, column.lowerM(cells - 1), 1e-12);
    double measured = MeasuredZone.throughCells(column, Component.NORMAL);
    double powerTop = Laws.top(new PowerLaw(), column, Component.NORMAL, m);
    double powerBottom = Laws.bottom(new PowerLaw(), column, Component.NORMAL, m);
    assertEquals(throughCells, measured, LAST_DIGIT);
    assertEquals(top, powerTop, LAST_DIGIT);
    assertEquals(bottom, powerBottom, LAST_DIGIT);
    assertEquals(total, measured + powerTop + powerBottom, LAST_DIGIT);
    assertEquals(constantTop, Laws.top(new ConstantLaw(), column, Component.NORMAL, m), LAST_DIGIT);
    assertEquals(
        threePointTop, Laws.top(new ThreePointLaw(), column, Component.NORMAL, m), LAST_DIGIT);
  }

  @ParameterizedTest
  @CsvSource({"true,0.340646035", "false,0.340884268"})
  void noSlipThroughTheLowestFifthReturnsTheBottomOfAPowerLaw(boolean exactMeans, double bottom) {
    Column column = column(5, .25, .25, .25, 20, 1 / 6.0, 1, exactMeans);
    assertEquals(
        bottom, Laws.bottom(new NoSlipLaw(), column, Component.NORMAL, 1 / 6.0), LAST_DIGIT);
  }

  /** The first usable column of a boat that crosses eastward over water that flows north. */
  private static Column column(
      double depth,
      double draft,
      double blank,
      double cell,
      double beamAngle,
      double m,
      double mean,
      boolean exactMeans) {
    int count = (int) Math.floor((depth - draft - blank) / cell + 1e-9);
    double[] east = new double[count];
    double[] north = new double[count];
    for (int k = 0; k < count; k++) {
      double upper = depth - draft - blank - k * cell;
      north[k] =
          exactMeans ? meanOver(upper - cell, upper, depth, m) : at(upper - cell / 2, depth, m);
      north[k] *= mean;
    }
    Ensemble start = new Ensemble(0, 1, 0, depth - draft, blank + cell / 2, cell, east, north);
    Ensemble end = new Ensemble(1, 1, 0, depth - draft, blank + cell / 2, cell, east, north);
    Instrument instrument = new Instrument("", 1200, beamAngle, List.of(), draft, Double.NaN, 0, 0);
    Settings settings = Settings.defaults().withScreening(Screening.off());
    var screened =
        new Screen(instrument, new Water(Double.NaN, 0), settings)
            .apply("pass-01", Ensemble.record(List.of(start, end)));
    Track track = Track.of(screened);
    Section section = Section.of(screened, track, Line.along(track, Bank.LEFT), Bank.LEFT);
    Column column = section.newColumn();
    section.read(1, section.newRow(), column);
    return column;
  }

  private static double at(double z, double depth, double m) {
    return (m + 1) * FastMath.pow(z / depth, m);
  }

  private static double meanOver(double lower, double upper, double depth, double m) {
    return depth
        * (FastMath.pow(upper / depth, m + 1) - FastMath.pow(Math.max(0, lower) / depth, m + 1))
        / (upper - lower);
  }
}
