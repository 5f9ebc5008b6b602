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

  /** Number of powers of ten that are exact as doubles: 10⁰ to 10²². */
  private static final int EXACT_POWERS = 23;

  /**
   * The powers of ten that are exact as doubles, once with plus and once with minus: to divide by a
   * negative power costs less than a branch on a sign that nobody can foresee.
   */
  private static final double[] SIGNED_POWERS = new double[2 * EXACT_POWERS];

  static {
    double power = 1;
    for (int i = 0; i < EXACT_POWERS; i++) {
      SIGNED_POWERS[i] = power;
      SIGNED_POWERS[EXACT_POWERS + i] = -power;
      power *= 10;
    }
  }

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
    int minus = from < to && text[from] == '-' ? 1 : 0;
    int at = from + minus;
    int digits = to - at;
    int decimals = 0;
    long whole = 0;
    int digit;
    while (at < to && (digit = text[at] - '0') >= 0 && digit <= 9) {
      whole = 10 * whole + digit;
      at++;
    }
    if (at < to && text[at] == '.') {
      digits--;
      at++;
      decimals = to - at;
      while (at < to && (digit = text[at] - '0') >= 0 && digit <= 9) {
        whole = 10 * whole + digit;
        at++;
      }
    }
    double value = at == to && digits > 0 ? of(whole, digits, decimals, minus) : Double.NaN;
    if (!Double.isNaN(value)) {
      return value;
    }
    return isDecimal(text, from, to)
        ? JavaDoubleParser.parseDouble(text, from, to - from)
        : Double.NaN;
  }

  /**
   * The number that some digits make.
   *
   * @param whole the digits as a whole number, whatever it is when they are too many for a long
   * @param digits how many they are
   * @param decimals how many of them stand behind the point
   * @param minus 1 when the number is negative, else 0
   * @return the number, NaN when the digits are too many to be exact
   */
  static double of(long whole, int digits, int decimals, int minus) {
    return digits <= SAFE_DIGITS && whole <= EXACT
        ? whole / SIGNED_POWERS[minus * EXACT_POWERS + decimals]
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
