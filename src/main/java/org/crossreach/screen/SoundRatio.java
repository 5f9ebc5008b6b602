package org.crossreach.screen;

/**
 * True over used speed of sound, by which velocities and distances along the beams are multiplied.
 *
 * <p>1.01 when the sound was 1 % faster than the record says. Immutable.
 */
final class SoundRatio {

  /** The record is taken as it is. */
  static final SoundRatio NONE = new SoundRatio(new double[] {1});

  private final double[] ratio;

  /**
   * Takes over the ratios.
   *
   * @param ratio one for each ensemble, or a single one for all
   */
  SoundRatio(double[] ratio) {
    this.ratio = ratio;
  }

  /** The ratio for an ensemble. */
  double at(int ensemble) {
    return ratio[ratio.length == 1 ? 0 : ensemble];
  }
}
