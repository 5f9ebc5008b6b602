package org.crossreach.report.pdf;

import java.util.List;
import org.crossreach.discharge.PassDischarge;

/** A section of the PDF of one pass; one class for each, listed in {@link TransectPdf}. */
@FunctionalInterface
interface TransectSection {

  /** The section's blocks with its heading; none when there is nothing to say. */
  List<Block> blocks(Subject subject, PassDischarge pass);
}
