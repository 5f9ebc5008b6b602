package org.crossreach.discharge;

import static org.crossreach.discharge.Crossing.edge;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.settings.SectionLine;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Pass;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;

/** A measurement is reduced as a whole: unusable passes are refused by name, lines are shared. */
class ReducerTest {

  private static final Edge NONE = edge(0, Edge.WALL);

  @Test
  void refusesEveryUsedPassWithoutUsableEnsembleOrWay() {
    UnusableInput refusal =
        assertThrows(
            UnusableInput.class,
            () -> reduce(pass("deaf", deaf(), true), pass("still", still(), true)));
    assertEquals(2, refusal.problems().size());
    assertEquals("deaf.csv", refusal.problems().get(0).file());
    assertEquals("no usable ensemble among 20", refusal.problems().get(0).found());
    assertEquals("still.csv", refusal.problems().get(1).file());
    assertEquals("a boat that ends 0 cm from its start", refusal.problems().get(1).found());
  }

  @Test
  void refusesAPassWithoutAnyBoatVelocity() {
    List<Ensemble> lost = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      lost.add(Ensemble.uniform(i, Double.NaN, Double.NaN, 4, 0, 1));
    }
    UnusableInput refusal =
        assertThrows(UnusableInput.class, () -> reduce(pass("lost", Ensemble.record(lost), true)));
    assertTrue(refusal.problems().get(0).found().startsWith("no boat velocity"));
  }

  @Test
  void leavesOutAnUnusedPassThatCannotBeReducedWithANote() throws Exception {
    Reduction reduction = reduce(pass("good", crossing(90), true), pass("still", still(), false));
    assertEquals(1, reduction.passes().size());
    assertEquals("pass-not-reduced", reduction.notes().get(0).code());
    assertTrue(reduction.notes().get(0).text().contains("still.csv"));
  }

  @Test
  void keepsAnUnusedPassOutOfTheUsedOnes() throws Exception {
    Reduction reduction =
        reduce(pass("good", crossing(90), true), pass("spare", crossing(95), false));
    assertEquals(2, reduction.passes().size());
    assertEquals(1, reduction.used().size());
    assertEquals("good", reduction.used().get(0).pass().name());
  }

  @Test
  void refusesAMeasurementWithoutUsedPass() {
    UnusableInput refusal =
        assertThrows(UnusableInput.class, () -> reduce(pass("spare", crossing(90), false)));
    assertEquals("passes", refusal.problems().get(0).place());
  }

  @Test
  void eachPassHasItsOwnLineUnlessACommonOneIsChosen() throws Exception {
    Pass first = pass("first", crossing(80), true);
    Pass second = pass("second", crossing(100), true);
    assertEquals(List.of(80.0, 100.0), azimuths(SectionLine.EACH_PASS, first, second));
    assertEquals(List.of(90.0, 90.0), azimuths(SectionLine.COMMON, first, second));
    assertEquals(List.of(85.0, 85.0), azimuths(SectionLine.ofAzimuth(265), first, second));
  }

  @Test
  void threadsMakeNoDifference() throws Exception {
    Pass first = pass("first", crossing(80), true);
    Pass second = pass("second", crossing(100), true);
    var measurement = Crossing.measurement(List.of(first, second));
    Reduction alone = new Reducer(1).reduce(measurement, Settings.defaults());
    Reduction together = new Reducer(8).reduce(measurement, Settings.defaults());
    for (int i = 0; i < 2; i++) {
      assertEquals(alone.passes().get(i).zones(), together.passes().get(i).zones());
    }
  }

  private static List<Double> azimuths(SectionLine line, Pass... passes) throws Exception {
    return new Reducer(1)
            .reduce(Crossing.measurement(List.of(passes)), Settings.defaults().withSection(line))
            .passes()
            .stream()
            .map(each -> Math.round(1e9 * each.section().line().azimuthDeg()) / 1e9)
            .toList();
  }

  private static Reduction reduce(Pass... passes) throws UnusableInput {
    return new Reducer(2).reduce(Crossing.measurement(List.of(passes)), Settings.defaults());
  }

  private static Pass pass(String name, Ensembles ensembles, boolean used) {
    return new Pass(name, name + ".csv", Bank.LEFT, used, "", NONE, NONE, ensembles, List.of());
  }

  private static Ensembles crossing(double azimuthDeg) {
    double east = Math.sin(Math.toRadians(azimuthDeg));
    double north = Math.cos(Math.toRadians(azimuthDeg));
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      all.add(Ensemble.uniform(i, east, north, 4, 0, 1));
    }
    return Ensemble.record(all);
  }

  private static Ensembles still() {
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      all.add(Ensemble.uniform(i, 0, 0, 4, 0, 1));
    }
    return Ensemble.record(all);
  }

  private static Ensembles deaf() {
    List<Ensemble> all = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      all.add(Ensemble.uniform(i, 1, 0, 4, Double.NaN, Double.NaN));
    }
    return Ensemble.record(all);
  }
}
