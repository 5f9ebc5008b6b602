package org.crossreach.agreement;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.survey.Note;

/**
 * The used passes of a measurement taken together.
 *
 * @param passesUsed number of used passes
 * @param exposureS sum of their durations (s)
 * @param dischargeM3s spread of their total discharges (m³/s)
 * @param zones mean discharge by zone
 * @param directions the two directions against each other
 * @param widthM spread of their widths (m)
 * @param areaM2 spread of their areas (m²)
 * @param meanVelocityMps spread of their mean velocities (m/s)
 * @param notes what a person should look at
 */
public record Summary(
    int passesUsed,
    double exposureS,
    Spread dischargeM3s,
    ZoneDischarge zones,
    Directions directions,
    Spread widthM,
    Spread areaM2,
    Spread meanVelocityMps,
    List<Note> notes) {

  public Summary {
    notes = List.copyOf(notes);
  }

  /**
   * Takes the used passes together.
   *
   * @param passes at least one
   * @param notes remarks of the reduction, to which the summary's own are added
   */
  static Summary of(List<PassDischarge> passes, List<Note> notes) {
    Spread discharge = spread(passes, PassDischarge::totalM3s);
    double exposure = 0;
    for (PassDischarge each : passes) {
      exposure += each.geometry().durationS();
    }
    Summary bare =
        new Summary(
            passes.size(),
            exposure,
            discharge,
            ZoneDischarge.mean(passes.stream().map(PassDischarge::zones).toList()),
            Directions.of(passes, discharge.mean()),
            spread(passes, each -> each.geometry().widthM()),
            spread(passes, each -> each.geometry().areaM2()),
            spread(passes, PassDischarge::meanVelocityMps),
            notes);
    return bare.withNotes(AgreementNotes.of(bare, passes));
  }

  private Summary withNotes(List<Note> more) {
    List<Note> all = new ArrayList<>(notes);
    all.addAll(more);
    return new Summary(
        passesUsed,
        exposureS,
        dischargeM3s,
        zones,
        directions,
        widthM,
        areaM2,
        meanVelocityMps,
        all);
  }

  private static Spread spread(
      List<PassDischarge> passes, ToDoubleFunction<PassDischarge> quantity) {
    return Spread.of(passes.stream().mapToDouble(quantity).toArray());
  }
}
