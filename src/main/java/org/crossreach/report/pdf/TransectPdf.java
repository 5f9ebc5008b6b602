package org.crossreach.report.pdf;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;

/** The PDF of one pass: one or two pages that a hydrographer can sign. */
public final class TransectPdf {

  /** The sections in their order: a new one is a class and a line here. */
  private static final List<TransectSection> SECTIONS =
      List.of(
          new TitleSection(),
          new PassResultSection(),
          new PassFactsSection(),
          new PassPicturesSection(),
          new PassProfileSection(),
          new SettingsSection(),
          new NotesSection(),
          new InputsSection(),
          new CautionsSection(),
          new SignatureSection());

  private TransectPdf() {}

  /**
   * Writes the PDF of a pass. May be called from several threads at once.
   *
   * @param result the measurement
   * @param pass one of its passes
   * @param options paper, units, files inside
   * @param out receives the bytes; stays open
   * @throws IOException when the bytes cannot be written
   */
  public static void write(Result result, PassDischarge pass, PdfOptions options, OutputStream out)
      throws IOException {
    out.write(bytes(result, pass, options));
  }

  /** The bytes of the PDF of a pass; see {@link #write}. */
  public static byte[] bytes(Result result, PassDischarge pass, PdfOptions options)
      throws IOException {
    Subject subject = Subject.of(result, options);
    List<Block> blocks = new ArrayList<>();
    for (TransectSection section : SECTIONS) {
      blocks.addAll(section.blocks(subject, pass));
    }
    String name = subject.measurement().id() + ", " + pass.pass().name();
    return subject.printed(
        blocks,
        name,
        "Discharge of one pass of a boat across the river: " + TitleSection.place(subject),
        Subject.end(pass));
  }
}
