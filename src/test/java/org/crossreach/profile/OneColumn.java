package org.crossreach.profile;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.crossreach.motion.Track;
import org.crossreach.screen.Screen;
import org.crossreach.section.Column;
import org.crossreach.section.Line;
import org.crossreach.section.Section;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Water;

/**
 * A column whose cells hold the exact means of a profile, as the screen and the section leave it.
 */
final class OneColumn {

  private OneColumn() {}

  /**
   * Draft, blank and cells are 0.25 m each and the beams stand at 20 degrees, as in the first case
   * of the one-vertical table.
   *
   * @param depth depth (m)
   * @param below integral of the velocity from the bed to a height (m²/s)
   */
  static Column of(double depth, DoubleUnaryOperator below) {
    int count = (int) Math.floor((depth - 0.5) / 0.25 + 1e-9);
    double[] east = new double[count];
    double[] north = new double[count];
    for (int k = 0; k < count; k++) {
      double upper = depth - 0.5 - k * 0.25;
      north[k] = (below.applyAsDouble(upper) - below.applyAsDouble(upper - 0.25)) / 0.25;
    }
    Ensemble start = new Ensemble(0, 1, 0, depth - 0.25, 0.375, 0.25, east, north);
    Ensemble end = new Ensemble(1, 1, 0, depth - 0.25, 0.375, 0.25, east, north);
    Instrument instrument = new Instrument("", 1200, 20, List.of(), 0.25, Double.NaN, 0, 0);
    var screened =
        new Screen(
                instrument,
                new Water(Double.NaN, 0),
                Settings.defaults().withScreening(Screening.off()))
            .apply("pass-01", Ensemble.record(List.of(start, end)));
    Track track = Track.of(screened);
    Section section = Section.of(screened, track, Line.along(track, Bank.LEFT), Bank.LEFT);
    Column column = section.newColumn();
    section.read(1, section.newRow(), column);
    return column;
  }
}
