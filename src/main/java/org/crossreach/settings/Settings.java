package org.crossreach.settings;

/**
 * Every choice by which a measurement is reduced.
 *
 * @param boatVelocity source of the boat's velocity
 * @param method how velocities become discharge
 * @param section line on which velocities are projected
 * @param depth which beams give the depth
 * @param top how the unmeasured water near the surface is estimated
 * @param bottom how the unmeasured water near the bed is estimated
 * @param exponent exponent of the power law
 * @param edgeEnsembles number of ensembles over which depth and velocity beside an edge are
 *     averaged, at least 1
 * @param screening which samples are left out
 * @param soundSpeed correction of the speed of sound
 * @param movingBed correction of a moving bed
 */
public record Settings(
    BoatVelocity boatVelocity,
    Method method,
    SectionLine section,
    DepthSource depth,
    TopLaw top,
    BottomLaw bottom,
    Exponent exponent,
    int edgeEnsembles,
    Screening screening,
    SoundSpeed soundSpeed,
    MovingBed movingBed) {

  public Settings {
    if (edgeEnsembles < 1) {
      throw new IllegalArgumentException("edgeEnsembles must be at least 1, not " + edgeEnsembles);
    }
  }

  /** The documented default of every choice. */
  public static Settings defaults() {
    return new Settings(
        BoatVelocity.BOTTOM_TRACK,
        Method.SECTION_NORMAL,
        SectionLine.EACH_PASS,
        DepthSource.SLANT_MEAN,
        TopLaw.POWER,
        BottomLaw.POWER,
        new Exponent(ExponentRule.FIXED, Exponent.ONE_SIXTH),
        /* edgeEnsembles= */ 10,
        Screening.defaults(),
        SoundSpeed.defaults(),
        MovingBed.NONE);
  }

  /** The same choices with another method. */
  public Settings withMethod(Method method) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another section. */
  public Settings withSection(SectionLine section) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another depth. */
  public Settings withDepth(DepthSource depth) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another top. */
  public Settings withTop(TopLaw top) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another bottom. */
  public Settings withBottom(BottomLaw bottom) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another exponent. */
  public Settings withExponent(Exponent exponent) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another screening. */
  public Settings withScreening(Screening screening) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }

  /** The same choices with another soundSpeed. */
  public Settings withSoundSpeed(SoundSpeed soundSpeed) {
    return new Settings(
        boatVelocity,
        method,
        section,
        depth,
        top,
        bottom,
        exponent,
        edgeEnsembles,
        screening,
        soundSpeed,
        movingBed);
  }
}
