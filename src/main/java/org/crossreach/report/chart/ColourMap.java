package org.crossreach.report.chart;

import java.awt.Color;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/**
 * The colours that stand for velocity: viridis, turned round so that fast water is dark.
 *
 * <p>Perceptually uniform, safe for colour-blind eyes, and falling in lightness all the way, so
 * that it reads in grey. Source: Nathaniel Smith and Stefan van der Walt 2015, released under CC0
 * 1.0.
 */
public final class ColourMap {

  /** Number of colours. */
  public static final int SIZE = 256;

  private static final int[] RGB = read();

  private ColourMap() {}

  private static int[] read() {
    int[] rgb = new int[SIZE];
    int count = 0;
    try (InputStream stream = ColourMap.class.getResourceAsStream("viridis.txt");
        BufferedReader lines =
            new BufferedReader(new InputStreamReader(stream, StandardCharsets.US_ASCII))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        for (int at = 0; !line.startsWith("#") && at < line.length(); at += 7) {
          rgb[SIZE - ++count] = Integer.parseInt(line, at, at + 6, 16);
        }
      }
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
    return rgb;
  }

  /**
   * The colour of a share of the range.
   *
   * @param share 0 for the lightest to 1 for the darkest (0.5 → the middle); beyond them the
   *     nearest
   */
  public static Color at(double share) {
    int index = (int) Math.floor(share * SIZE);
    return new Color(RGB[Math.max(0, Math.min(SIZE - 1, index))]);
  }
}
