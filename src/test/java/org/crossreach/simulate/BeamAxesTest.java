package org.crossreach.simulate;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Beams and turns follow the geometry of four slant beams.
 *
 * <p>Validation: geometry after Lu and Lueck 1999, J. Atmos. Oceanic Technol. 16, 1556 (from
 * memory), vectors printed to 9 decimals. Theirs are beams to starboard, port, bow and stern, 20
 * degrees, velocities positive AWAY from the transducer; ours are positive towards it.
 */
class BeamAxesTest {

  private static final List<Double> CROSS = List.of(90.0, 270.0, 0.0, 180.0);

  @ParameterizedTest
  @CsvSource({
    "1.2,0.3,0.02,30,0,0, 0.889230485,0.859807621,0.02, 0.285340885,-0.322928590,0.275277673,-0.312865378",
    "1.2,0.3,0.02,30,5,-3, 0.885132653,0.858278908,-0.101476612, 0.398090020,-0.207376373,0.388905499,-0.198191852",
    "-0.8,1.5,-0.01,217.5,-2,4, 1.546463012,-0.702243611,0.073525929, 0.459829728,-0.598013274,-0.309273234,0.171089687",
    "0.5,0,0,0,10,0, 0.5,0,0, 0.171010072,-0.171010072,0,0",
    "0.5,0,0,90,0,10, 0,0.5,0, 0,0,0.171010072,-0.171010072"
  })
  void turnsAndSplits(
      double e,
      double n,
      double u,
      double heading,
      double pitch,
      double roll,
      double x,
      double y,
      double z,
      double b1,
      double b2,
      double b3,
      double b4) {
    double[] inside = new Turn(heading, pitch, roll).fromEarth(new double[] {e, n, u});
    assertArrayEquals(new double[] {x, y, z}, inside, 1e-9);
    BeamAxes beams = new BeamAxes(20, CROSS);
    double[] towards = new double[4];
    for (int beam = 0; beam < 4; beam++) {
      towards[beam] = beams.towards(beam, inside);
    }
    assertArrayEquals(new double[] {-b1, -b2, -b3, -b4}, towards, 1e-9);
    double[] back = beams.fromBeams(towards);
    assertArrayEquals(new double[] {x, y, z, 0}, back, 2e-9);
    assertArrayEquals(
        new double[] {e, n, u},
        new Turn(heading, pitch, roll).toEarth(new double[] {back[0], back[1], back[2]}),
        2e-9);
  }

  /** 0.05 m/s on one beam at 20 degrees gives an error velocity of 0.051686048 m/s in size. */
  @Test
  void oneBeamOffShowsAsErrorVelocity() {
    double[] axes = new BeamAxes(20, CROSS).fromBeams(new double[] {0, -0.05, 0, 0});
    assertEquals(0.051686048, Math.abs(axes[3]), 1e-9);
    assertEquals(1 - 0.926904890, Math.abs(axes[0]), 1e-9);
  }
}
