package org.crossreach.report.pdf;

import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;

/**
 * The colour space sRGB as an ICC profile, the same bytes on every machine.
 *
 * <p>Primaries and transfer curve: IEC 61966-2-1:1999, adapted from D65 to the D50 of profiles by
 * the Bradford transform. Layout: ICC.1:2004-10 (profile version 4.2).
 */
final class SrgbProfile {

  private static final String NAME = "sRGB";
  private static final String RIGHTS = "No copyright, use freely";

  /** XYZ of D50 as every profile has it. Source: ICC.1:2004-10, 7.2.16. */
  private static final double[] D50 = {0.9642, 1.0, 0.8249};

  private static final double[] RED = {0.436035, 0.222488, 0.013916};
  private static final double[] GREEN = {0.385117, 0.716904, 0.097076};
  private static final double[] BLUE = {0.143051, 0.060608, 0.713913};

  /** The Bradford transform from D65 to D50, row by row. */
  private static final double[] ADAPTATION = {
    1.047882, 0.022918, -0.050201,
    0.029587, 0.990479, -0.017059,
    -0.009232, 0.015076, 0.751678
  };

  /** Exponent, scale, offset, slope and limit of the curve: ICC.1:2004-10, function type 3. */
  private static final double[] CURVE = {2.4, 1 / 1.055, 0.055 / 1.055, 1 / 12.92, 0.04045};

  private SrgbProfile() {}

  static byte[] bytes() {
    String[] names = {
      "desc", "cprt", "wtpt", "chad", "rXYZ", "gXYZ", "bXYZ", "rTRC", "gTRC", "bTRC"
    };
    byte[][] tags = {
      text(NAME),
      text(RIGHTS),
      numbers("XYZ ", D50),
      numbers("sf32", ADAPTATION),
      numbers("XYZ ", RED),
      numbers("XYZ ", GREEN),
      numbers("XYZ ", BLUE),
      curve()
    };
    ByteArrayOutputStream data = new ByteArrayOutputStream();
    ByteBuffer directory = ByteBuffer.allocate(4 + 12 * names.length).putInt(names.length);
    int start = 128 + directory.capacity();
    int offset = 0;
    for (int t = 0; t < names.length; t++) {
      // The three curves are one.
      byte[] tag = tags[Math.min(t, tags.length - 1)];
      if (t < tags.length) {
        offset = start + data.size();
        data.writeBytes(tag);
        data.writeBytes(new byte[(4 - tag.length % 4) % 4]);
      }
      directory.put(ascii(names[t])).putInt(offset).putInt(tag.length);
    }
    int size = start + data.size();
    return ByteBuffer.allocate(size)
        .put(header(size))
        .put(directory.array())
        .put(data.toByteArray())
        .array();
  }

  private static byte[] header(int size) {
    ByteBuffer header = ByteBuffer.allocate(128);
    header.putInt(size).putInt(0).putInt(0x04200000);
    header.put(ascii("mntr")).put(ascii("RGB ")).put(ascii("XYZ "));
    for (short part : new short[] {2026, 1, 1, 0, 0, 0}) {
      header.putShort(part);
    }
    header.put(ascii("acsp"));
    header.position(68);
    for (double white : D50) {
      header.putInt(fixed(white));
    }
    return header.array();
  }

  private static byte[] text(String text) {
    byte[] letters = text.getBytes(StandardCharsets.UTF_16BE);
    return ByteBuffer.allocate(28 + letters.length)
        .put(ascii("mluc"))
        .putInt(0)
        .putInt(1)
        .putInt(12)
        .put(ascii("enUS"))
        .putInt(letters.length)
        .putInt(28)
        .put(letters)
        .array();
  }

  private static byte[] numbers(String type, double... values) {
    ByteBuffer buffer = ByteBuffer.allocate(8 + 4 * values.length).put(ascii(type)).putInt(0);
    for (double value : values) {
      buffer.putInt(fixed(value));
    }
    return buffer.array();
  }

  private static byte[] curve() {
    ByteBuffer buffer = ByteBuffer.allocate(12 + 4 * CURVE.length);
    buffer.put(ascii("para")).putInt(0).putShort((short) 3).putShort((short) 0);
    for (double value : CURVE) {
      buffer.putInt(fixed(value));
    }
    return buffer.array();
  }

  /** A number with 16 bits before and 16 after the point. */
  private static int fixed(double value) {
    return (int) Math.round(value * 65536);
  }

  private static byte[] ascii(String text) {
    return text.getBytes(StandardCharsets.US_ASCII);
  }
}
