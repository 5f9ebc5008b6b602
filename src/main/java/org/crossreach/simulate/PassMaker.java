package org.crossreach.simulate;

import java.util.Arrays;
import java.util.BitSet;
import java.util.EnumMap;
import java.util.Map;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;

/**
 * Makes the ensembles of one pass.
 *
 * <p>What an ensemble records is the mean over its interval: the boat's displacement is exact,
 * water and depth are averaged over the way by Gauss quadrature, and over the height of each cell
 * exactly.
 */
final class PassMaker {

  /** Five-point Gauss-Legendre rule on 0 to 1; DLMF table 3.5.2. */
  private static final double[] PLACES = {
    0.046910077030668, 0.230765344947158, 0.5, 0.769234655052842, 0.953089922969332
  };

  private static final double[] WEIGHTS = {
    0.118463442528095, 0.239314335249683, 0.284444444444444, 0.239314335249683, 0.118463442528095
  };

  private static final double GOOD_CORRELATION = 0.95;
  private static final double POOR_CORRELATION = 0.35;
  private static final int NOISE_OF_BOAT = 101;
  private static final int NOISE_OF_WATER = 102;
  private static final int NOISE_OF_DEPTH = 103;
  private static final int TURBULENCE = 104;
  private static final int DIRECTION_OF_SPIKES = 105;

  private final Recipe recipe;
  private final int pass;
  private final Profiler profiler;
  private final Recorder recorder;
  private final int cells;
  private final double scale;
  private final Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
  private final Map<CellQuantity, CellGrid.Builder> grids = new EnumMap<>(CellQuantity.class);
  private final Map<CellQuantity, double[]> rows = new EnumMap<>(CellQuantity.class);
  private final Map<Fault, BitSet> struck = new EnumMap<>(Fault.class);
  private final RandomGenerator boatNoise;
  private final RandomGenerator waterNoise;
  private final RandomGenerator depthNoise;
  private final RandomGenerator turbulence;
  private final RandomGenerator spikes;
  private double fluctuation = Double.NaN;

  PassMaker(Recipe recipe, int pass) {
    this.recipe = recipe;
    this.pass = pass;
    profiler = recipe.profiler();
    recorder = new Recorder(profiler);
    cells = profiler.cells();
    scale = FastMath.pow(10.0, recipe.decimals());
    boatNoise = Dice.of(recipe.seed(), pass, NOISE_OF_BOAT);
    waterNoise = Dice.of(recipe.seed(), pass, NOISE_OF_WATER);
    depthNoise = Dice.of(recipe.seed(), pass, NOISE_OF_DEPTH);
    turbulence = Dice.of(recipe.seed(), pass, TURBULENCE);
    spikes = Dice.of(recipe.seed(), pass, DIRECTION_OF_SPIKES);
  }

  /** The samples that each fault struck. */
  Map<Fault, BitSet> struck() {
    return struck;
  }

  Ensembles make() {
    int size = recipe.boat().size();
    strike(size);
    long[] number = new long[size];
    double[] elapsed = new double[size];
    int[] count = new int[size];
    for (int i = 0; i < size; i++) {
      number[i] = i + 1;
      elapsed[i] = FastMath.rint(1e3 * i * recipe.boat().ensembleS()) / 1e3;
      count[i] = cells;
      ensemble(i, size);
    }
    Map<CellQuantity, CellGrid> built = new EnumMap<>(CellQuantity.class);
    grids.forEach((quantity, grid) -> built.put(quantity, grid.build()));
    return new Ensembles(
        profiler.frame(),
        recipe.start().plusNanos(FastMath.round(1e9 * recipe.passStartS(pass))),
        number,
        elapsed,
        count,
        columns,
        built);
  }

  /** Draws which samples each fault strikes. */
  private void strike(int size) {
    for (Fault fault : Fault.values()) {
      boolean perCell = fault == Fault.LOST_CELL || fault == Fault.SPIKE;
      double rate = recipe.faults().rate(fault);
      BitSet samples = new BitSet();
      RandomGenerator dice = Dice.of(recipe.seed(), pass, fault.ordinal());
      for (int s = 0; rate > 0 && s < (perCell ? size * cells : size); s++) {
        if (dice.nextDouble() < rate) {
          samples.set(s);
        }
      }
      struck.put(fault, samples);
    }
  }

  private boolean hit(Fault fault, int sample) {
    return struck.get(fault).get(sample);
  }

  private double rounded(double value) {
    return FastMath.rint(value * scale) / scale + 0.0; // never -0.0, which reads back as 0.0
  }

  private void put(EnsembleQuantity quantity, int i, int size, double value) {
    columns.computeIfAbsent(quantity, q -> new double[size])[i] = rounded(value);
  }

  private double[] row(CellQuantity quantity) {
    return rows.computeIfAbsent(quantity, q -> new double[cells]);
  }

  private void ensemble(int i, int size) {
    BoatPlan boat = recipe.boat();
    River river = recipe.river();
    boolean fromLeft = recipe.fromLeft(pass);
    double dt = boat.ensembleS();
    int before = FastMath.max(0, i - 1);
    double along =
        (boat.stationM(river, fromLeft, i) - boat.stationM(river, fromLeft, before)) / dt;
    double normal = (boat.downstreamM(i) - boat.downstreamM(before)) / dt;
    double[] velocities = new double[cells];
    double depth = average(i, velocities);
    double ratio = profiler.recordedOverTrue();
    double time = recipe.passStartS(pass) + i * dt;
    double heading = rounded(recipe.attitude().headingAt(time));
    double pitch = rounded(recipe.attitude().pitchAt(time));
    double roll = rounded(recipe.attitude().rollAt(time));
    put(EnsembleQuantity.HEADING_DEG, i, size, heading);
    put(EnsembleQuantity.PITCH_DEG, i, size, pitch);
    put(EnsembleQuantity.ROLL_DEG, i, size, roll);
    if (!Double.isNaN(profiler.temperatureDegC())) {
      put(EnsembleQuantity.TEMPERATURE_DEGC, i, size, profiler.temperatureDegC());
    }
    put(EnsembleQuantity.FIRST_CELL_M, i, size, profiler.blankM() + profiler.cellM() / 2);
    put(EnsembleQuantity.CELL_SIZE_M, i, size, profiler.cellM());
    depths(i, size, (depth - profiler.instrument().draftM()) * ratio);
    bottomTrack(i, size, along, normal, new double[] {heading, pitch, roll});
    water(i, depth, velocities, new double[] {along, normal, heading, pitch, roll});
  }

  /**
   * Fills the mean normal velocity of each cell, NaN where it reaches the bed; returns the depth.
   */
  private double average(int i, double[] velocities) {
    BoatPlan boat = recipe.boat();
    River river = recipe.river();
    boolean fromLeft = recipe.fromLeft(pass);
    double end = boat.stationM(river, fromLeft, i);
    double start = boat.stationM(river, fromLeft, FastMath.max(0, i - 1));
    double toTrue = 1 / profiler.recordedOverTrue();
    double meanDepth = 0;
    for (int p = 0; p < PLACES.length; p++) {
      double station = start + PLACES[p] * (end - start);
      double depth = river.depthM(station);
      double time = recipe.passStartS(pass) + (i - 1 + PLACES[p]) * boat.ensembleS();
      double mean = river.meanVelocityMps(station) * river.time().at(time);
      meanDepth += WEIGHTS[p] * depth;
      double top = profiler.instrument().draftM() + profiler.blankM() * toTrue;
      double size = profiler.cellM() * toTrue;
      double above = river.vertical().below(FastMath.max(0, depth - top), depth);
      for (int k = 0; k < cells; k++) {
        double lower = depth - top - (k + 1) * size;
        if (lower < 0) {
          Arrays.fill(velocities, k, cells, Double.NaN);
          break;
        }
        double below = river.vertical().below(lower, depth);
        velocities[k] += WEIGHTS[p] * mean * (above - below) / size;
        above = below;
      }
    }
    double gust = fluctuation(boat.ensembleS());
    for (int k = 0; k < cells; k++) {
      velocities[k] *= gust;
    }
    return meanDepth;
  }

  /** The factor by which turbulence changes a column. */
  private double fluctuation(double dt) {
    double keep = FastMath.exp(-dt / recipe.noise().turbulenceS());
    double fresh = turbulence.nextGaussian();
    fluctuation =
        Double.isNaN(fluctuation)
            ? fresh
            : keep * fluctuation + FastMath.sqrt(1 - keep * keep) * fresh;
    return 1 + recipe.noise().turbulenceShare() * fluctuation;
  }

  private void depths(int i, int size, double recorded) {
    int spikedBeam = hit(Fault.DEPTH_SPIKE, i) ? i % 4 : -1;
    for (int beam = 0; beam < 4; beam++) {
      double error = 1 + recipe.noise().depthShare() * depthNoise.nextGaussian();
      boolean lost = hit(Fault.BUBBLE, i) || beam == recipe.faults().badBeam() - 1;
      double value = beam == spikedBeam ? 0.4 * recorded : recorded * error;
      EnsembleQuantity quantity =
          EnsembleQuantity.values()[EnsembleQuantity.DEPTH_BEAM_1_M.ordinal() + beam];
      put(quantity, i, size, lost ? Double.NaN : value);
    }
    if (profiler.verticalBeam()) {
      put(EnsembleQuantity.DEPTH_VERTICAL_M, i, size, hit(Fault.BUBBLE, i) ? Double.NaN : recorded);
    }
  }

  private void bottomTrack(int i, int size, double along, double normal, double[] attitude) {
    double[] errors = errors(boatNoise, recipe.noise().boatMps());
    double jump = hit(Fault.BOAT_JUMP, i) ? recipe.faults().spikeMps() : 0;
    double ratio = profiler.recordedOverTrue();
    double[] earth = earth(along + jump, normal);
    // Beams see the bed, which moves against the boat; the other frames give the boat itself.
    double sign = profiler.frame() == Frame.BEAM ? -1 : 1;
    double[] components =
        recorder.record(
            sign * earth[0],
            sign * earth[1],
            attitude[0],
            attitude[1],
            attitude[2],
            errors,
            recipe.faults().badBeam());
    int count = componentsRecorded();
    for (int c = 0; c < count; c++) {
      EnsembleQuantity quantity =
          EnsembleQuantity.values()[EnsembleQuantity.BOTTOM_1.ordinal() + c];
      put(quantity, i, size, hit(Fault.LOST_BOAT, i) ? Double.NaN : components[c] * ratio);
    }
  }

  private int componentsRecorded() {
    return switch (profiler.frame()) {
      case EARTH, SHIP -> profiler.qualityColumns() ? 4 : 2;
      case INSTRUMENT -> profiler.qualityColumns() ? 4 : 3;
      case BEAM -> 4;
    };
  }

  private double[] errors(RandomGenerator noise, double horizontal) {
    double beam = horizontal * recorder.beamOverHorizontal();
    double[] errors = new double[4];
    for (int b = 0; b < 4; b++) {
      errors[b] = beam * noise.nextGaussian();
    }
    return errors;
  }

  /** A vector along and normal to the section on true east and north. */
  private double[] earth(double along, double normal) {
    double azimuth = FastMath.toRadians(recipe.river().sectionAzimuthDeg());
    double east = FastMath.sin(azimuth);
    double north = FastMath.cos(azimuth);
    return new double[] {along * east - normal * north, along * north + normal * east};
  }

  private void water(int i, double depth, double[] velocities, double[] boatAndAttitude) {
    double ratio = profiler.recordedOverTrue();
    double limit =
        (depth - profiler.instrument().draftM())
            * FastMath.cos(FastMath.toRadians(profiler.instrument().beamAngleDeg()))
            * ratio;
    boolean lost = hit(Fault.LOST_COLUMN, i) || hit(Fault.BUBBLE, i);
    int components = componentsRecorded();
    for (int k = 0; k < cells; k++) {
      int sample = i * cells + k;
      double[] errors = errors(waterNoise, recipe.noise().waterMps());
      double direction = 2 * FastMath.PI * spikes.nextDouble();
      double lower = profiler.blankM() + (k + 1) * profiler.cellM();
      double normal = velocities[k];
      boolean weedy = hit(Fault.WEED, i) && lower < limit / 2;
      if (weedy) {
        normal *= 0.3;
      }
      double skewed = normal * recipe.river().alongOverNormal();
      if (recipe.faults().sideLobes() && lower > limit && !Double.isNaN(normal)) {
        normal = 0;
        skewed = 0;
      }
      if (hit(Fault.SPIKE, sample)) {
        normal += recipe.faults().spikeMps() * FastMath.cos(direction);
        skewed += recipe.faults().spikeMps() * FastMath.sin(direction);
      }
      boolean missing = lost || Double.isNaN(normal) || hit(Fault.LOST_CELL, sample);
      double[] relative = earth(skewed - boatAndAttitude[0], normal - boatAndAttitude[1]);
      double[] recorded =
          missing
              ? new double[] {Double.NaN, Double.NaN, Double.NaN, Double.NaN}
              : recorder.record(
                  relative[0],
                  relative[1],
                  boatAndAttitude[2],
                  boatAndAttitude[3],
                  boatAndAttitude[4],
                  errors,
                  recipe.faults().badBeam());
      for (int c = 0; c < components; c++) {
        row(CellQuantity.values()[c])[k] = rounded(recorded[c] * ratio);
      }
      if (profiler.qualityColumns()) {
        double correlation = weedy ? POOR_CORRELATION : GOOD_CORRELATION;
        row(CellQuantity.CORRELATION)[k] = missing ? Double.NaN : correlation;
        row(CellQuantity.INTENSITY_DB)[k] = missing ? Double.NaN : rounded(90 - 3.0 * lower);
        row(CellQuantity.GOOD_PCT)[k] = missing ? Double.NaN : 100;
      }
    }
    rows.forEach(
        (quantity, row) ->
            grids.computeIfAbsent(quantity, q -> new CellGrid.Builder(cells)).addRow(row));
  }
}
