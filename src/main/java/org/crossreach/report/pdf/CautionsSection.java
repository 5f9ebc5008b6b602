package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;

/** What the result is not. */
final class CautionsSection implements TransectSection, MeasurementSection {

  private static final String TEXT =
      "These results inform, and do not replace, licensed practice and local codes. Decisions on"
          + " flood warning, dams, bridges or navigation, and all work on and near water, follow"
          + " the rules of the local authority. Extrapolated and estimated zones rest on"
          + " assumptions that the reviewer has to judge; a small spread between passes does not"
          + " show an error that all of them share.";

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    return blocks(subject);
  }

  @Override
  public List<Block> blocks(Subject subject) {
    return List.of(
        subject.style().section("Cautions"), Text.paragraph(subject.style().body(), TEXT));
  }
}
