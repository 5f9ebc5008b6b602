package org.crossreach.report.pdf;

import java.util.List;

/** A section of the PDF of a measurement; one class for each, listed in {@link MeasurementPdf}. */
@FunctionalInterface
interface MeasurementSection {

  /** The section's blocks with its heading; none when there is nothing to say. */
  List<Block> blocks(Subject subject);
}
