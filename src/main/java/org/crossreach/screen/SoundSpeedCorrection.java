package org.crossreach.screen;

/**
 * How the speed of sound of a record was corrected.
 *
 * @param formula name of the formula, a key of {@link org.crossreach.settings.SoundSpeedFormula},
 *     never {@code auto}
 * @param temperatureSource {@code given}, {@code sensor} or {@code check}
 * @param temperatureDegC temperature of the water, mean over the ensembles (deg C)
 * @param salinityPpt salinity (parts per thousand)
 * @param usedMps speed of sound that the record was made with (m/s)
 * @param trueMps speed of sound by the formula, mean over the ensembles (m/s)
 */
public record SoundSpeedCorrection(
    String formula,
    String temperatureSource,
    double temperatureDegC,
    double salinityPpt,
    double usedMps,
    double trueMps) {

  /** True over used speed of sound (1.01 → the sound was 1 % faster), mean over the ensembles. */
  public double ratio() {
    return trueMps / usedMps;
  }
}
