package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.util.Random;
import java.util.zip.InflaterInputStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever is compressed comes back whole by the platform's own library. */
class PortableDeflateTest {

  @ParameterizedTest
  @ValueSource(ints = {0, 1, 2, 255, 65_535, 65_536, 1_000_000})
  void comesBackWhole(int size) throws Exception {
    byte[] noise = new byte[size];
    new Random(size).nextBytes(noise);
    byte[] even = new byte[size];
    for (byte[] bytes : new byte[][] {noise, even}) {
      byte[] compressed = PortableDeflate.compress(bytes);
      assertArrayEquals(
          bytes, new InflaterInputStream(new ByteArrayInputStream(compressed)).readAllBytes());
    }
    assertTrue(PortableDeflate.compress(even).length < size / 100 + 20);
  }
}
