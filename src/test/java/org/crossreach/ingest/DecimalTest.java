package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A decimal is read to the very bit as {@link Double#parseDouble} reads it, which the Java SE
 * specification requires to be the nearest double (ties to even).
 */
class DecimalTest {

  private static double parse(String text) {
    String around = "9" + text + "9"; // digits beyond the slice must not be read
    return Decimal.parse(around.toCharArray(), 1, 1 + text.length());
  }

  private static void assertSameBits(String text) {
    double expected = Double.parseDouble(text);
    double actual = parse(text);
    if (Double.doubleToRawLongBits(expected) != Double.doubleToRawLongBits(actual)) {
      assertEquals(expected, actual, text);
      assertEquals(Double.doubleToRawLongBits(expected), Double.doubleToRawLongBits(actual), text);
    }
  }

  @Test
  void readsMillionsOfDecimalsOfEverydayLength() {
    Random random = new Random(2031);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 2_000_000; i++) {
      text.setLength(0);
      if (random.nextInt(3) == 0) {
        text.append('-');
      }
      appendDigits(text, random, 1 + random.nextInt(6));
      if (random.nextInt(8) != 0) {
        text.append('.');
        appendDigits(text, random, 1 + random.nextInt(9));
      }
      assertSameBits(text.toString());
    }
  }

  @Test
  void readsAMillionDecimalsOfAnyLengthAndExponent() {
    Random random = new Random(418);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 1_000_000; i++) {
      text.setLength(0);
      text.append(random.nextInt(4) == 0 ? "-" : random.nextInt(9) == 0 ? "+" : "");
      int whole = random.nextInt(22);
      appendDigits(text, random, whole);
      if (whole == 0 || random.nextBoolean()) {
        text.append('.');
        appendDigits(text, random, (whole == 0 ? 1 : 0) + random.nextInt(26));
      }
      if (random.nextInt(4) == 0) {
        text.append(random.nextBoolean() ? 'e' : 'E').append(random.nextInt(700) - 350);
      }
      assertSameBits(text.toString());
    }
  }

  @Test
  void readsBackEveryDoubleThatJavaWrites() {
    Random random = new Random(7);
    for (int i = 0; i < 300_000; i++) {
      double value = Double.longBitsToDouble(random.nextLong());
      if (Double.isFinite(value)) {
        assertSameBits(Double.toString(value));
      }
    }
  }

  private static void appendDigits(StringBuilder text, Random random, int count) {
    for (int i = 0; i < count; i++) {
      text.append((char) ('0' + random.nextInt(10)));
    }
  }

  /** Limits of the short way: 2^53 and its neighbours, 18 and 19 digits, 22 and 23 decimals. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "0",
        "-0",
        "0.0",
        "-0.0",
        "+1",
        "5.",
        ".5",
        "-.5",
        "00012.5",
        "1e5",
        "1E-5",
        "1e+5",
        "5.e1",
        "9007199254740991",
        "9007199254740992",
        "9007199254740993",
        "9007199254740993.0",
        "999999999999999999",
        "9999999999999999999",
        "0.123456789012345678",
        "0.0000000000000000000001",
        "0.00000000000000000000001",
        "0.000000000000000001",
        "123456789012345678",
        "1234567890123456789",
        "18446744073709551616",
        "4.9e-324",
        "2e-324",
        "1.7976931348623157e308",
        "1e309",
        "-1e309",
        "2.2250738585072012e-308",
        "0.3",
        "0.1",
        "-32768",
        "8.41",
        "9.5e-1"
      })
  void readsTheLimitsOfTheShortWay(String text) {
    assertSameBits(text);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "-",
        "+",
        ".",
        "-.",
        "+-1",
        "--1",
        "1-",
        "1.2.3",
        "1,2",
        "1 ",
        " 1",
        "1e",
        "1e+",
        "e5",
        "1e5.5",
        "0x10",
        "1f",
        "1d",
        "1L",
        "1_000",
        "NaN",
        "NA",
        "Infinity",
        "\u0661",
        "\uff11",
        "1\u0000",
        "1e5e5",
        ".e5"
      })
  void leavesOutWhatIsNoDecimal(String text) {
    assertEquals(Double.NaN, parse(text));
  }
}
