package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import org.crossreach.discharge.PassDischarge;
import org.junit.jupiter.api.Test;

/** Every cell stands at its place with its size; where there is none, the paper shows. */
class VelocityImageTest {

  @Test
  void coloursTheMeasuredZoneOnly() throws Exception {
    PassDischarge pass = new River(200, 24, 0, 1).result().reduction().passes().get(0);
    SectionShape shape = new SectionShape(pass);
    Verticals verticals = Verticals.of(shape, pass.transports(), 60);
    int height = 200;
    BufferedImage image =
        VelocityImage.of(shape, 5, new VelocityRange(0, 2), /* width= */ 60, height);
    int coloured = 0;
    for (int x = 1; x < 59; x++) {
      for (int y = 0; y < height; y++) {
        double depth = (y + 0.5) / height * 5;
        boolean ink = image.getRaster().getSample(x, y, 0) != 0;
        coloured += ink ? 1 : 0;
        // A neighbour in the strip may have lost its last cell, and its edge is one of 0.21 m off.
        boolean outside = depth < verticals.topM[x] - 0.43 || depth > verticals.bottomM[x] + 0.43;
        assertTrue(!ink || !outside, x + ", " + y);
      }
    }
    assertTrue(coloured > 3000, "only " + coloured);
  }

  @Test
  void givesFasterWaterDarkerColours() throws Exception {
    PassDischarge pass = new River(200, 24, 0, 1).result().reduction().passes().get(0);
    SectionShape shape = new SectionShape(pass);
    BufferedImage image = VelocityImage.of(shape, 5, new VelocityRange(0, 2), 100, 200);
    int surface = image.getRaster().getSample(50, 30, 0);
    int low = image.getRaster().getSample(50, 130, 0);
    int slow = image.getRaster().getSample(3, 30, 0);
    assertTrue(surface > low && low > 0, surface + " " + low);
    assertTrue(surface > slow, surface + " " + slow);
  }

  @Test
  void coversTheVelocitiesThatMatter() throws Exception {
    PassDischarge pass = River.usual().result().reduction().passes().get(0);
    VelocityRange range = VelocityRange.of(pass.section());
    assertEquals(0, range.lowest(), 0.1);
    assertTrue(range.highest() > 1.2 && range.highest() < 2.2, range.toString());
  }
}
