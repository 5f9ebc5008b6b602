package org.crossreach.screen;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.settings.Limit;
import org.crossreach.settings.Screening;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;

/**
 * Judges every cell of a pass: finds the limits from a sample of its ensembles, then passes over
 * all of them once.
 */
final class WaterScreen {

  /**
   * Smallest automatic limit of error and vertical velocity (m/s): less is within what pitch, heave
   * and rounding to mm/s leave, and moves no horizontal velocity by more.
   */
  private static final double FLOOR_MPS = 0.05;

  /** Smallest automatic limit of a spike (m/s). */
  private static final double SPIKE_FLOOR_MPS = 0.08;

  /**
   * Smallest automatic limit of a spike as a share of the median speed of the water: the intensity
   * of the turbulence of rivers (about a tenth, Nezu and Nakagawa 1993, from memory), and the
   * change of velocity between ensembles on a steep bank.
   */
  private static final double SPIKE_FLOOR_SHARE = 0.1;

  /**
   * Smallest automatic limit of a spike where the boat's velocity is unknown, so that the water's
   * is, too (m/s): a tenth of the speed of a swift river.
   */
  private static final double SPIKE_FLOOR_WITHOUT_BOAT_MPS = 0.15;

  /** Automatic limits of correlation, intensity and good pings lie this far below the median. */
  private static final double CORRELATION_FLOOR = 0.1;

  private static final double INTENSITY_FLOOR_DB = 10;
  private static final double GOOD_FLOOR_PCT = 25;

  private final CellFacts facts;
  private final Screening screening;
  private final int stride;
  private final List<FoundLimit> found = new ArrayList<>();
  private final byte[] reasons;
  private long threeBeam;

  WaterScreen(CellFacts facts) {
    this.facts = facts;
    this.screening = facts.screening();
    this.stride = Sample.stride(facts.size(), facts.cells());
    this.reasons = new byte[facts.size() * facts.cells()];
    CellLimits limits = lowest();
    limits = departures(limits);
    CellJudge judge = new CellJudge(facts, limits);
    judgeAll(judge, spikeLimits(judge));
  }

  /** One reason code for each cell, ensemble by ensemble. */
  byte[] reasons() {
    return reasons;
  }

  /** The limits that the screens went by. */
  List<FoundLimit> found() {
    return found;
  }

  /** Number of used cells that rest on three beams. */
  long threeBeam() {
    return threeBeam;
  }

  private CellLimits lowest() {
    CellJudge judge = new CellJudge(facts, CellLimits.NONE);
    return CellLimits.NONE.withLowest(
        lowest(judge, screening.goodPct(), Criterion.GOOD_PCT, GOOD_FLOOR_PCT),
        lowest(judge, screening.correlation(), Criterion.CORRELATION, CORRELATION_FLOOR),
        lowest(judge, screening.intensity(), Criterion.INTENSITY, INTENSITY_FLOOR_DB));
  }

  private double lowest(CellJudge judge, Limit limit, Criterion criterion, double floor) {
    if (!AutomaticLimit.on(limit)) {
      return Double.NaN;
    }
    double value =
        limit.kind() == Limit.Kind.GIVEN
            ? limit.value()
            : facts
                .ensembles()
                .find(quantity(criterion))
                .map(grid -> AutomaticLimit.lowest(sample(judge, grid), floor))
                .orElse(Double.NaN);
    found.add(new FoundLimit(criterion, limit.kind(), Double.NaN, value));
    return value;
  }

  private static CellQuantity quantity(Criterion criterion) {
    return switch (criterion) {
      case GOOD_PCT -> CellQuantity.GOOD_PCT;
      case CORRELATION -> CellQuantity.CORRELATION;
      default -> CellQuantity.INTENSITY_DB;
    };
  }

  private Sample sample(CellJudge judge, CellGrid grid) {
    Sample sample = new Sample();
    VelocityRow row = new VelocityRow(facts.cells());
    byte[] why = new byte[facts.cells()];
    for (int i = 0; i < facts.size(); i += stride) {
      judge.judge(i, row, why);
      for (int k = 0; k < why.length; k++) {
        if (why[k] == 0) {
          sample.add(grid.get(i, k));
        }
      }
    }
    return sample;
  }

  private CellLimits departures(CellLimits limits) {
    boolean errorOn = AutomaticLimit.on(screening.errorVelocity());
    boolean verticalOn = AutomaticLimit.on(screening.verticalVelocity());
    if (!errorOn && !verticalOn) {
      return limits;
    }
    CellJudge judge = new CellJudge(facts, limits);
    Sample errors = new Sample();
    Sample relative = new Sample();
    Sample overBed = new Sample();
    VelocityRow row = new VelocityRow(facts.cells());
    byte[] why = new byte[facts.cells()];
    for (int i = 0; i < facts.size(); i += stride) {
      judge.judge(i, row, why);
      for (int k = 0; k < why.length; k++) {
        if (why[k] == 0) {
          errors.add(row.error[k]);
          relative.add(row.up[k]);
          overBed.add(row.up[k] + facts.boatUpMps()[i]);
        }
      }
    }
    RobustScale error = errors.scale();
    CellLimits withError =
        limits.withError(
            error.median(), departure(screening.errorVelocity(), Criterion.ERROR_VELOCITY, error));
    return withVertical(withError, relative.scale(), overBed.scale());
  }

  /** A heaving boat moves the water past it: what scatters less is what the water does. */
  private CellLimits withVertical(CellLimits limits, RobustScale relative, RobustScale overBed) {
    boolean chosen = overBed.sigma() < relative.sigma();
    RobustScale scale = chosen ? overBed : relative;
    double value = departure(screening.verticalVelocity(), Criterion.VERTICAL_VELOCITY, scale);
    return limits.withVertical(scale.median(), value, chosen);
  }

  private double departure(Limit limit, Criterion criterion, RobustScale scale) {
    if (!AutomaticLimit.on(limit)) {
      return Double.NaN;
    }
    double value =
        limit.kind() == Limit.Kind.GIVEN
            ? limit.value()
            : AutomaticLimit.departure(scale, FLOOR_MPS);
    found.add(new FoundLimit(criterion, limit.kind(), scale.median(), value));
    return value;
  }

  private SpikeLimits spikeLimits(CellJudge judge) {
    Limit limit = screening.spikes();
    if (!AutomaticLimit.on(limit)) {
      return SpikeLimits.NONE;
    }
    SpikeLimits limits =
        limit.kind() == Limit.Kind.GIVEN ? SpikeLimits.of(limit.value()) : automaticSpikes(judge);
    found.add(new FoundLimit(Criterion.SPIKES, limit.kind(), Double.NaN, limits.reported()));
    return limits;
  }

  private SpikeLimits automaticSpikes(CellJudge judge) {
    RowWindow window = new RowWindow(facts, judge, /* middles= */ true);
    SpikeScreen spikes = new SpikeScreen(facts, window);
    Departures relative = new Departures(spikes);
    Departures overGround = new Departures(spikes);
    Sample speeds = new Sample();
    for (int i = 0; i < facts.size(); i += stride) {
      spikes.centreOn(i);
      for (int k = 0; k < facts.cells(); k++) {
        if (window.reasons(i)[k] == 0) {
          spikes.measure(k, true);
          relative.add();
          spikes.measure(k, false);
          overGround.add();
        }
      }
      double e = window.middleEast(i);
      double n = window.middleNorth(i);
      speeds.add(Math.sqrt(e * e + n * n));
    }
    double floor =
        facts.boatKnown()
            ? Math.max(SPIKE_FLOOR_MPS, SPIKE_FLOOR_SHARE * speeds.median())
            : SPIKE_FLOOR_WITHOUT_BOAT_MPS;
    return new SpikeLimits(relative.limit(floor), overGround.limit(floor), floor);
  }

  /** Departures as the spike screen measured them last. */
  private record Departures(SpikeScreen spikes, Sample east, Sample north) {
    Departures(SpikeScreen spikes) {
      this(spikes, new Sample(), new Sample());
    }

    void add() {
      east.add(spikes.departureEast());
      north.add(spikes.departureNorth());
    }

    double limit(double floor) {
      return AutomaticLimit.vector(east.scale(), north.scale(), floor);
    }
  }

  private void judgeAll(CellJudge judge, SpikeLimits limits) {
    boolean relative = !facts.boatKnown() || limits.relativeIsSharper();
    RowWindow window = new RowWindow(facts, judge, relative);
    SpikeScreen spikes = new SpikeScreen(facts, window);
    boolean on = !Double.isNaN(limits.least());
    boolean errors = facts.errors();
    int cells = facts.cells();
    byte[] why = new byte[cells];
    for (int i = 0; i < facts.size(); i++) {
      spikes.centreOn(i);
      System.arraycopy(window.reasons(i), 0, why, 0, cells);
      int used = window.used(i) - (on ? spikes.mark(limits, why) : 0);
      if (used < screening.minimumCells()) {
        leaveOut(why);
      }
      System.arraycopy(why, 0, reasons, i * cells, cells);
      boolean[] withoutError = window.withoutError(i);
      for (int k = 0; errors && k < cells; k++) {
        threeBeam += why[k] == 0 && withoutError[k] ? 1 : 0;
      }
    }
  }

  private static void leaveOut(byte[] why) {
    for (int k = 0; k < why.length; k++) {
      if (why[k] == 0) {
        why[k] = Reason.FEW_CELLS.code();
      }
    }
  }
}
