package org.crossreach.report.pdf;

import java.nio.charset.StandardCharsets;
import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/**
 * What a PDF says about itself, as XMP.
 *
 * @param title title of the document
 * @param description what it is about
 * @param language its language, for example {@code en}
 * @param creator program that made it
 * @param time when the last of its data was recorded
 * @param part part of ISO 19005 that it follows: 2, or 3 with files inside
 */
record Xmp(
    String title,
    String description,
    String language,
    String creator,
    OffsetDateTime time,
    int part) {

  private static final DateTimeFormatter TIME =
      DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ssxxx", Locale.ROOT);

  byte[] bytes() {
    String date = TIME.format(time);
    StringBuilder xmp = new StringBuilder(4096);
    xmp.append("<?xpacket begin=\"\uFEFF\" id=\"W5M0MpCehiHzreSzNTczkc9d\"?>\n")
        .append("<x:xmpmeta xmlns:x=\"adobe:ns:meta/\">\n")
        .append("<rdf:RDF xmlns:rdf=\"http://www.w3.org/1999/02/22-rdf-syntax-ns#\">\n")
        .append("<rdf:Description rdf:about=\"\"")
        .append(" xmlns:dc=\"http://purl.org/dc/elements/1.1/\"")
        .append(" xmlns:xmp=\"http://ns.adobe.com/xap/1.0/\"")
        .append(" xmlns:pdf=\"http://ns.adobe.com/pdf/1.3/\"")
        .append(" xmlns:pdfaid=\"http://www.aiim.org/pdfa/ns/id/\"")
        .append(" xmlns:pdfuaid=\"http://www.aiim.org/pdfua/ns/id/\"")
        .append(" xmlns:pdfaExtension=\"http://www.aiim.org/pdfa/ns/extension/\"")
        .append(" xmlns:pdfaSchema=\"http://www.aiim.org/pdfa/ns/schema#\"")
        .append(" xmlns:pdfaProperty=\"http://www.aiim.org/pdfa/ns/property#\">\n");
    element(xmp, "pdfaid:part", Integer.toString(part));
    element(xmp, "pdfaid:conformance", "U");
    element(xmp, "pdfuaid:part", "1");
    element(xmp, "dc:format", "application/pdf");
    alternative(xmp, "dc:title", title);
    alternative(xmp, "dc:description", description);
    xmp.append("<dc:language><rdf:Bag><rdf:li>")
        .append(language)
        .append("</rdf:li></rdf:Bag></dc:language>\n");
    element(xmp, "xmp:CreatorTool", creator);
    element(xmp, "xmp:CreateDate", date);
    element(xmp, "xmp:ModifyDate", date);
    element(xmp, "xmp:MetadataDate", date);
    element(xmp, "pdf:Producer", creator);
    xmp.append(IDENTIFICATION_SCHEMA)
        .append("</rdf:Description>\n</rdf:RDF>\n</x:xmpmeta>\n<?xpacket end=\"r\"?>\n");
    return xmp.toString().getBytes(StandardCharsets.UTF_8);
  }

  /** PDF/A wants every schema described that it does not know: that of PDF/UA is one. */
  private static final String IDENTIFICATION_SCHEMA =
      """
      <pdfaExtension:schemas><rdf:Bag><rdf:li rdf:parseType="Resource">
      <pdfaSchema:schema>PDF/UA identification</pdfaSchema:schema>
      <pdfaSchema:namespaceURI>http://www.aiim.org/pdfua/ns/id/</pdfaSchema:namespaceURI>
      <pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>
      <pdfaSchema:property><rdf:Seq><rdf:li rdf:parseType="Resource">
      <pdfaProperty:name>part</pdfaProperty:name>
      <pdfaProperty:valueType>Integer</pdfaProperty:valueType>
      <pdfaProperty:category>internal</pdfaProperty:category>
      <pdfaProperty:description>Part of ISO 14289</pdfaProperty:description>
      </rdf:li></rdf:Seq></pdfaSchema:property>
      </rdf:li></rdf:Bag></pdfaExtension:schemas>
      """;

  private static void element(StringBuilder xmp, String name, String value) {
    xmp.append('<').append(name).append('>');
    escaped(xmp, value);
    xmp.append("</").append(name).append(">\n");
  }

  private static void alternative(StringBuilder xmp, String name, String value) {
    xmp.append('<').append(name).append("><rdf:Alt><rdf:li xml:lang=\"x-default\">");
    escaped(xmp, value);
    xmp.append("</rdf:li></rdf:Alt></").append(name).append(">\n");
  }

  /** XML text; what XML cannot hold at all becomes a space. */
  private static void escaped(StringBuilder xmp, String value) {
    value
        .codePoints()
        .forEach(
            c -> {
              if (c == '<') {
                xmp.append("&lt;");
              } else if (c == '>') {
                xmp.append("&gt;");
              } else if (c == '&') {
                xmp.append("&amp;");
              } else if (c < ' ' || c >= 0xD800 && c <= 0xDFFF || c == 0xFFFE || c == 0xFFFF) {
                xmp.append(' ');
              } else {
                xmp.appendCodePoint(c);
              }
            });
  }
}
