package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.chart.BoatTrack;
import org.crossreach.report.chart.ChartStyle;
import org.crossreach.report.chart.DischargeAlong;
import org.crossreach.report.chart.Picture;
import org.crossreach.report.chart.VelocitySection;

/** Track, section and discharge under each other, over the same distance from the left bank. */
final class PassPicturesSection implements TransectSection {

  /** Heights as shares of the paper's: all three stand on the first page together. */
  private static final double TRACK = 0.15;

  private static final double SECTION = 0.218;
  private static final double DISCHARGE = 0.142;

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    ChartStyle style = subject.style().chart();
    return List.of(
        new Gap(7),
        figure(subject, new BoatTrack(pass, subject.units(), style), TRACK),
        new Gap(7),
        figure(subject, new VelocitySection(pass, subject.units(), style), SECTION),
        new Gap(7),
        figure(subject, new DischargeAlong(pass, subject.units(), style), DISCHARGE));
  }

  private static Block figure(Subject subject, Picture picture, double share) {
    return new Figure(
        picture, subject.style().caption(), share * subject.options().paper().height());
  }
}
