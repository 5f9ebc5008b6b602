package org.crossreach.report.pdf;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.Calendar;
import java.util.Comparator;
import java.util.List;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSStream;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;

/**
 * The files that travel inside a PDF and those that would make it too large.
 *
 * @param inside compressed, in the order given
 * @param beside the others
 */
record Attachments(List<Packed> inside, List<Packed> beside) {

  /**
   * Room for all files inside, compressed (bytes). Pages and fonts take about 150,000; together
   * they stay within 400,000.
   */
  static final int ROOM = 220_000;

  /** Decides what travels inside: each file, in order, that still fits. */
  static Attachments of(List<Attachment> attachments) {
    List<Packed> inside = new ArrayList<>();
    List<Packed> beside = new ArrayList<>();
    int taken = 0;
    for (Attachment attachment : attachments) {
      Packed packed = Packed.of(attachment);
      if (taken + packed.compressed().length <= ROOM) {
        taken += packed.compressed().length;
        inside.add(packed);
      } else {
        beside.add(packed);
      }
    }
    return new Attachments(inside, beside);
  }

  /** Hangs files into a document, as PDF/A-3 wants them (ISO 19005-3, 6.8). */
  static void embed(PDDocument pdf, List<Packed> files, Calendar time) throws IOException {
    if (files.isEmpty()) {
      return;
    }
    List<Packed> sorted = new ArrayList<>(files);
    sorted.sort(Comparator.comparing(each -> each.attachment().name()));
    COSArray associated = new COSArray();
    COSArray names = new COSArray();
    for (Packed file : sorted) {
      COSDictionary specification = specification(pdf, file, time);
      associated.add(specification);
      names.add(new COSString(file.attachment().name()));
      names.add(specification);
    }
    COSDictionary tree = new COSDictionary();
    tree.setItem(COSName.NAMES, names);
    COSDictionary dictionary = new COSDictionary();
    dictionary.setItem(COSName.EMBEDDED_FILES, tree);
    COSDictionary catalog = pdf.getDocumentCatalog().getCOSObject();
    catalog.setItem(COSName.NAMES, dictionary);
    catalog.setItem(COSName.getPDFName("AF"), associated);
  }

  private static COSDictionary specification(PDDocument pdf, Packed file, Calendar time)
      throws IOException {
    Attachment attachment = file.attachment();
    COSStream stream = pdf.getDocument().createCOSStream();
    try (OutputStream raw = stream.createRawOutputStream()) {
      raw.write(file.compressed());
    }
    stream.setItem(COSName.TYPE, COSName.EMBEDDED_FILE);
    stream.setItem(COSName.SUBTYPE, COSName.getPDFName(attachment.mediaType()));
    stream.setItem(COSName.FILTER, COSName.FLATE_DECODE);
    COSDictionary parameters = new COSDictionary();
    parameters.setInt(COSName.SIZE, attachment.bytes().length);
    parameters.setDate(COSName.MOD_DATE, time);
    parameters.setItem(
        COSName.getPDFName("CheckSum"), new COSString(Packed.digest("MD5", attachment.bytes())));
    stream.setItem(COSName.PARAMS, parameters);
    COSDictionary embedded = new COSDictionary();
    embedded.setItem(COSName.F, stream);
    embedded.setItem(COSName.UF, stream);
    COSDictionary specification = new COSDictionary();
    specification.setItem(COSName.TYPE, COSName.FILESPEC);
    specification.setItem(COSName.F, new COSString(attachment.name()));
    specification.setItem(COSName.UF, new COSString(attachment.name()));
    specification.setItem(COSName.DESC, new COSString(attachment.description()));
    specification.setItem(
        COSName.getPDFName("AFRelationship"), COSName.getPDFName(attachment.relation().key()));
    specification.setItem(COSName.EF, embedded);
    return specification;
  }
}
