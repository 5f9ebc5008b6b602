package org.crossreach.report.chart;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.Edge;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.Instrument;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Site;
import org.crossreach.survey.Stage;
import org.crossreach.survey.UnusableInput;
import org.crossreach.survey.Water;

/**
 * An invented river for looking at pictures: about 84 m wide and 4 m deep, faster and deeper
 * towards the right bank, with noise, lost cells and lost ensembles.
 *
 * @param ensembles ensembles of each pass
 * @param cells cells of each ensemble
 * @param noiseMps standard deviation of the noise of a cell (m/s)
 * @param speed factor on the water's velocity; negative for water that flows upstream
 */
public record River(int ensembles, int cells, double noiseMps, double speed) {

  private static final double WIDTH_M = 84;
  private static final double DRAFT_M = 0.2;

  /** A pleasant day. */
  public static River usual() {
    return new River(380, 24, 0.09, 1);
  }

  static double depthM(double station) {
    double share = station / WIDTH_M;
    return 0.35 + 15.2 * share * (1 - share) * (0.55 + 0.75 * share) - 0.5 * bump(share);
  }

  private static double bump(double share) {
    return Math.exp(-Math.pow((share - 0.33) / 0.07, 2));
  }

  static double meanVelocityMps(double station) {
    return 0.62 * Math.pow(depthM(station), 2 / 3.0) - 0.12;
  }

  /** The reduced measurement: four passes and one that is not used. */
  public Result result() throws UnusableInput {
    return result(Settings.defaults());
  }

  /** The measurement reduced by some choices. */
  public Result result(Settings settings) throws UnusableInput {
    return Result.of(new Reducer(1).reduce(measurement(), settings));
  }

  /** What was recorded. */
  public Measurement measurement() {
    List<Pass> passes = new ArrayList<>();
    for (int p = 0; p < 5; p++) {
      Bank start = p % 2 == 0 ? Bank.LEFT : Bank.RIGHT;
      String name = "pass-0" + (p + 1);
      passes.add(
          new Pass(
              name,
              name + ".csv",
              start,
              p != 4,
              p == 4 ? "boat drifted off the line behind the island" : "",
              new Edge(3.2, Edge.SLOPING, Double.NaN),
              new Edge(2.1, Edge.WALL, Double.NaN),
              record(p, start),
              List.of()));
    }
    return new Measurement(
        "heron-ferry-0612",
        new Site("Heron Ferry", "04-117", "River Aske", 52.418301, -3.102206),
        List.of("boat operator", "profiler operator", "gauge reader"),
        "Light upstream wind, drifting weed near the left bank.",
        Optional.of(
            new Stage(
                "Heron Ferry gauge zero",
                List.of(
                    new Stage.Reading(OffsetDateTime.parse("2026-06-12T09:05:00+01:00"), 2.41),
                    new Stage.Reading(OffsetDateTime.parse("2026-06-12T09:50:00+01:00"), 2.43)))),
        Optional.empty(),
        new Water(14.2, 0),
        new Instrument(
            "P-2207", 1200, 20, List.of(45.0, 135.0, 225.0, 315.0), DRAFT_M, Double.NaN, -1.4, 0),
        passes,
        List.of(),
        inputs());
  }

  private static List<InputFile> inputs() {
    List<InputFile> inputs = new ArrayList<>();
    inputs.add(new InputFile("measurement.json", 1024, "9f86d081884c7d65".repeat(4)));
    inputs.add(new InputFile("settings.json", 1024, "60303ae22b998861".repeat(4)));
    for (int p = 1; p <= 5; p++) {
      inputs.add(new InputFile("pass-0" + p + ".csv", 1024, ("fd61a03af4f77d8" + p).repeat(4)));
    }
    return inputs;
  }

  /** River axes: x from the left bank to the right, y downstream; the river flows to azimuth 40. */
  private Ensembles record(int pass, Bank start) {
    Random random = new Random(20260612 + pass);
    int n = ensembles;
    long[] number = new long[n];
    double[] elapsed = new double[n];
    int[] count = new int[n];
    Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
    for (EnsembleQuantity quantity :
        List.of(
            EnsembleQuantity.BOTTOM_1,
            EnsembleQuantity.BOTTOM_2,
            EnsembleQuantity.DEPTH_BEAM_1_M,
            EnsembleQuantity.DEPTH_BEAM_2_M,
            EnsembleQuantity.DEPTH_BEAM_3_M,
            EnsembleQuantity.DEPTH_BEAM_4_M,
            EnsembleQuantity.FIRST_CELL_M,
            EnsembleQuantity.TEMPERATURE_DEGC,
            EnsembleQuantity.CELL_SIZE_M)) {
      columns.put(quantity, new double[n]);
    }
    CellGrid.Builder east = new CellGrid.Builder(cells);
    CellGrid.Builder north = new CellGrid.Builder(cells);
    double step = n < 2 ? 0 : (WIDTH_M - 5.3) / (n - 1);
    double dt = Math.max(0.2, 400.0 / n);
    double gain = 1 + 0.012 * random.nextGaussian();
    for (int i = 0; i < n; i++) {
      double share = n < 2 ? 0 : (double) i / (n - 1);
      double station =
          start == Bank.LEFT
              ? 3.2 + (WIDTH_M - 5.3) * share
              : WIDTH_M - 2.1 - (WIDTH_M - 5.3) * share;
      double along = (start == Bank.LEFT ? 1 : -1) * step / dt * (1 + 0.25 * random.nextGaussian());
      double down = 2.6 / dt * step / 20 * Math.cos(7 * share) + 0.04 * random.nextGaussian();
      double depth = depthM(station);
      double size = depth > 3 ? 3.5 / cells * 1.45 : 3.5 / cells;
      number[i] = i + 1;
      elapsed[i] = i * dt;
      count[i] = cells;
      columns.get(EnsembleQuantity.BOTTOM_1)[i] = east(along, down);
      columns.get(EnsembleQuantity.BOTTOM_2)[i] = north(along, down);
      boolean lostDepth = random.nextDouble() < 0.01;
      for (int beam = 1; beam <= 4; beam++) {
        columns.get(EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"))[i] =
            lostDepth ? Double.NaN : (depth - DRAFT_M) * (1 + 0.01 * random.nextGaussian());
      }
      columns.get(EnsembleQuantity.FIRST_CELL_M)[i] = 0.25 + size / 2;
      columns.get(EnsembleQuantity.CELL_SIZE_M)[i] = size;
      columns.get(EnsembleQuantity.TEMPERATURE_DEGC)[i] = 14.1;
      boolean lost = random.nextDouble() < 0.02 && n > 20 || share > 0.61 && share < 0.625;
      double[] e = new double[cells];
      double[] m = new double[cells];
      for (int k = 0; k < cells; k++) {
        double height = Math.max(0.02, depth - DRAFT_M - 0.25 - (k + 0.5) * size);
        double u =
            speed * gain * meanVelocityMps(station) * (7 / 6.0) * Math.pow(height / depth, 1 / 6.0);
        double across = -0.05 * u + noiseMps * random.nextGaussian();
        double downstream = u + noiseMps * random.nextGaussian();
        boolean gone = lost || random.nextDouble() < 0.01;
        e[k] = gone ? Double.NaN : east(across - along, downstream - down);
        m[k] = gone ? Double.NaN : north(across - along, downstream - down);
      }
      east.addRow(e);
      north.addRow(m);
    }
    return new Ensembles(
        Frame.EARTH,
        OffsetDateTime.parse("2026-06-12T09:10:00+01:00").plusMinutes(8L * pass),
        number,
        elapsed,
        count,
        columns,
        Map.of(CellQuantity.WATER_1, east.build(), CellQuantity.WATER_2, north.build()));
  }

  private static double turned(double a, double b) {
    double angle = Math.toRadians(40);
    return a * Math.cos(angle) + b * Math.sin(angle);
  }

  /** Compass east of a vector in river axes; the compass's north lies 1.4 degrees off. */
  private static double east(double across, double down) {
    return turned(across, down);
  }

  private static double north(double across, double down) {
    double angle = Math.toRadians(40);
    return -across * Math.sin(angle) + down * Math.cos(angle);
  }
}
