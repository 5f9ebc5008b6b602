package org.crossreach.screen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntPredicate;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Exclusion;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Gaps;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Water;

/**
 * Screens the samples of passes and of moving-bed tests.
 *
 * @param instrument the profiler and its mounting
 * @param water independent readings of the water
 * @param settings which screens are on, and which beams give the depth
 */
public record Screen(Instrument instrument, Water water, Settings settings) {

  /**
   * Turns the velocities onto true east and north and the true speed of sound, and judges every
   * sample.
   *
   * @param name name of the pass, by which ensembles are left out by hand
   * @param ensembles what was recorded
   * @throws IllegalArgumentException when a record in the beam frame has not four beam azimuths
   *     that span the three axes
   */
  public ScreenedPass apply(String name, Ensembles ensembles) {
    Screening screening = settings.screening();
    double[] elapsed = elapsed(ensembles);
    List<FoundLimit> limits = new ArrayList<>();
    SoundSpeedScreen sound =
        SoundSpeedScreen.of(ensembles, elapsed, instrument, water, settings.soundSpeed());
    Attitude attitude = new Attitude(ensembles, instrument, elapsed);
    BeamDepths beams = new BeamDepths(ensembles, sound.ratio(), screening.depthBeams(), limits);
    double[] lowest = lowest(beams, elapsed);

    BeamLayout layout = null;
    int waterBeam = BeamHealth.NONE;
    int bottomBeam = BeamHealth.NONE;
    if (ensembles.frame() == Frame.BEAM) {
      layout = new BeamLayout(instrument.beamAngleDeg(), instrument.beamAzimuthsDeg());
      waterBeam = BeamHealth.ofWater(ensembles, layout, lowest);
      bottomBeam = BeamHealth.ofBottom(ensembles, layout);
    }
    BottomTrack bottom =
        new BottomTrack(
            ensembles,
            new EarthTurn(ensembles, layout, bottomBeam, attitude, sound.ratio()),
            screening,
            limits);
    List<Exclusion> exclusions = exclusions(name);
    boolean[] excluded = excluded(ensembles, exclusions);
    CellFacts facts =
        new CellFacts(
            ensembles,
            new WaterVelocities(
                ensembles, new EarthTurn(ensembles, layout, waterBeam, attitude, sound.ratio())),
            sound.ratio(),
            corrected(ensembles, EnsembleQuantity.FIRST_CELL_M, sound.ratio()),
            corrected(ensembles, EnsembleQuantity.CELL_SIZE_M, sound.ratio()),
            instrument.draftM(),
            lowest,
            boat(ensembles, bottom, bottom.eastMps, EnsembleQuantity.GNSS_EAST_MPS, elapsed),
            boat(ensembles, bottom, bottom.northMps, EnsembleQuantity.GNSS_NORTH_MPS, elapsed),
            Gaps.fillLinear(bottom.upMps, elapsed),
            excluded,
            screening);
    WaterScreen cells = new WaterScreen(facts);
    limits.addAll(cells.found());

    int size = ensembles.size();
    double[] depth = new double[size];
    byte[] depthReasons = new byte[size];
    int replaced = depths(beams, depth, depthReasons);
    byte[] reasons = cells.reasons();
    IntPredicate dry = i -> !ScreenedPass.anyUsable(reasons, i, facts.cells());
    Accounting accounting =
        new Accounting(
            size,
            Tally.of(reasons),
            Tally.of(bottom.reasons),
            Tally.of(depthReasons),
            limits,
            cells.threeBeam(),
            bottom.threeBeamUsed(),
            waterBeam + 1,
            beams.rejected(),
            replaced,
            longest(ensembles, dry),
            longest(ensembles, i -> bottom.reasons[i] != 0),
            sound.correction());
    ScreenNotes notes = new ScreenNotes(sound.notes());
    notes.attitude(attitude, size);
    notes.exclusions(exclusions, count(size, i -> excluded[i]));
    notes.beams(accounting, bottomBeam + 1);
    notes.lost(accounting, count(size, dry));
    return new ScreenedPass(facts, depth, bottom, depthReasons, reasons, accounting, notes.all());
  }

  private static double[] elapsed(Ensembles ensembles) {
    double[] elapsed = new double[ensembles.size()];
    for (int i = 0; i < elapsed.length; i++) {
      elapsed[i] = ensembles.elapsedS(i);
    }
    return elapsed;
  }

  /** A distance along the beams by the true speed of sound, by ensemble. */
  private static double[] corrected(
      Ensembles ensembles, EnsembleQuantity quantity, SoundRatio sound) {
    double[] distance = new double[ensembles.size()];
    for (int i = 0; i < distance.length; i++) {
      distance[i] = sound.at(i) * ensembles.value(quantity, i);
    }
    return distance;
  }

  /** Depth below the face above which side lobes do not reach (m), by ensemble. */
  private double[] lowest(BeamDepths beams, double[] elapsed) {
    double[] lowest = Gaps.fillLinear(beams.shallowest(), elapsed);
    double cosine = Math.cos(Math.toRadians(instrument.beamAngleDeg()));
    for (int i = 0; i < lowest.length; i++) {
      lowest[i] *= cosine;
    }
    return lowest;
  }

  /**
   * A component of the boat's velocity to compare water by: bottom tracking, else GNSS, else NaN.
   */
  private static double[] boat(
      Ensembles ensembles,
      BottomTrack bottom,
      double[] column,
      EnsembleQuantity instead,
      double[] elapsed) {
    if (bottom.any()) {
      return Gaps.fillLinear(column, elapsed);
    }
    double[] gnss = new double[ensembles.size()];
    for (int i = 0; i < gnss.length; i++) {
      gnss[i] = ensembles.value(instead, i);
    }
    return Gaps.fillLinear(gnss, elapsed);
  }

  private List<Exclusion> exclusions(String name) {
    List<Exclusion> own = new ArrayList<>();
    for (Exclusion each : settings.screening().exclusions()) {
      if (each.pass().equals(name)) {
        own.add(each);
      }
    }
    return own;
  }

  private static boolean[] excluded(Ensembles ensembles, List<Exclusion> exclusions) {
    boolean[] excluded = new boolean[ensembles.size()];
    for (int i = 0; i < excluded.length; i++) {
      long number = ensembles.number(i);
      for (Exclusion each : exclusions) {
        excluded[i] |= number >= each.fromEnsemble() && number <= each.toEnsemble();
      }
    }
    return excluded;
  }

  /**
   * Chooses the depth of every ensemble; returns how many come from other than the chosen beams.
   */
  private int depths(BeamDepths beams, double[] depth, byte[] reasons) {
    DepthSource source = settings.depth();
    int replaced = 0;
    for (int i = 0; i < depth.length; i++) {
      depth[i] = beams.by(source, i);
      if (Double.isNaN(depth[i])) {
        depth[i] = beams.instead(source, i);
        replaced += Double.isNaN(depth[i]) ? 0 : 1;
      }
      reasons[i] = beams.reason(i).code();
    }
    return replaced;
  }

  private static int count(int size, IntPredicate is) {
    int count = 0;
    for (int i = 0; i < size; i++) {
      count += is.test(i) ? 1 : 0;
    }
    return count;
  }

  /** The longest run of ensembles without something; the first of several that are as long. */
  private static Optional<Run> longest(Ensembles ensembles, IntPredicate without) {
    Optional<Run> longest = Optional.empty();
    int from = 0;
    for (int i = 0; i < ensembles.size(); i++) {
      if (!without.test(i)) {
        from = i + 1;
      } else if (longest.isEmpty() || i + 1 - from > longest.get().ensembles()) {
        longest =
            Optional.of(
                new Run(
                    i + 1 - from,
                    ensembles.number(from),
                    ensembles.number(i),
                    ensembles.elapsedS(i) - ensembles.elapsedS(Math.max(0, from - 1))));
      }
    }
    return longest;
  }
}
