package org.crossreach.ingest;

import ch.randelshofer.fastdoubleparser.JavaDoubleParser;

/**
 * Decimal numbers read from a slice of characters, without a String.
 *
 * <p>The grammar is {@code [+-] digits [. digits] [e [+-] digits]}, where the digits on one side of
 * the point may be left out ({@code .5}, {@code 5.}). Neither spaces, separators of thousands,
 * hexadecimal digits, type suffixes nor words are part of it.
 *
 * <p>Accuracy: the double nearest to the decimal, as {@link Double#parseDouble} gives it. Digits
 * that make up a whole number of at most 2⁵³ and a power of ten of at most 10²² are both exact as
 * doubles, so that their one division is correctly rounded (Clinger 1990, "How to read floating
 * point numbers accurately", PLDI 1990, doi:10.1145/93542.93557); everything else goes to the full
 * parser.
 */
final class Decimal {

  /** Largest whole number up to which every whole number is a double: 2⁵³. */
  private static final long EXACT = 1L << 53;

  /** Most digits that can be collected in a long without overflow. */
  private static final int SAFE_DIGITS = 18;

  /** The powers of ten that are exact as doubles. */
  private static final double[] TEN_TO = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };

  private Decimal() {}

  /**
   * Reads a decimal number.
   *
   * @param text holds the number
   * @param from index of its first character
   * @param to index after its last character
   * @return the number, infinite when it is too large for a double; NaN when the slice is not a
   *     decimal number
   */
  static double parse(char[] text, int from, int to) {
    int at = from;
    boolean negative = false;
    if (at < to && (text[at] == '-' || text[at] == '+')) {
      negative = text[at] == '-';
      at++;
    }
    int digits = to - at;
    long whole = 0;
    int digit;
    while (at < to && (digit = text[at] - '0') >= 0 && digit <= 9) {
      whole = 10 * whole + digit;
      at++;
    }
    int decimals = 0;
    if (at < to && text[at] == '.') {
      digits--;
      int point = at++;
      while (at < to && (digit = text[at] - '0') >= 0 && digit <= 9) {
        whole = 10 * whole + digit;
        at++;
      }
      decimals = at - point - 1;
    }
    if (at == to && digits > 0 && digits <= SAFE_DIGITS && whole <= EXACT) {
      double value = whole / TEN_TO[decimals];
      return negative ? -value : value;
    }
    return isDecimal(text, from, to)
        ? JavaDoubleParser.parseDouble(text, from, to - from)
        : Double.NaN;
  }

  private static boolean isDecimal(char[] text, int from, int to) {
    int at = skipSign(text, from, to);
    int wholeEnd = skipDigits(text, at, to);
    int digits = wholeEnd - at;
    at = wholeEnd;
    if (at < to && text[at] == '.') {
      int end = skipDigits(text, at + 1, to);
      digits += end - at - 1;
      at = end;
    }
    if (digits == 0) {
      return false;
    }
    if (at < to && (text[at] == 'e' || text[at] == 'E')) {
      int exponent = skipSign(text, at + 1, to);
      at = skipDigits(text, exponent, to);
      return at == to && at > exponent;
    }
    return at == to;
  }

  private static int skipSign(char[] text, int from, int to) {
    return from < to && (text[from] == '-' || text[from] == '+') ? from + 1 : from;
  }

  private static int skipDigits(char[] text, int from, int to) {
    int at = from;
    while (at < to && text[at] >= '0' && text[at] <= '9') {
      at++;
    }
    return at;
  }
}
