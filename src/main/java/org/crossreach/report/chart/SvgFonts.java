package org.crossreach.report.chart;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Base64;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TTFSubsetter;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/**
 * Puts the letters that an SVG uses into it, so that a browser shows them on a machine without our
 * typeface.
 */
final class SvgFonts {

  private static final Pattern TEXT =
      Pattern.compile("<text[^>]*font-family: \"([^\"]*)\"[^>]*>([^<]*)</text>");

  /** What a browser needs of a font: outlines, widths and which letter is which. */
  private static final List<String> TABLES =
      List.of("OS/2", "cmap", "glyf", "head", "hhea", "hmtx", "loca", "maxp", "name", "post");

  private SvgFonts() {}

  /** The family of a face in an SVG. */
  private static String family(Face face) {
    return face.size(1).getFamily();
  }

  /** The SVG with a style sheet that holds its letters, as the first thing inside. */
  static String embedded(String svg) {
    Map<Face, TreeSet<Integer>> letters = new EnumMap<>(Face.class);
    Matcher texts = TEXT.matcher(svg);
    while (texts.find()) {
      for (Face face : Face.values()) {
        if (family(face).equals(texts.group(1))) {
          TreeSet<Integer> used = letters.computeIfAbsent(face, each -> new TreeSet<>());
          texts.group(2).codePoints().forEach(used::add);
          break; // Upright and slanted share a family; pictures have upright letters only.
        }
      }
    }
    StringBuilder style = new StringBuilder("<style>");
    letters.forEach(
        (face, used) ->
            style
                .append("@font-face{font-family:\"")
                .append(family(face))
                .append("\";src:url(data:font/ttf;base64,")
                .append(Base64.getEncoder().encodeToString(subset(face, used)))
                .append(")}"));
    style.append("</style>");
    int inside = svg.indexOf('>') + 1;
    return svg.substring(0, inside) + style + svg.substring(inside);
  }

  private static byte[] subset(Face face, TreeSet<Integer> letters) {
    try (TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(face.bytes()))) {
      TTFSubsetter subsetter = new TTFSubsetter(font, TABLES);
      letters.forEach(subsetter::add);
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      subsetter.writeToStream(bytes);
      return bytes.toByteArray();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
