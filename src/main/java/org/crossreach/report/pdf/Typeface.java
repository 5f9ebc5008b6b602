package org.crossreach.report.pdf;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.EnumMap;
import java.util.Map;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.crossreach.report.chart.Face;

/** The widths of a face's characters, from the font's own tables: the same on every machine. */
final class Typeface {

  private static final Map<Face, Typeface> ALL = new EnumMap<>(Face.class);
  private static final int CHARACTERS = 0x2300;
  private static final String STAND_IN = "?";

  static {
    for (Face face : Face.values()) {
      ALL.put(face, new Typeface(face));
    }
  }

  /** Width over size of each character, negative where the face has none. */
  private final float[] widths = new float[CHARACTERS];

  private Typeface(Face face) {
    try (TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(face.bytes()))) {
      CmapLookup characters = font.getUnicodeCmapLookup();
      for (int c = 0; c < CHARACTERS; c++) {
        int glyph = characters.getGlyphId(c);
        widths[c] = glyph == 0 ? -1 : font.getAdvanceWidth(glyph) / (float) font.getUnitsPerEm();
      }
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  static Typeface of(Face face) {
    return ALL.get(face);
  }

  /** Whether the face can show every character of a text. */
  boolean shows(String text) {
    return text.codePoints().allMatch(this::shows);
  }

  private boolean shows(int character) {
    return character >= ' ' && character < CHARACTERS && widths[character] >= 0;
  }

  /** The text with {@code ?} for each character that the face does not have. */
  String shown(String text) {
    if (shows(text)) {
      return text;
    }
    StringBuilder shown = new StringBuilder();
    text.codePoints()
        .forEach(
            c -> {
              if (shows(c)) {
                shown.appendCodePoint(c);
              } else {
                shown.append(Character.isWhitespace(c) ? " " : STAND_IN);
              }
            });
    return shown.toString();
  }

  /** Width of a text that the face {@linkplain #shows shows} (pt). */
  double width(String text, double size) {
    double width = 0;
    for (int i = 0; i < text.length(); i++) {
      width += widths[text.charAt(i)];
    }
    return width * size;
  }
}
