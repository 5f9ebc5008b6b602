package org.crossreach.report.pdf;

import java.io.IOException;
import java.io.OutputStream;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;

/** The PDF of a measurement: its passes taken together. */
public final class MeasurementPdf {

  /** The sections in their order: a new one is a class and a line here. */
  private static final List<MeasurementSection> SECTIONS =
      List.of(
          new TitleSection(),
          new MeanSection(),
          new MeasurementFactsSection(),
          new PassesSection(),
          new AgreementSection(),
          new ExtrapolationsSection(),
          new NotesSection(),
          new SettingsSection(),
          new InputsSection(),
          new CautionsSection(),
          new SignatureSection());

  private MeasurementPdf() {}

  /**
   * Writes the PDF of a measurement. May be called from several threads at once.
   *
   * @param result the measurement
   * @param options paper, units, files inside
   * @param out receives the bytes; stays open
   * @throws IOException when the bytes cannot be written
   */
  public static void write(Result result, PdfOptions options, OutputStream out) throws IOException {
    out.write(bytes(result, options));
  }

  /** The bytes of the PDF of a measurement; see {@link #write}. */
  public static byte[] bytes(Result result, PdfOptions options) throws IOException {
    Subject subject = Subject.of(result, options);
    List<Block> blocks = new ArrayList<>();
    for (MeasurementSection section : SECTIONS) {
      blocks.addAll(section.blocks(subject));
    }
    return subject.printed(
        blocks,
        subject.measurement().id(),
        "Discharge by passes of a boat across the river: " + TitleSection.place(subject),
        end(result));
  }

  private static OffsetDateTime end(Result result) {
    OffsetDateTime end = null;
    for (PassDischarge pass : result.reduction().passes()) {
      OffsetDateTime each = Subject.end(pass);
      end = end == null || each.isAfter(end) ? each : end;
    }
    return end;
  }
}
