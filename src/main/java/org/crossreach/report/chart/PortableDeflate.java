package org.crossreach.report.chart;

import com.jcraft.jzlib.Deflater;
import com.jcraft.jzlib.GZIPException;
import com.jcraft.jzlib.JZlib;
import java.util.Arrays;

/**
 * Compresses bytes to the zlib format, RFC 1950, by an implementation in Java, so that the result
 * is the same on every machine; the one in the platform's library is not.
 */
public final class PortableDeflate {

  private PortableDeflate() {}

  /**
   * Compresses.
   *
   * @param bytes any bytes, also none
   */
  public static byte[] compress(byte[] bytes) {
    try {
      Deflater deflater = new Deflater(JZlib.Z_DEFAULT_COMPRESSION);
      // The bound that zlib itself gives for any content.
      byte[] room = new byte[bytes.length + (bytes.length >> 8) + 64];
      deflater.setInput(bytes);
      deflater.setOutput(room);
      int state = deflater.deflate(JZlib.Z_FINISH);
      if (state != JZlib.Z_STREAM_END) {
        throw new IllegalStateException("deflate ended in state " + state);
      }
      byte[] compressed = Arrays.copyOf(room, (int) deflater.getTotalOut());
      deflater.end();
      return compressed;
    } catch (GZIPException impossible) {
      throw new IllegalStateException(impossible);
    }
  }
}
