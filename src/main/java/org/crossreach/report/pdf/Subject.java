package org.crossreach.report.pdf;

import java.io.IOException;
import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.report.Decimals;
import org.crossreach.report.ProgramVersion;
import org.crossreach.report.Quantity;
import org.crossreach.report.Units;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.Measurement;

/**
 * What a section of pages is about, and how the reader wants it.
 *
 * @param result the measurement
 * @param options paper, units, files
 * @param attachments which files travel inside
 * @param style inks
 */
record Subject(Result result, PdfOptions options, Attachments attachments, PageStyle style) {

  private static final DateTimeFormatter DATE =
      DateTimeFormatter.ofPattern("uuuu-MM-dd", Locale.ROOT);
  private static final DateTimeFormatter CLOCK =
      DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
  private static final DateTimeFormatter CLOCK_WITH_OFFSET =
      DateTimeFormatter.ofPattern("HH:mm:ss xxx", Locale.ROOT);

  static Subject of(Result result, PdfOptions options) {
    return new Subject(
        result, options, Attachments.of(options.attachments()), PageStyle.standard());
  }

  /**
   * Lays out blocks as a document.
   *
   * @param blocks everything on the pages
   * @param name measurement and pass
   * @param description what the document is about
   * @param time when the last of its data was recorded
   */
  byte[] printed(List<Block> blocks, String name, String description, OffsetDateTime time)
      throws IOException {
    try (Book book = new Book(options.paper())) {
      new Flow(book, program() + "  ·  " + name, style.foot(), style.chart().faint()).lay(blocks);
      StringBuilder identity = new StringBuilder(program()).append(name).append(options.units());
      for (InputFile input : measurement().inputs()) {
        identity.append(input.sha256());
      }
      identity.append(result.reduction().settings());
      return Keeper.finish(
          book,
          new Imprint(
              "Discharge of " + TitleSection.place(this) + ": " + name,
              description,
              program(),
              time,
              Packed.sha256(identity.toString())),
          attachments.inside());
    }
  }

  Measurement measurement() {
    return result.reduction().measurement();
  }

  Units units() {
    return options.units();
  }

  /** Name and version of the program. */
  static String program() {
    return ProgramVersion.NAME + " " + ProgramVersion.read();
  }

  /** Decimals that suit all discharges of the measurement: four digits of the largest. */
  Decimals dischargeDecimals() {
    return Decimals.showing(
        4,
        result.reduction().passes().stream()
            .mapToDouble(each -> Quantity.DISCHARGE.in(units(), each.totalM3s()))
            .toArray());
  }

  /** A discharge in the reader's unit, without the unit. */
  String discharge(double m3s) {
    return dischargeDecimals().of(Quantity.DISCHARGE.in(units(), m3s));
  }

  /** A quantity with its unit, with four digits; {@link Decimals#NONE} when missing. */
  String with(Quantity quantity, double si, int decimals) {
    String number = new Decimals(decimals).of(quantity.in(units(), si));
    return number.equals(Decimals.NONE) ? number : number + " " + quantity.symbol(units());
  }

  /** The name of a quantity with its unit, as a heading. */
  String heading(String name, Quantity quantity) {
    return name + " (" + quantity.symbol(units()) + ")";
  }

  static String date(OffsetDateTime time) {
    return DATE.format(time);
  }

  static String clock(OffsetDateTime time) {
    return CLOCK.format(time);
  }

  static String clockWithOffset(OffsetDateTime time) {
    return CLOCK_WITH_OFFSET.format(time);
  }

  static OffsetDateTime start(PassDischarge pass) {
    return pass.pass().ensembles().start();
  }

  /** When the last ensemble of a pass ended. */
  static OffsetDateTime end(PassDischarge pass) {
    Ensembles ensembles = pass.pass().ensembles();
    double seconds = ensembles.elapsedS(ensembles.size() - 1);
    return ensembles.start().plusNanos(Math.round(seconds * 1e9));
  }
}
