package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.crossreach.settings.DepthSource;
import org.crossreach.settings.Limit;
import org.crossreach.survey.EnsembleQuantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A beam that stands apart is left out; a bed that is steep, stepped or rough is not. */
class BeamDepthsScreenTest {

  private static final int SIZE = 200;
  private static final double TAN_20 = Math.tan(Math.toRadians(20));

  @Test
  void leavesOutTheBeamThatStandsApartAndKeepsTheOthers() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.DEPTH_BEAM_2_M, i -> i % 10 == 3 ? 2.9 : 4.5);
    BeamDepths beams = beams(recording, Limit.AUTO);
    assertEquals(20, beams.rejected());
    assertEquals(4.5, beams.by(DepthSource.SLANT_MEAN, 3));
    assertEquals(4.5, beams.shallowest()[3]);
    assertEquals(0, beams(recording, Limit.OFF).rejected());
    assertEquals(4.1, beams(recording, Limit.OFF).by(DepthSource.SLANT_MEAN, 3), 1e-15);
    assertEquals(0, beams(recording, Limit.of(0.4)).rejected());
  }

  @Test
  void leavesOutABeamThatIsLockedAtAThirdOfTheDepth() {
    Recording recording = Recording.earth(SIZE);
    recording.put(EnsembleQuantity.DEPTH_BEAM_2_M, i -> i > 50 && i < 120 ? 1.5 : 4.5);
    BeamDepths beams = beams(recording, Limit.AUTO);
    assertEquals(69, beams.rejected());
    assertEquals(4.5, beams.by(DepthSource.SLANT_MEAN, 80));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.05, 0.2, 0.5, 1.0})
  void keepsEveryBeamOnASlope(double slope) {
    // Two beams look up the bank and two down, at 45 degrees to the slope; 0.25 m an ensemble.
    double across = slope * TAN_20 * Math.sqrt(0.5);
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      double sign = beam <= 2 ? 1 : -1;
      recording.put(
          EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"),
          i -> (0.5 + slope * 0.25 * Math.min(i, SIZE - 1 - i)) / (1 - sign * across));
    }
    assertEquals(0, beams(recording, Limit.AUTO).rejected());
  }

  @Test
  void keepsEveryBeamAtAStepAndOnARoughBed() {
    Random random = new Random(3);
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(
          EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"),
          i -> (i < 100 ? 2 : 6) * (1 + 0.02 * random.nextGaussian()));
    }
    assertEquals(0, beams(recording, Limit.AUTO).rejected());
  }

  @Test
  void findsItsLimitInTheRecord() {
    Random random = new Random(4);
    Recording recording = Recording.earth(2000);
    for (int beam = 1; beam <= 4; beam++) {
      recording.put(
          EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"),
          i -> 4.5 * (1 + 0.02 * random.nextGaussian()));
    }
    List<FoundLimit> found = new ArrayList<>();
    new BeamDepths(recording.ensembles(), SoundRatio.NONE, Limit.AUTO, found);
    // A beam scatters about the median of four, of which it is one, by 0.7 of its own scatter.
    assertEquals(5 * 0.7 * 0.02, found.get(0).value(), 0.004);
  }

  @Test
  void singleBeamIsLeftOutOnlyWhenItIsOffByHalf() {
    Recording recording = Recording.earth(SIZE);
    for (int beam = 1; beam <= 4; beam++) {
      recording.columns.remove(EnsembleQuantity.valueOf("DEPTH_BEAM_" + beam + "_M"));
    }
    recording.put(EnsembleQuantity.DEPTH_VERTICAL_M, i -> i == 60 ? 3.0 : i == 90 ? 12 : 4.5);
    BeamDepths beams = beams(recording, Limit.AUTO);
    assertEquals(Reason.NONE, beams.reason(60));
    assertEquals(Reason.DEPTH_BEAMS, beams.reason(90));
  }

  private static BeamDepths beams(Recording recording, Limit limit) {
    return new BeamDepths(recording.ensembles(), SoundRatio.NONE, limit, new ArrayList<>());
  }
}
