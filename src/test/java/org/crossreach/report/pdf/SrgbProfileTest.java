package org.crossreach.report.pdf;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.color.ColorSpace;
import java.awt.color.ICC_ColorSpace;
import java.awt.color.ICC_Profile;
import org.junit.jupiter.api.Test;

/** Our profile means the same colours as the platform's own sRGB. */
class SrgbProfileTest {

  @Test
  void meansTheSameColoursAsThePlatforms() {
    ICC_ColorSpace ours = new ICC_ColorSpace(ICC_Profile.getInstance(SrgbProfile.bytes()));
    ColorSpace platforms = ColorSpace.getInstance(ColorSpace.CS_sRGB);
    for (float r = 0; r <= 1; r += 0.25f) {
      for (float g = 0; g <= 1; g += 0.25f) {
        for (float b = 0; b <= 1; b += 0.25f) {
          float[] colour = {r, g, b};
          float[] xyz = ours.toCIEXYZ(colour);
          float[] expected = platforms.toCIEXYZ(colour);
          for (int c = 0; c < 3; c++) {
            // One step of 8 bits at the bright end is 0.009.
            assertEquals(expected[c], xyz[c], 0.004, r + " " + g + " " + b);
          }
        }
      }
    }
  }
}
