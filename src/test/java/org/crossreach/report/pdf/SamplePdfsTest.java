package org.crossreach.report.pdf;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.Decimals;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/** Every PDF that the samples give conforms, holds its numbers as text, and stays small. */
class SamplePdfsTest {

  private static final int LARGEST = 400_000;

  private static List<Path> samples() throws Exception {
    try (Stream<Path> entries = Files.list(Path.of("sample-transects"))) {
      return entries.filter(Files::isDirectory).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("samples")
  void conforms(Path sample) throws Exception {
    Result result =
        Result.of(new Reducer(1).reduce(MeasurementFolder.read(sample), SettingsFile.read(sample)));
    Decimals decimals =
        Decimals.showing(
            4, result.reduction().passes().stream().mapToDouble(PassDischarge::totalM3s).toArray());
    check(
        MeasurementPdf.bytes(result, PdfOptions.defaults().withAttachments(Enclosures.of(result))),
        decimals.of(result.summary().dischargeM3s().mean()));
    for (PassDischarge pass : result.reduction().passes()) {
      check(
          TransectPdf.bytes(
              result, pass, PdfOptions.defaults().withAttachments(Enclosures.of(result, pass))),
          decimals.of(pass.totalM3s()));
    }
  }

  private static void check(byte[] pdf, String discharge) throws Exception {
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFA_3_U));
    assertEquals(List.of(), Verdict.faults(pdf, PDFAFlavour.PDFUA_1));
    assertTrue(pdf.length < LARGEST, pdf.length + " bytes");
    for (String text : PdfText.byEveryReader(pdf)) {
      assertTrue(text.contains(discharge + " m³/s"), discharge + " is not in " + text);
    }
  }
}
