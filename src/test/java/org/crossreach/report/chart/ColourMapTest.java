package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import org.junit.jupiter.api.Test;

/** The colours get darker all the way, evenly, so that they read in grey. */
class ColourMapTest {

  @Test
  void endsWithThePublishedColours() {
    // Smith and van der Walt 2015: viridis runs from #440154 to #fde725; ours is turned round.
    assertEquals(new Color(0xFDE725), ColourMap.at(0));
    assertEquals(new Color(0x440154), ColourMap.at(1));
  }

  @Test
  void keepsToTheNearestColourBeyondTheEnds() {
    assertEquals(ColourMap.at(0), ColourMap.at(-3));
    assertEquals(ColourMap.at(1), ColourMap.at(7));
  }

  @Test
  void getsDarkerEvenly() {
    double first = lightness(ColourMap.at(0));
    double last = lightness(ColourMap.at(1));
    double before = first + 1;
    for (int c = 0; c < ColourMap.SIZE; c++) {
      double share = (c + 0.5) / ColourMap.SIZE;
      double lightness = lightness(ColourMap.at(share));
      // Rounded to 8 bits, neighbours may change places by a hair.
      assertTrue(lightness < before + 0.1, "colour " + c);
      // The map was made for even steps in CAM02-UCS; in L* that is straight to a few units.
      assertEquals(first + share * (last - first), lightness, 4, "colour " + c);
      before = lightness;
    }
  }

  /** CIE 1976 lightness L*. Source: IEC 61966-2-1 for sRGB; CIE 15:2004, 8.2.1, for L*. */
  private static double lightness(Color colour) {
    double y =
        0.2126 * linear(colour.getRed())
            + 0.7152 * linear(colour.getGreen())
            + 0.0722 * linear(colour.getBlue());
    return y > 216.0 / 24389 ? 116 * Math.cbrt(y) - 16 : 24389.0 / 27 * y;
  }

  private static double linear(int value) {
    double share = value / 255.0;
    return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }
}
