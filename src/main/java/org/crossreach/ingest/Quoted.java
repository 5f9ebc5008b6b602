package org.crossreach.ingest;

import java.nio.CharBuffer;

/**
 * Text from a file, made fit for a message: cut when long, and without control characters, which
 * could steer a terminal.
 */
final class Quoted {

  /** Number of characters of a text that are shown. */
  private static final int SHOWN = 40;

  private Quoted() {}

  /** The text between quotation marks, for example {@code "0,25"}; {@code nothing} when empty. */
  static String of(CharSequence text) {
    return text.length() == 0
        ? "nothing"
        : '"'
            + cut(text)
            + '"'
            + (text.length() > SHOWN ? " (" + text.length() + " characters)" : "");
  }

  /** A number as people write it: without decimals when it is whole. */
  static String number(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e15
        ? Long.toString((long) value)
        : Double.toString(value);
  }

  /** The text's first characters. */
  static String cut(CharSequence text) {
    return cut(text, SHOWN);
  }

  /** The text's first characters, at most a given number of them. */
  static String cut(CharSequence text, int most) {
    return text.length() > most ? plain(text.subSequence(0, most)) + "…" : plain(text);
  }

  /** A slice of an array between quotation marks. */
  static String of(char[] text, int from, int to) {
    return of(CharBuffer.wrap(text, from, to - from));
  }

  /** The text with every control or unpaired character replaced by its code. */
  static String plain(CharSequence text) {
    StringBuilder shown = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char character = text.charAt(i);
      if (!isHarmless(text, i)) {
        String code = Integer.toHexString(character);
        shown.append("\\u").append("0000", 0, 4 - code.length()).append(code);
      } else {
        shown.append(character);
      }
    }
    return shown.toString();
  }

  private static boolean isHarmless(CharSequence text, int index) {
    char character = text.charAt(index);
    if (character >= ' ' && character < 0x7f) {
      return true;
    }
    if (Character.isHighSurrogate(character)) {
      return index + 1 < text.length() && Character.isLowSurrogate(text.charAt(index + 1));
    }
    if (Character.isLowSurrogate(character)) {
      return index > 0 && Character.isHighSurrogate(text.charAt(index - 1));
    }
    int type = Character.getType(character);
    return type != Character.CONTROL
        && type != Character.FORMAT
        && type != Character.LINE_SEPARATOR
        && type != Character.PARAGRAPH_SEPARATOR;
  }
}
