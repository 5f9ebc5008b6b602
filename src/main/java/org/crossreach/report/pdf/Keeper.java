package org.crossreach.report.pdf;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.time.OffsetDateTime;
import java.util.GregorianCalendar;
import java.util.List;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdfwriter.compress.CompressParameters;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentCatalog;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;
import org.crossreach.report.chart.PortableDeflate;

/** Makes a finished book into a file that an archive keeps: PDF/A-2u or PDF/A-3u, and PDF/UA-1. */
final class Keeper {

  private static final String LANGUAGE = "en";
  private static final float PDF_VERSION = 1.7f;

  private Keeper() {}

  /**
   * Finishes a book.
   *
   * @param book its pages, all laid out
   * @param imprint what it says about itself
   * @param attachments files inside, already compressed
   * @return the bytes of the file, the same for the same pages on every machine
   */
  static byte[] finish(Book book, Imprint imprint, List<Packed> attachments) throws IOException {
    PDDocument pdf = book.pdf();
    pdf.setVersion(PDF_VERSION);
    book.structure().attach(pdf);
    describe(pdf, imprint, attachments.isEmpty() ? 2 : 3);
    nameColours(pdf);
    Attachments.embed(pdf, attachments, calendar(imprint.time()));
    pdf.setDocumentId(id(imprint.fingerprint()));
    // Saving cuts the fonts down to what is used; only then can all streams be packed again.
    pdf.save(OutputStream.nullOutputStream(), CompressParameters.NO_COMPRESSION);
    Repacking.repack(pdf.getDocument().getTrailer());
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    pdf.save(bytes, CompressParameters.NO_COMPRESSION);
    return bytes.toByteArray();
  }

  private static void describe(PDDocument pdf, Imprint imprint, int part) throws IOException {
    PDDocumentInformation information = pdf.getDocumentInformation();
    information.setTitle(imprint.title());
    information.setSubject(imprint.description());
    information.setCreator(imprint.creator());
    information.setProducer(imprint.creator());
    information.setCreationDate(calendar(imprint.time()));
    information.setModificationDate(calendar(imprint.time()));
    PDDocumentCatalog catalog = pdf.getDocumentCatalog();
    catalog.setLanguage(LANGUAGE);
    PDViewerPreferences preferences = new PDViewerPreferences(new COSDictionary());
    preferences.setDisplayDocTitle(true);
    catalog.setViewerPreferences(preferences);
    COSStream metadata = pdf.getDocument().createCOSStream();
    metadata.setItem(COSName.TYPE, COSName.METADATA);
    metadata.setItem(COSName.SUBTYPE, COSName.getPDFName("XML"));
    try (OutputStream raw = metadata.createRawOutputStream()) {
      raw.write(
          new Xmp(
                  imprint.title(),
                  imprint.description(),
                  LANGUAGE,
                  imprint.creator(),
                  imprint.time(),
                  part)
              .bytes());
    }
    catalog.getCOSObject().setItem(COSName.METADATA, metadata);
  }

  /** Says that colours are sRGB. */
  private static void nameColours(PDDocument pdf) throws IOException {
    COSStream profile = pdf.getDocument().createCOSStream();
    profile.setInt(COSName.N, 3);
    profile.setItem(COSName.FILTER, COSName.FLATE_DECODE);
    try (OutputStream raw = profile.createRawOutputStream()) {
      raw.write(PortableDeflate.compress(SrgbProfile.bytes()));
    }
    COSDictionary intent = new COSDictionary();
    intent.setItem(COSName.TYPE, COSName.OUTPUT_INTENT);
    intent.setItem(COSName.S, COSName.getPDFName("GTS_PDFA1"));
    intent.setItem(COSName.OUTPUT_CONDITION_IDENTIFIER, new COSString("sRGB"));
    intent.setItem(COSName.INFO, new COSString("sRGB, IEC 61966-2-1:1999"));
    intent.setItem(COSName.DEST_OUTPUT_PROFILE, profile);
    COSArray intents = new COSArray();
    intents.add(intent);
    pdf.getDocumentCatalog().getCOSObject().setItem(COSName.OUTPUT_INTENTS, intents);
  }

  private static GregorianCalendar calendar(OffsetDateTime time) {
    return GregorianCalendar.from(time.toZonedDateTime());
  }

  private static long id(String fingerprint) {
    return Long.parseUnsignedLong(fingerprint.substring(0, 16), 16);
  }
}
