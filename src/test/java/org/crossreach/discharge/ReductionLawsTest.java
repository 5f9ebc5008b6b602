package org.crossreach.discharge;

import static org.crossreach.discharge.Crossing.edge;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Method;
import org.crossreach.settings.Screening;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;
import org.crossreach.survey.Bank;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Ensemble;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What must hold for every record, whatever the laws and methods: turning the world changes
 * nothing, mirroring changes nothing, turning the flow round changes the sign, velocity and lengths
 * scale.
 *
 * <p>Records are random, with lost cells, lost columns, lost depths and lost bottom track; the seed
 * is the test's argument. Tolerances are rounding: 1e-11 of the size of the zones.
 */
class ReductionLawsTest {

  private static final Edge LEFT = edge(3, Edge.SLOPING);
  private static final Edge RIGHT = edge(2, Edge.WALL);

  static IntStream seeds() {
    return IntStream.range(0, 24);
  }

  /** One random choice of laws and method for each seed. */
  private static Settings settings(int seed) {
    Random random = new Random(1000 + seed);
    return Settings.defaults()
        .withScreening(Screening.off())
        .withMethod(pick(Method.values(), random))
        .withTop(pick(TopLaw.values(), random))
        .withBottom(pick(BottomLaw.values(), random))
        .withDepth(pick(DepthSource.values(), random));
  }

  private static <T> T pick(T[] all, Random random) {
    return all[random.nextInt(all.length)];
  }

  private static List<Ensemble> record(int seed) {
    Random random = new Random(seed);
    List<Ensemble> all = new ArrayList<>();
    double time = 0;
    for (int i = 0; i < 60; i++) {
      boolean lostBottomTrack = random.nextInt(8) == 0;
      boolean lostDepth = random.nextInt(8) == 0;
      boolean lostColumn = random.nextInt(8) == 0;
      double[] east = new double[24];
      double[] north = new double[24];
      for (int k = 0; k < 24; k++) {
        boolean lost = lostColumn || random.nextInt(10) == 0;
        east[k] = lost ? Double.NaN : 0.3 + 0.1 * random.nextGaussian();
        north[k] = lost ? Double.NaN : 1.2 + 0.2 * random.nextGaussian();
      }
      all.add(
          new Ensemble(
              time,
              lostBottomTrack ? Double.NaN : 1 + 0.2 * random.nextGaussian(),
              lostBottomTrack ? Double.NaN : 0.2 + 0.2 * random.nextGaussian(),
              lostDepth ? Double.NaN : 3 + Math.sin(i / 10.0) + 0.1 * random.nextGaussian(),
              /* firstCellM= */ 0.4,
              /* cellSizeM= */ 0.2,
              east,
              north));
      time += 0.5 + random.nextDouble();
    }
    return all;
  }

  private static PassDischarge reduce(
      List<Ensemble> record, Bank start, Edge left, Edge right, Settings settings) {
    try {
      return Crossing.reduce(Ensemble.record(record), start, left, right, settings);
    } catch (UnusableInput e) {
      throw new AssertionError(e);
    }
  }

  private static void assertSame(ZoneDischarge expected, double factor, ZoneDischarge actual) {
    double tolerance =
        1e-11 * Math.abs(factor) * (Math.abs(expected.measured()) + Math.abs(expected.top()));
    assertEquals(factor * expected.top(), actual.top(), tolerance);
    assertEquals(factor * expected.measured(), actual.measured(), tolerance);
    assertEquals(factor * expected.bottom(), actual.bottom(), tolerance);
    assertEquals(factor * expected.leftEdge(), actual.leftEdge(), tolerance);
    assertEquals(factor * expected.rightEdge(), actual.rightEdge(), tolerance);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void turningTheWorldChangesNothing(int seed) {
    double angle = 0.7 + seed;
    double c = Math.cos(angle);
    double s = Math.sin(angle);
    List<Ensemble> turned = new ArrayList<>();
    for (Ensemble each : record(seed)) {
      turned.add(transformed(each, c, -s, s, c, 1));
    }
    PassDischarge before = reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed));
    PassDischarge after = reduce(turned, Bank.LEFT, LEFT, RIGHT, settings(seed));
    assertSame(before.zones(), 1, after.zones());
    assertEquals(before.otherMethodTotalM3s(), after.otherMethodTotalM3s(), 1e-9);
    assertEquals(before.geometry().areaM2(), after.geometry().areaM2(), 1e-9);
    double turnedDeg = before.geometry().flowAzimuthDeg() - after.geometry().flowAzimuthDeg();
    assertEquals(0, Math.IEEEremainder(turnedDeg - Math.toDegrees(angle), 360), 1e-8);
  }

  /** Mirrored along the flow, the left bank becomes the right one and the flow keeps its sign. */
  @ParameterizedTest
  @MethodSource("seeds")
  void mirroringSwapsTheBanks(int seed) {
    List<Ensemble> mirrored = new ArrayList<>();
    for (Ensemble each : record(seed)) {
      mirrored.add(transformed(each, -1, 0, 0, 1, 1));
    }
    ZoneDischarge before = reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed)).zones();
    ZoneDischarge after = reduce(mirrored, Bank.RIGHT, RIGHT, LEFT, settings(seed)).zones();
    ZoneDischarge swapped =
        new ZoneDischarge(
            after.top(), after.measured(), after.bottom(), after.rightEdge(), after.leftEdge());
    assertSame(before, 1, swapped);
  }

  /** The same record, told that the other bank was the start, flows the other way. */
  @ParameterizedTest
  @MethodSource("seeds")
  void startAtTheOtherBankTurnsTheSign(int seed) {
    ZoneDischarge before = reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed)).zones();
    ZoneDischarge after = reduce(record(seed), Bank.RIGHT, RIGHT, LEFT, settings(seed)).zones();
    ZoneDischarge swapped =
        new ZoneDischarge(
            after.top(), after.measured(), after.bottom(), after.rightEdge(), after.leftEdge());
    assertSame(before, -1, swapped);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void dischargeScalesWithTheSquareOfVelocity(int seed) {
    double factor = 1.7;
    List<Ensemble> faster = new ArrayList<>();
    for (Ensemble each : record(seed)) {
      faster.add(transformed(each, factor, 0, 0, factor, 1));
    }
    PassDischarge before = reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed));
    PassDischarge after = reduce(faster, Bank.LEFT, LEFT, RIGHT, settings(seed));
    double square = factor * factor;
    double tolerance = 1e-10 * Math.abs(before.totalM3s());
    assertEquals(square * before.zones().measured(), after.zones().measured(), tolerance);
    assertEquals(square * before.zones().top(), after.zones().top(), tolerance);
    assertEquals(factor * before.zones().leftEdge(), after.zones().leftEdge(), tolerance);
  }

  /** A clock that runs at half speed makes the boat's way twice as long, and nothing else. */
  @ParameterizedTest
  @MethodSource("seeds")
  void slowerClockMovesTheBoatFarther(int seed) {
    List<Ensemble> slower = new ArrayList<>();
    for (Ensemble each : record(seed)) {
      slower.add(transformed(each, 1, 0, 0, 1, 2));
    }
    PassDischarge before = reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed));
    PassDischarge after = reduce(slower, Bank.LEFT, LEFT, RIGHT, settings(seed));
    double tolerance = 1e-10 * Math.abs(before.totalM3s());
    assertEquals(2 * before.zones().measured(), after.zones().measured(), tolerance);
    assertEquals(before.zones().leftEdge(), after.zones().leftEdge(), tolerance);
    assertEquals(2 * (before.geometry().widthM() - 5) + 5, after.geometry().widthM(), 1e-9);
  }

  /** What is filled in never exceeds everything, and nothing is filled in a full record. */
  @ParameterizedTest
  @MethodSource("seeds")
  void filledShareIsAShare(int seed) {
    double percent =
        reduce(record(seed), Bank.LEFT, LEFT, RIGHT, settings(seed))
            .geometry()
            .filledDischargePct();
    assertEquals(50, percent, 50);
    List<Ensemble> full = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      full.add(Ensemble.uniform(i, 1, 0, 4, 0, 1));
    }
    assertEquals(
        0, reduce(full, Bank.LEFT, LEFT, RIGHT, settings(seed)).geometry().filledDischargePct());
  }

  private static Ensemble transformed(
      Ensemble e, double ee, double en, double ne, double nn, double clock) {
    double[] east = new double[e.waterEast().length];
    double[] north = new double[east.length];
    Arrays.setAll(east, k -> ee * e.waterEast()[k] + en * e.waterNorth()[k]);
    Arrays.setAll(north, k -> ne * e.waterEast()[k] + nn * e.waterNorth()[k]);
    return new Ensemble(
        clock * e.elapsedS(),
        ee * e.boatEast() + en * e.boatNorth(),
        ne * e.boatEast() + nn * e.boatNorth(),
        e.depthBelowFaceM(),
        e.firstCellM(),
        e.cellSizeM(),
        east,
        north);
  }
}
