package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Site;

/** Where, what and when, in two lines at the head of the first page. */
final class TitleSection implements TransectSection, MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    int place = subject.result().reduction().passes().indexOf(pass) + 1;
    return blocks(
        subject,
        "Discharge measurement "
            + subject.measurement().id()
            + ", pass "
            + place
            + " of "
            + subject.result().reduction().passes().size()
            + " ("
            + pass.pass().name()
            + ", from the "
            + (pass.pass().startBank() == Bank.LEFT ? "left" : "right")
            + " bank"
            + (pass.pass().used() ? "" : ", not used")
            + "), "
            + Subject.date(Subject.start(pass)));
  }

  @Override
  public List<Block> blocks(Subject subject) {
    List<PassDischarge> passes = subject.result().reduction().passes();
    return blocks(
        subject,
        "Discharge measurement "
            + subject.measurement().id()
            + ", "
            + subject.result().summary().passesUsed()
            + (subject.result().summary().passesUsed() == 1 ? " pass" : " passes")
            + ", "
            + Subject.date(Subject.start(passes.get(0))));
  }

  private static List<Block> blocks(Subject subject, String subtitle) {
    PageStyle style = subject.style();
    return List.of(
        new Text("H1", style.title(), place(subject)),
        Text.paragraph(style.subtitle(), subtitle),
        new Gap(4),
        new Rule(style.chart().ink(), 1.2),
        new Gap(8));
  }

  /** River and site, or the measurement's own name where neither was recorded. */
  static String place(Subject subject) {
    Site site = subject.measurement().site();
    if (site.river().isBlank()) {
      return site.name().isBlank() ? subject.measurement().id() : site.name();
    }
    return site.name().isBlank() ? site.river() : site.river() + " at " + site.name();
  }
}
