package org.crossreach.report.pdf;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.Reducer;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparer;
import org.crossreach.evidence.Comparison;
import org.crossreach.report.Decimals;
import org.crossreach.report.chart.River;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Site;
import org.junit.jupiter.api.Test;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/**
 * The PDF of a measurement conforms, and holds passes, spread, directions, choices, notes and
 * inputs.
 */
class MeasurementPdfTest {

  @Test
  void conformsWithAndWithoutTablesInside() throws Exception {
    Result result = River.usual().result();
    byte[] alone = MeasurementPdf.bytes(result, PdfOptions.defaults());
    assertEquals(List.of(), Verdict.faults(alone, PDFAFlavour.PDFA_2_U));
    assertEquals(List.of(), Verdict.faults(alone, PDFAFlavour.PDFUA_1));
    byte[] full =
        MeasurementPdf.bytes(result, PdfOptions.defaults().withAttachments(Enclosures.of(result)));
    assertEquals(List.of(), Verdict.faults(full, PDFAFlavour.PDFA_3_U));
    assertEquals(List.of(), Verdict.faults(full, PDFAFlavour.PDFUA_1));
    assertTrue(full.length < 400_000);
  }

  @Test
  void saysWhatTheResultSays() throws Exception {
    Result result = River.usual().result();
    Spread spread = result.summary().dischargeM3s();
    Decimals one = new Decimals(1);
    for (String text : PdfText.byEveryReader(MeasurementPdf.bytes(result, PdfOptions.defaults()))) {
      for (double value :
          new double[] {
            spread.mean(),
            spread.sd(),
            spread.covPct(),
            spread.rangePct(),
            spread.ci95Half(),
            spread.mean() - spread.ci95Half(),
            result.summary().directions().leftToRightM3s(),
            result.summary().directions().rightToLeftM3s()
          }) {
        assertTrue(text.contains(one.of(value)), value + " is not in " + text);
      }
      for (var pass : result.reduction().passes()) {
        assertTrue(text.contains(pass.pass().name()), text);
        assertTrue(text.contains(one.of(pass.totalM3s())), text);
      }
      assertTrue(text.contains("drifting weed near the left bank"), text);
    }
  }

  @Test
  void saysWhatEveryOtherChoiceWouldGive() throws Exception {
    Result result = River.usual().result();
    Comparison comparison = new Comparer(1).compare(result.reduction());
    Decimals two = new Decimals(2);
    for (String text : PdfText.byEveryReader(MeasurementPdf.bytes(result, PdfOptions.defaults()))) {
      assertTrue(
          text.replaceAll("\\s+", " ").contains(comparison.verdict().sentence()),
          comparison.verdict().sentence() + " is not in " + text);
      for (CombinationResult each : comparison.combinations()) {
        assertTrue(text.contains(two.signed(each.changePct())), each.combination().text());
      }
      assertTrue(text.contains("chosen"), text);
    }
  }

  /** The usual river with something else about it. */
  private static Result changed(Site site, List<Pass> passes, String remarks) throws Exception {
    Measurement usual = River.usual().measurement();
    Measurement measurement =
        new Measurement(
            usual.id(),
            site,
            List.of(),
            remarks,
            Optional.empty(),
            Optional.empty(),
            usual.water(),
            usual.instrument(),
            passes,
            List.of(),
            List.of());
    return Result.of(new Reducer(1).reduce(measurement, Settings.defaults()));
  }

  private static final Site NOWHERE = new Site("", "", "", Double.NaN, Double.NaN);

  @Test
  void conformsWhenHardlyAnythingWasRecorded() throws Exception {
    Result result = changed(NOWHERE, River.usual().measurement().passes().subList(0, 1), "");
    byte[] pdf = MeasurementPdf.bytes(result, PdfOptions.defaults());
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_2_U));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
    String text = PdfText.byEveryReader(pdf).get(0);
    assertTrue(text.contains("From one pass: its spread is"), text);
  }

  @Test
  void keepsNamesInEveryScript() throws Exception {
    Site site = new Site("Überfahrt Ωmega Дон 渡し場", "<&>", "Żółta Rzeka", 0, 0);
    Result result = changed(site, River.usual().measurement().passes(), "tab\there \u0007 bell");
    byte[] pdf = MeasurementPdf.bytes(result, PdfOptions.defaults());
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_2_U));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
    // What the face cannot show is shown as ? and kept whole as the actual text and in the title.
    String text = PdfText.byEveryReader(pdf).get(0);
    assertTrue(text.contains("Żółta Rzeka at Überfahrt Ωmega Дон"), text);
    try (PDDocument document = Loader.loadPDF(pdf)) {
      assertTrue(document.getDocumentInformation().getTitle().contains("渡し場"));
    }
  }

  @Test
  void letsLongListsRunOverPages() throws Exception {
    List<Pass> passes = new ArrayList<>();
    List<Pass> usual = River.usual().measurement().passes();
    for (int p = 0; p < 60; p++) {
      Pass model = usual.get(p % 4);
      passes.add(
          new Pass(
              "pass-" + (100 + p),
              "pass-" + (100 + p) + ".csv",
              model.startBank(),
              true,
              "",
              model.leftEdge(),
              model.rightEdge(),
              model.ensembles(),
              List.of(new Note(Note.Level.NOTE, "long", "word ".repeat(60)))));
    }
    byte[] pdf = MeasurementPdf.bytes(changed(NOWHERE, passes, ""), PdfOptions.defaults());
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
    String text = PdfText.byEveryReader(pdf).get(0);
    for (Pass pass : passes) {
      assertTrue(text.contains(pass.name()), pass.name());
    }
    try (PDDocument document = Loader.loadPDF(pdf)) {
      assertTrue(document.getNumberOfPages() > 2);
    }
  }
}
