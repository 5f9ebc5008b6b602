package org.crossreach.survey;

/**
 * A quantity recorded once per depth cell.
 *
 * <p>The components of the velocity of the water relative to the boat, {@code WATER_1} to {@code
 * WATER_4}, stand in the {@linkplain Frame frame} of the record, in the order given at {@link
 * EnsembleQuantity}.
 */
public enum CellQuantity {
  /** First component of the water's velocity relative to the boat (m/s). */
  WATER_1,
  /** Second component of the water's velocity relative to the boat (m/s). */
  WATER_2,
  /** Third component of the water's velocity relative to the boat (m/s). */
  WATER_3,
  /** Fourth component of the water's velocity relative to the boat (m/s). */
  WATER_4,
  /** Correlation, mean over beams, 0 to 1 (95 % → 0.95). */
  CORRELATION,
  /** Intensity of the echo, mean over beams (dB). */
  INTENSITY_DB,
  /** Share of pings used (%, 0 to 100). */
  GOOD_PCT
}
