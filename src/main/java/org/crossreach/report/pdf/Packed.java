package org.crossreach.report.pdf;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import org.crossreach.report.chart.PortableDeflate;

/**
 * An attachment, compressed.
 *
 * @param attachment the file
 * @param compressed its bytes in the zlib format
 */
record Packed(Attachment attachment, byte[] compressed) {

  static Packed of(Attachment attachment) {
    return new Packed(attachment, PortableDeflate.compress(attachment.bytes()));
  }

  /** SHA-256 of the file as it is outside, 64 hexadecimal digits. */
  String sha256() {
    return sha256(attachment.bytes());
  }

  /** SHA-256 of a text in UTF-8, 64 hexadecimal digits. */
  static String sha256(String text) {
    return sha256(text.getBytes(StandardCharsets.UTF_8));
  }

  private static String sha256(byte[] bytes) {
    return HexFormat.of().formatHex(digest("SHA-256", bytes));
  }

  static byte[] digest(String algorithm, byte[] bytes) {
    try {
      return MessageDigest.getInstance(algorithm).digest(bytes);
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException(impossible);
    }
  }
}
