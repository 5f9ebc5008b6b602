package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.report.Units;

/**
 * How a PDF is made.
 *
 * @param paper size of the pages
 * @param units the reader's units
 * @param attachments files that travel inside, in order; one that would make the PDF too large is
 *     named with its hash instead
 */
public record PdfOptions(Paper paper, Units units, List<Attachment> attachments) {

  public PdfOptions {
    attachments = List.copyOf(attachments);
  }

  /** A4, SI, nothing inside. */
  public static PdfOptions defaults() {
    return new PdfOptions(Paper.A4, Units.SI, List.of());
  }

  /** The same with another size of page. */
  public PdfOptions withPaper(Paper paper) {
    return new PdfOptions(paper, units, attachments);
  }

  /** The same in other units. */
  public PdfOptions withUnits(Units units) {
    return new PdfOptions(paper, units, attachments);
  }

  /** The same with other files inside. */
  public PdfOptions withAttachments(List<Attachment> attachments) {
    return new PdfOptions(paper, units, attachments);
  }
}
