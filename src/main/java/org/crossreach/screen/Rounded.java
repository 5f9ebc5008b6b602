package org.crossreach.screen;

/** A number as text for a person, rounded half up, the same in every locale. */
final class Rounded {

  private Rounded() {}

  /**
   * The text of a number of less than 10^12.
   *
   * @param decimals digits after the point, 0 to 6
   */
  static String of(double value, int decimals) {
    long unit = 1;
    for (int d = 0; d < decimals; d++) {
      unit *= 10;
    }
    long scaled = Math.round(Math.abs(value) * unit);
    String sign = value < 0 && scaled > 0 ? "-" : "";
    if (decimals == 0) {
      return sign + scaled;
    }
    String fraction = Long.toString(unit + scaled % unit).substring(1);
    return sign + scaled / unit + "." + fraction;
  }
}
