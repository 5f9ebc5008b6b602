package org.crossreach.settings;

import java.util.List;

/**
 * Which samples are to be left out, and how their limits are found.
 *
 * @param errorVelocity largest departure of the error velocity of the water from its median (m/s)
 * @param verticalVelocity largest departure of the vertical velocity of the water from its median
 *     (m/s)
 * @param correlation lowest correlation (0 to 1)
 * @param intensity lowest intensity (dB)
 * @param goodPct lowest share of pings used (%)
 * @param threeBeam whether velocities from three beams are accepted
 * @param spikes largest departure of a cell's velocity from its neighbours in time and depth (m/s)
 * @param bottomErrorVelocity largest departure of the error velocity of bottom tracking from its
 *     median (m/s)
 * @param bottomVerticalVelocity largest departure of the vertical velocity of bottom tracking from
 *     its median (m/s)
 * @param boatSpeed largest departure of the boat's velocity from its running median (m/s)
 * @param depthBeams largest departure of a beam's depth from its running median and from the other
 *     beams, as a share of depth (0.2 = 20 %)
 * @param minimumCells fewest usable cells with which an ensemble is used, at least 1
 * @param leaveOutTopM depth below the surface above which cells are left out (m)
 * @param exclusions ensembles left out by hand
 */
public record Screening(
    Limit errorVelocity,
    Limit verticalVelocity,
    Limit correlation,
    Limit intensity,
    Limit goodPct,
    boolean threeBeam,
    Limit spikes,
    Limit bottomErrorVelocity,
    Limit bottomVerticalVelocity,
    Limit boatSpeed,
    Limit depthBeams,
    int minimumCells,
    double leaveOutTopM,
    List<Exclusion> exclusions) {

  public Screening {
    exclusions = List.copyOf(exclusions);
    if (minimumCells < 1) {
      throw new IllegalArgumentException("minimumCells must be at least 1, not " + minimumCells);
    }
    if (!(leaveOutTopM >= 0)) {
      throw new IllegalArgumentException("leaveOutTopM must not be negative: " + leaveOutTopM);
    }
  }

  /** Every screen that finds its own limit is on; those that depend on the instrument are off. */
  public static Screening defaults() {
    return new Screening(
        /* errorVelocity= */ Limit.AUTO,
        /* verticalVelocity= */ Limit.AUTO,
        /* correlation= */ Limit.OFF,
        /* intensity= */ Limit.OFF,
        /* goodPct= */ Limit.OFF,
        /* threeBeam= */ true,
        /* spikes= */ Limit.AUTO,
        /* bottomErrorVelocity= */ Limit.AUTO,
        /* bottomVerticalVelocity= */ Limit.AUTO,
        /* boatSpeed= */ Limit.AUTO,
        /* depthBeams= */ Limit.AUTO,
        /* minimumCells= */ 1,
        /* leaveOutTopM= */ 0.0,
        List.of());
  }

  /** No screen at all. */
  public static Screening off() {
    return new Screening(
        /* errorVelocity= */ Limit.OFF,
        /* verticalVelocity= */ Limit.OFF,
        /* correlation= */ Limit.OFF,
        /* intensity= */ Limit.OFF,
        /* goodPct= */ Limit.OFF,
        /* threeBeam= */ true,
        /* spikes= */ Limit.OFF,
        /* bottomErrorVelocity= */ Limit.OFF,
        /* bottomVerticalVelocity= */ Limit.OFF,
        /* boatSpeed= */ Limit.OFF,
        /* depthBeams= */ Limit.OFF,
        /* minimumCells= */ 1,
        /* leaveOutTopM= */ 0.0,
        List.of());
  }

  /** The same choices, three beams accepted or not. */
  public Screening withThreeBeam(boolean threeBeam) {
    return new Screening(
        errorVelocity,
        verticalVelocity,
        correlation,
        intensity,
        goodPct,
        threeBeam,
        spikes,
        bottomErrorVelocity,
        bottomVerticalVelocity,
        boatSpeed,
        depthBeams,
        minimumCells,
        leaveOutTopM,
        exclusions);
  }

  /** The same choices, with another fewest number of cells. */
  public Screening withMinimumCells(int minimumCells) {
    return new Screening(
        errorVelocity,
        verticalVelocity,
        correlation,
        intensity,
        goodPct,
        threeBeam,
        spikes,
        bottomErrorVelocity,
        bottomVerticalVelocity,
        boatSpeed,
        depthBeams,
        minimumCells,
        leaveOutTopM,
        exclusions);
  }

  /** The same choices, with another depth to leave out (m). */
  public Screening withLeaveOutTopM(double leaveOutTopM) {
    return new Screening(
        errorVelocity,
        verticalVelocity,
        correlation,
        intensity,
        goodPct,
        threeBeam,
        spikes,
        bottomErrorVelocity,
        bottomVerticalVelocity,
        boatSpeed,
        depthBeams,
        minimumCells,
        leaveOutTopM,
        exclusions);
  }

  /** The same choices, with other ensembles left out by hand. */
  public Screening withExclusions(List<Exclusion> exclusions) {
    return new Screening(
        errorVelocity,
        verticalVelocity,
        correlation,
        intensity,
        goodPct,
        threeBeam,
        spikes,
        bottomErrorVelocity,
        bottomVerticalVelocity,
        boatSpeed,
        depthBeams,
        minimumCells,
        leaveOutTopM,
        exclusions);
  }
}
