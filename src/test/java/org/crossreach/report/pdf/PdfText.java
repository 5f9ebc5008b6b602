package org.crossreach.report.pdf;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;

/** The text of a PDF as programs read it that did not make it. */
final class PdfText {

  private PdfText() {}

  /** The text by PDFBox, and by {@code pdftotext} of Poppler where that is installed. */
  static List<String> byEveryReader(byte[] pdf) throws Exception {
    List<String> texts = new ArrayList<>();
    try (PDDocument document = Loader.loadPDF(pdf)) {
      PDFTextStripper stripper = new PDFTextStripper();
      stripper.setSortByPosition(false);
      texts.add(stripper.getText(document));
    }
    Path file = Files.createTempFile("crossreach", ".pdf");
    try {
      Files.write(file, pdf);
      Process poppler =
          new ProcessBuilder("pdftotext", "-raw", "-enc", "UTF-8", file.toString(), "-").start();
      texts.add(new String(poppler.getInputStream().readAllBytes(), StandardCharsets.UTF_8));
      if (poppler.waitFor() != 0) {
        throw new IllegalStateException("pdftotext cannot read the file");
      }
    } catch (IOException notInstalled) {
      // One reader has to do.
    } finally {
      Files.delete(file);
    }
    return texts;
  }
}
