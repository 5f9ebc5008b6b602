package org.crossreach.report.pdf;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;

/** The verdict of an independent validator. */
final class Verdict {

  static {
    VeraGreenfieldFoundryProvider.initialise();
  }

  private Verdict() {}

  /** What a file does wrong by a standard, each once; empty when it conforms. */
  static List<String> faults(byte[] pdf, PDFAFlavour standard) throws Exception {
    try (PDFAParser parser =
            Foundries.defaultInstance().createParser(new ByteArrayInputStream(pdf), standard);
        PDFAValidator validator = Foundries.defaultInstance().createValidator(standard, false)) {
      ValidationResult result = validator.validate(parser);
      return result.getTestAssertions().stream()
          .filter(each -> each.getStatus() == TestAssertion.Status.FAILED)
          .map(each -> each.getRuleId().getClause() + ": " + each.getMessage())
          .distinct()
          .toList();
    }
  }
}
