package org.crossreach.report.pdf;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.filespecification.PDComplexFileSpecification;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.report.Units;
import org.crossreach.report.chart.River;
import org.crossreach.survey.InputFile;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/**
 * The PDF of a pass conforms to its standards, says what the result says as text, stays small, and
 * is the same bytes wherever it is made.
 */
class TransectPdfTest {

  private static Result result;
  private static PassDischarge pass;

  @BeforeAll
  static void reduce() throws Exception {
    result = River.usual().result();
    pass = result.reduction().passes().get(1);
  }

  private static byte[] pdf(PdfOptions options) throws Exception {
    return TransectPdf.bytes(result, pass, options);
  }

  private static PdfOptions withTables() throws Exception {
    return PdfOptions.defaults().withAttachments(Enclosures.of(result, pass));
  }

  @ParameterizedTest
  @EnumSource(Paper.class)
  void conformsToPdfA2uAndPdfUa1(Paper paper) throws Exception {
    byte[] pdf = pdf(PdfOptions.defaults().withPaper(paper));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_2_U));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
  }

  @Test
  void conformsToPdfA3uWithTablesInside() throws Exception {
    byte[] pdf = pdf(withTables());
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_3_U));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
  }

  @Test
  void conformsWhateverTheRiverDoes() throws Exception {
    for (River river :
        List.of(new River(2, 24, 0, 1), new River(60, 24, 0.1, 0), new River(80, 24, 0.1, -1))) {
      Result odd = river.result();
      byte[] pdf = TransectPdf.bytes(odd, odd.reduction().passes().get(0), PdfOptions.defaults());
      assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_2_U), river.toString());
      assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1), river.toString());
    }
  }

  @Test
  void saysWhatTheResultSays() throws Exception {
    for (String text : PdfText.byEveryReader(pdf(PdfOptions.defaults()))) {
      ZoneDischarge zones = pass.zones();
      for (double value :
          new double[] {
            zones.total(),
            zones.top(),
            zones.measured(),
            zones.bottom(),
            zones.leftEdge(),
            zones.rightEdge(),
            pass.otherMethodTotalM3s(),
            result.summary().dischargeM3s().mean()
          }) {
        assertTrue(text.contains(rounded(value, 1)), value + " is not in " + text);
      }
      assertTrue(text.contains(rounded(pass.geometry().widthM(), 2) + " m"), text);
      assertTrue(text.contains(rounded(pass.geometry().areaM2(), 2) + " m²"), text);
      assertTrue(text.contains(rounded(pass.meanVelocityMps(), 3) + " m/s"), text);
      assertTrue(text.contains(rounded(pass.exponent(), 4)), text);
      for (String words :
          List.of(
              "River Aske at Heron Ferry",
              "heron-ferry-0612",
              "pass 2 of 5",
              "2026-06-12",
              "boat operator, profiler operator,",
              "2.410 m at 09:05",
              "P-2207",
              "1200 kHz",
              "09:18:00",
              "coefficient 0.3535",
              "section-normal",
              "edge_ensembles",
              "side lobe",
              "Depth below the surface (m)",
              "Discharge per unit width (m²/s)",
              "do not replace, licensed practice",
              "Reviewed by")) {
        assertTrue(text.contains(words), words + " is not in " + text);
      }
      for (InputFile input : result.reduction().measurement().inputs()) {
        boolean own = !input.file().endsWith(".csv") || input.file().equals("pass-02.csv");
        assertEquals(own, text.contains(input.sha256()), input.file());
      }
    }
  }

  /** Rounded without the code under test. */
  private static String rounded(double value, int decimals) {
    return new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString();
  }

  @Test
  void speaksTheReadersUnits() throws Exception {
    byte[] pdf = pdf(PdfOptions.defaults().withUnits(Units.US).withPaper(Paper.LETTER));
    // 1 ft = 0.3048 m exactly (NIST SP 811).
    double cubicFeet = pass.totalM3s() / (0.3048 * 0.3048 * 0.3048);
    for (String text : PdfText.byEveryReader(pdf)) {
      assertTrue(text.contains(rounded(cubicFeet, 0) + " ft³/s"), text);
      assertFalse(text.contains("m³/s"), text);
    }
  }

  @ParameterizedTest
  @EnumSource(Paper.class)
  void fitsOnTwoPages(Paper paper) throws Exception {
    PdfOptions options = withTables().withPaper(paper);
    try (PDDocument document = Loader.loadPDF(pdf(options))) {
      assertEquals(2, document.getNumberOfPages());
      assertEquals(paper.width(), document.getPage(0).getMediaBox().getWidth(), 0.01);
    }
  }

  @Test
  void staysSmall() throws Exception {
    assertTrue(pdf(withTables()).length < 400_000);
    Result large = new River(3000, 100, 0.1, 1).result();
    PassDischarge pass = large.reduction().passes().get(0);
    byte[] pdf =
        TransectPdf.bytes(
            large, pass, PdfOptions.defaults().withAttachments(Enclosures.of(large, pass)));
    assertTrue(pdf.length < 400_000, pdf.length + " bytes");
  }

  @Test
  void carriesTheTablesWhole() throws Exception {
    List<Attachment> attachments = Enclosures.of(result, pass);
    try (PDDocument document = Loader.loadPDF(pdf(withTables()))) {
      var inside = document.getDocumentCatalog().getNames().getEmbeddedFiles().getNames();
      for (Attachment each : attachments) {
        PDComplexFileSpecification file = inside.get(each.name());
        assertArrayEquals(each.bytes(), file.getEmbeddedFile().toByteArray());
        assertEquals(each.mediaType(), file.getEmbeddedFile().getSubtype());
      }
    }
    String text = PdfText.byEveryReader(pdf(withTables())).get(0);
    assertTrue(text.contains("inside this PDF"), text);
  }

  @Test
  void namesATableThatIsTooLarge() throws Exception {
    byte[] noise = new byte[Attachments.ROOM + 1000];
    new java.util.Random(1).nextBytes(noise);
    Attachment large =
        new Attachment("noise.csv", "text/csv", Attachment.Relation.SUPPLEMENT, "noise", noise);
    byte[] pdf = pdf(PdfOptions.defaults().withAttachments(List.of(large)));
    assertTrue(pdf.length < 200_000);
    String text = PdfText.byEveryReader(pdf).get(0);
    assertTrue(text.contains("too large to be inside"), text);
    assertTrue(text.contains(Packed.of(large).sha256()), text);
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_2_U));
  }

  @Test
  void saysWhatItIsInItsMetadata() throws Exception {
    try (PDDocument document = Loader.loadPDF(pdf(PdfOptions.defaults()))) {
      var information = document.getDocumentInformation();
      assertTrue(information.getTitle().contains("River Aske at Heron Ferry"));
      assertTrue(information.getCreator().startsWith("crossreach "));
      // The second pass ends at 09:24:38.95 on the clock of its record.
      assertEquals(9, information.getCreationDate().get(java.util.Calendar.HOUR_OF_DAY));
      assertEquals(24, information.getCreationDate().get(java.util.Calendar.MINUTE));
      assertEquals("en", document.getDocumentCatalog().getLanguage());
    }
  }

  @Test
  void isTheSameInEveryLocaleAndZone() throws Exception {
    byte[] here = pdf(withTables());
    Locale locale = Locale.getDefault();
    TimeZone zone = TimeZone.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
      assertArrayEquals(here, pdf(withTables()));
      Locale.setDefault(Locale.forLanguageTag("tr-TR"));
      assertArrayEquals(here, pdf(withTables()));
    } finally {
      Locale.setDefault(locale);
      TimeZone.setDefault(zone);
    }
  }

  @Test
  void isTheSameFromSeveralThreadsAtOnce() throws Exception {
    byte[] alone = pdf(PdfOptions.defaults());
    ExecutorService workers = Executors.newFixedThreadPool(4);
    try {
      List<Callable<byte[]>> jobs = new ArrayList<>();
      for (int j = 0; j < 12; j++) {
        jobs.add(() -> pdf(PdfOptions.defaults()));
      }
      for (Future<byte[]> each : workers.invokeAll(jobs)) {
        assertArrayEquals(alone, each.get());
      }
    } finally {
      workers.shutdownNow();
    }
  }
}
