package org.crossreach.report.chart;

import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Units;

/** The list of all pictures: one line for each. */
public final class Charts {

  private static final List<OfPass> OF_PASS =
      List.of(
          (result, pass, units, style) -> new BoatTrack(pass, units, style),
          (result, pass, units, style) -> new VelocitySection(pass, units, style),
          (result, pass, units, style) -> new DischargeAlong(pass, units, style),
          (result, pass, units, style) ->
              new VerticalProfile(pass, result.reduction().settings(), style));

  private static final List<OfMeasurement> OF_MEASUREMENT =
      List.of(
          (result, units, style) -> new PassDots(result, "", units, style),
          (result, units, style) -> new PassesAcross(result, units, style));

  private Charts() {}

  /** Makes a picture of one pass. */
  private interface OfPass {
    Picture make(Result result, PassDischarge pass, Units units, ChartStyle style);
  }

  /** Makes a picture of a measurement. */
  private interface OfMeasurement {
    Picture make(Result result, Units units, ChartStyle style);
  }

  /**
   * All pictures of one pass.
   *
   * @param result the measurement
   * @param pass one of its passes
   * @param units the reader's units
   */
  public static List<Picture> ofPass(Result result, PassDischarge pass, Units units) {
    return OF_PASS.stream()
        .map(each -> each.make(result, pass, units, ChartStyle.standard()))
        .toList();
  }

  /**
   * All pictures of a measurement as a whole.
   *
   * @param result the measurement
   * @param units the reader's units
   */
  public static List<Picture> ofMeasurement(Result result, Units units) {
    return OF_MEASUREMENT.stream()
        .map(each -> each.make(result, units, ChartStyle.standard()))
        .toList();
  }

  /**
   * All pictures of a comparison of laws.
   *
   * @param comparison what is shown
   * @param units the reader's units
   */
  public static List<Picture> ofComparison(Comparison comparison, Units units) {
    ChartStyle style = ChartStyle.standard();
    return List.of(
        new ProfileDensity(comparison, style),
        new HiddenCellErrors(comparison, style),
        new CombinationDots(comparison, units, style));
  }
}
