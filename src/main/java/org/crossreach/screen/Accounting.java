package org.crossreach.screen;

import java.util.List;
import java.util.Optional;

/**
 * What became of the samples of one pass.
 *
 * @param ensembles number of ensembles
 * @param cells reasons of the cells
 * @param bottomTrack reasons of the bottom-track velocities, one for each ensemble
 * @param depths reasons of the depths, one for each ensemble; a depth that other than the chosen
 *     beams gave counts as used
 * @param limits the limit of each screen that was on
 * @param threeBeamCells number of used cells that rest on three beams
 * @param threeBeamBottomTrack number of used bottom-track velocities that rest on three beams
 * @param unsoundBeam number, from 1, of a beam whose water velocities were not used at all; 0 when
 *     there was none
 * @param depthBeamsLeftOut number of single beams' depths that were left out
 * @param depthsReplaced number of ensembles whose depth comes from other than the chosen beams
 * @param longestWithoutWater longest run of ensembles without a usable cell, if any
 * @param longestWithoutBottomTrack longest run of ensembles without a usable bottom-track velocity,
 *     if any
 * @param soundSpeed how the speed of sound was corrected, if it was
 */
public record Accounting(
    int ensembles,
    Tally cells,
    Tally bottomTrack,
    Tally depths,
    List<FoundLimit> limits,
    long threeBeamCells,
    int threeBeamBottomTrack,
    int unsoundBeam,
    long depthBeamsLeftOut,
    int depthsReplaced,
    Optional<Run> longestWithoutWater,
    Optional<Run> longestWithoutBottomTrack,
    Optional<SoundSpeedCorrection> soundSpeed) {

  public Accounting {
    limits = List.copyOf(limits);
  }

  /** Number of ensembles whose depth the chosen beams gave. */
  public long depthsMeasured() {
    return depths.used() - depthsReplaced;
  }

  /** Number of ensembles whose depth had to be filled in along the track. */
  public long depthsFilled() {
    return depths.rejected();
  }

  /** The limit by which a screen went, if it was on. */
  public Optional<FoundLimit> limit(Criterion criterion) {
    for (FoundLimit each : limits) {
      if (each.criterion() == criterion) {
        return Optional.of(each);
      }
    }
    return Optional.empty();
  }
}
