package org.crossreach.settings;

/**
 * How a record made with a wrong speed of sound is corrected.
 *
 * @param formula which published formula gives the true speed
 * @param temperatureDegC water temperature to use instead of the sensor's (deg C), NaN to use the
 *     sensor's
 */
public record SoundSpeed(SoundSpeedFormula formula, double temperatureDegC) {

  /** Formula by the water, temperature by the sensor. */
  public static SoundSpeed defaults() {
    return new SoundSpeed(SoundSpeedFormula.AUTO, Double.NaN);
  }
}
