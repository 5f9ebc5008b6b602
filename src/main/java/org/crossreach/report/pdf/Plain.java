package org.crossreach.report.pdf;

import org.crossreach.report.Decimals;

/** Recorded and chosen numbers, written as short as they are. */
final class Plain {

  private static final Decimals MOST = new Decimals(4);

  private Plain() {}

  /** A number with at most four decimals and no zeros at its end. */
  static String number(double value) {
    String text = MOST.of(value);
    int end = text.length();
    if (text.indexOf('.') >= 0) {
      while (text.charAt(end - 1) == '0') {
        end--;
      }
      end -= text.charAt(end - 1) == '.' ? 1 : 0;
    }
    return text.substring(0, end);
  }
}
