package org.crossreach.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.discharge.Reduction;
import org.crossreach.screen.Accounting;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.Simulation;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The same river gives the same discharge whichever axes its record stands in, and one bad beam
 * hardly matters.
 */
class FramesTest {

  private static final List<String> FRAMES = List.of("earth", "ship", "instrument", "beam");
  private static final String NOISE =
      "{\"water_mps\": 0.1, \"boat_mps\": 0.015, \"depth_share\": 0.01}";
  private static final String CALM = "{}";

  /**
   * Nine decimals of the record leave about 1e-9. The four records share the errors of their beams
   * for the water; those for the bed, which moves against the boat, come with the other sign in
   * beams.
   */
  @ParameterizedTest
  @ValueSource(strings = {CALM, "{\"water_mps\": 0.1, \"depth_share\": 0.01}"})
  void fourFramesGiveOneDischarge(String noise) throws Exception {
    List<Double> totals = new ArrayList<>();
    for (String frame : FRAMES) {
      Simulation simulation =
          Simulation.run(
              new Rivers().skew(10).wobble(2).tilt(6, 4).noise(noise).frame(frame).recipe());
      totals.add(reduce(simulation.measurement()).passes().get(0).totalM3s());
    }
    for (double total : totals) {
      assertEquals(totals.get(0), total, 1e-6 * totals.get(0), totals.toString());
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4})
  void oneBeamThatMeasuresNothingDoesNotMatterWithoutNoise(int beam) throws Exception {
    Simulation simulation =
        Simulation.run(
            new Rivers()
                .wobble(2)
                .tilt(6, 4)
                .faults("{\"bad_beam\": " + beam + "}")
                .frame("beam")
                .recipe());
    for (PassDischarge pass : reduce(simulation.measurement()).passes()) {
      assertWithin(0.0005, pass, simulation);
      Accounting accounting = pass.section().pass().accounting();
      assertEquals(accounting.cells().used(), accounting.threeBeamCells());
      assertEquals(accounting.bottomTrack().used(), accounting.threeBeamBottomTrack());
      assertTrue(hasNote(pass, "three-beam"));
    }
  }

  /** Three beams are noisier than four, which 20 seeds of two passes average out. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4})
  void oneBeamThatMeasuresNothingHardlyMattersWithNoise(int beam) throws Exception {
    Recipe recipe =
        new Rivers().noise(NOISE).faults("{\"bad_beam\": " + beam + "}").frame("beam").recipe();
    double sum = 0;
    int count = 0;
    for (int seed = 0; seed < 20; seed++) {
      Simulation simulation = Simulation.run(recipe.withSeed(seed));
      for (PassDischarge pass : reduce(simulation.measurement()).passes()) {
        sum += pass.totalM3s() / simulation.truth().dischargeM3s();
        count++;
      }
    }
    assertEquals(1, sum / count, 0.003);
  }

  /** A beam that gives noise of 1 m/s instead of the water's velocity is found out and left out. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4})
  void oneBeamThatMeasuresNoiseHardlyMatters(int beam) throws Exception {
    Simulation simulation =
        Simulation.run(new Rivers().wobble(2).noise(NOISE).frame("beam").recipe());
    List<PassDischarge> sound = reduce(simulation.measurement()).passes();
    List<PassDischarge> spoilt = reduce(spoilt(simulation.measurement(), beam)).passes();
    for (int p = 0; p < sound.size(); p++) {
      double total = sound.get(p).totalM3s();
      assertEquals(total, spoilt.get(p).totalM3s(), 0.003 * total);
      assertEquals(beam, spoilt.get(p).section().pass().accounting().unsoundBeam());
      assertTrue(hasNote(spoilt.get(p), "unsound-beam"));
    }
  }

  @Test
  void soundBeamsAreNotCalledUnsound() throws Exception {
    for (String noise : List.of(CALM, NOISE)) {
      Simulation simulation =
          Simulation.run(new Rivers().wobble(4).tilt(6, 4).noise(noise).frame("beam").recipe());
      for (PassDischarge pass : reduce(simulation.measurement()).passes()) {
        assertEquals(0, pass.section().pass().accounting().unsoundBeam());
        assertEquals(0, pass.section().pass().accounting().threeBeamCells());
        assertTrue(hasNote(pass, "tilt"));
      }
    }
  }

  @Test
  void threeBeamSolutionsCanBeRefused() throws Exception {
    Simulation simulation =
        Simulation.run(
            new Rivers().frame("beam").faults("{\"bad_beam\": 2}").noise(NOISE).recipe());
    Settings refused = Settings.defaults().withScreening(Screening.defaults().withThreeBeam(false));
    UnusableInput refusal =
        assertThrows(
            UnusableInput.class, () -> new Reducer(1).reduce(simulation.measurement(), refused));
    assertTrue(refusal.getMessage().contains("no usable ensemble"), refusal.getMessage());
  }

  private static void assertWithin(double share, PassDischarge pass, Simulation simulation) {
    double exact = simulation.truth().dischargeM3s();
    assertEquals(exact, pass.totalM3s(), share * exact, pass.pass().name());
  }

  private static boolean hasNote(PassDischarge pass, String code) {
    return pass.notes().stream().map(Note::code).anyMatch(code::equals);
  }

  private static Reduction reduce(Measurement measurement) throws UnusableInput {
    return new Reducer(1).reduce(measurement, Settings.defaults());
  }

  private static Measurement spoilt(Measurement measurement, int beam) {
    List<Pass> passes = new ArrayList<>();
    for (Pass each : measurement.passes()) {
      passes.add(
          new Pass(
              each.name(),
              each.file(),
              each.startBank(),
              each.used(),
              each.note(),
              each.leftEdge(),
              each.rightEdge(),
              spoilt(each.ensembles(), beam),
              each.notes()));
    }
    return new Measurement(
        measurement.id(),
        measurement.site(),
        measurement.party(),
        measurement.remarks(),
        measurement.stage(),
        measurement.rating(),
        measurement.water(),
        measurement.instrument(),
        passes,
        measurement.movingBedTests(),
        measurement.inputs());
  }

  private static Ensembles spoilt(Ensembles e, int beam) {
    Random random = new Random(beam);
    int size = e.size();
    long[] number = new long[size];
    double[] elapsed = new double[size];
    int[] cells = new int[size];
    for (int i = 0; i < size; i++) {
      number[i] = e.number(i);
      elapsed[i] = e.elapsedS(i);
      cells[i] = e.cells(i);
    }
    Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
    for (EnsembleQuantity quantity : EnsembleQuantity.values()) {
      if (e.has(quantity)) {
        double[] column = new double[size];
        for (int i = 0; i < size; i++) {
          column[i] = e.value(quantity, i);
        }
        columns.put(quantity, column);
      }
    }
    Map<CellQuantity, CellGrid> grids = new EnumMap<>(CellQuantity.class);
    for (CellQuantity quantity : CellQuantity.values()) {
      if (e.has(quantity)) {
        grids.put(quantity, e.grid(quantity));
      }
    }
    CellGrid.Builder noise = new CellGrid.Builder(e.maxCells());
    double[] row = new double[e.maxCells()];
    CellQuantity struck = CellQuantity.valueOf("WATER_" + beam);
    for (int i = 0; i < size; i++) {
      e.grid(struck).copyRow(i, row);
      for (int k = 0; k < row.length; k++) {
        row[k] = Double.isNaN(row[k]) ? row[k] : random.nextGaussian();
      }
      noise.addRow(row);
    }
    grids.put(struck, noise.build());
    return new Ensembles(e.frame(), e.start(), number, elapsed, cells, columns, grids);
  }
}
