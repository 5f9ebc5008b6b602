package org.crossreach.report.chart;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;

/**
 * The faces of the typeface Roboto that travel in the jar; reports use no other font.
 *
 * <p>Loading a face prepares the graphics system for a machine without fonts and without a display.
 */
public enum Face {
  /** Running text, labels, numbers. */
  REGULAR("Roboto-Regular"),
  /** Headings and the numbers that matter. */
  MEDIUM("Roboto-Medium"),
  /** Remarks. */
  ITALIC("Roboto-Italic");

  private static final String FOLDER = "/com/formdev/flatlaf/fonts/roboto/";

  private final String postScriptName;
  private final byte[] bytes;
  private final Font font;

  Face(String postScriptName) {
    this.postScriptName = postScriptName;
    this.bytes = read(FOLDER + postScriptName + ".ttf");
    this.font = load(bytes);
  }

  private static byte[] read(String resource) {
    try (InputStream stream = Face.class.getResourceAsStream(resource)) {
      if (stream == null) {
        throw new IllegalStateException("this build has no font " + resource);
      }
      return stream.readAllBytes();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  private static Font load(byte[] bytes) {
    try {
      Path file = FontlessMachine.prepare().resolve(Arrays.hashCode(bytes) + ".ttf");
      Files.write(file, bytes);
      file.toFile().deleteOnExit();
      return Font.createFont(Font.TRUETYPE_FONT, file.toFile());
    } catch (FontFormatException unusable) {
      throw new IllegalStateException("this build has an unusable font", unusable);
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  /** The face in a size (pt). */
  public Font size(double points) {
    return font.deriveFont((float) points);
  }

  /** The bytes of the font's file, a fresh copy. */
  public byte[] bytes() {
    return bytes.clone();
  }

  /** The face that a font was derived from, empty when it is none of ours. */
  public static Optional<Face> of(Font font) {
    for (Face face : values()) {
      if (face.postScriptName.equals(font.getPSName())) {
        return Optional.of(face);
      }
    }
    return Optional.empty();
  }
}
