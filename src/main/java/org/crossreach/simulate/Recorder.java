package org.crossreach.simulate;

import org.crossreach.survey.Frame;

/** Turns true velocities into the four recorded components of a frame, with the beams' errors. */
final class Recorder {

  private final Profiler profiler;
  private final BeamAxes beams;

  Recorder(Profiler profiler) {
    this.profiler = profiler;
    this.beams =
        new BeamAxes(profiler.instrument().beamAngleDeg(), profiler.instrument().beamAzimuthsDeg());
  }

  /** Standard deviation of a beam over that of a horizontal component. */
  double beamOverHorizontal() {
    return beams.beamOverHorizontal();
  }

  /**
   * What is recorded of a velocity.
   *
   * @param east true east (m/s)
   * @param north true north (m/s)
   * @param headingDeg heading by the compass (deg)
   * @param pitchDeg pitch (deg)
   * @param rollDeg roll (deg)
   * @param beamErrors error of each beam (m/s), positive towards the transducer
   * @param badBeam number of a beam that measures nothing, 0 for none
   * @return the components of the frame (m/s), for beams positive towards the transducer
   */
  double[] record(
      double east,
      double north,
      double headingDeg,
      double pitchDeg,
      double rollDeg,
      double[] beamErrors,
      int badBeam) {
    double[] compass = new double[] {east, north, 0};
    // True vectors stand clockwise of those on the compass's axes by declination and offset.
    double[] onCompass = new Turn(-profiler.instrument().northTurnDeg(), 0, 0).toEarth(compass);
    Turn turn = new Turn(headingDeg, pitchDeg, rollDeg);
    double[] v = turn.fromEarth(onCompass);
    if (profiler.frame() == Frame.BEAM) {
      double[] radial = new double[4];
      for (int beam = 0; beam < 4; beam++) {
        radial[beam] = beam == badBeam - 1 ? Double.NaN : beams.towards(beam, v) + beamErrors[beam];
      }
      return radial;
    }
    double[] errors = beams.fromBeams(beamErrors);
    double[] inside = {v[0] + errors[0], v[1] + errors[1], v[2] + errors[2]};
    double[] axes =
        switch (profiler.frame()) {
          case EARTH -> turn.toEarth(inside);
          case SHIP -> new Turn(headingDeg, 0, 0).fromEarth(turn.toEarth(inside));
          case INSTRUMENT, BEAM -> inside;
        };
    return new double[] {axes[0], axes[1], axes[2], errors[3]};
  }
}
