package org.crossreach.report.pdf;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.util.List;
import org.crossreach.report.chart.Face;
import org.junit.jupiter.api.Test;

/** Text breaks at spaces, inside a word only when a line is too short for it, and loses nothing. */
class TextTest {

  private static final Ink INK = new Ink(Face.REGULAR, 8, Color.BLACK);

  @Test
  void keepsShortTextOnOneLine() {
    assertEquals(List.of("a short line"), Text.lines(INK, "a short line", 200));
    assertEquals(List.of(""), Text.lines(INK, "", 200));
  }

  @Test
  void breaksAtSpaces() {
    String text = "the water between the boat and the bank is not measured";
    List<String> lines = Text.lines(INK, text, 60);
    assertTrue(lines.size() > 2);
    assertEquals(text, String.join(" ", lines));
    for (String line : lines) {
      assertTrue(INK.width(line) <= 60, line);
    }
  }

  @Test
  void breaksAWordThatIsWiderThanALine() {
    String hash = "0123456789abcdef".repeat(4);
    List<String> lines = Text.lines(INK, hash, 100);
    assertEquals(hash, String.join("", lines));
    for (String line : lines) {
      assertTrue(INK.width(line) <= 100, line);
    }
  }

  @Test
  void standsInForWhatTheFaceDoesNotHave() {
    assertEquals(List.of("? ?"), Text.lines(INK, "渡\n\uD83D\uDEA3", 100));
  }

  @Test
  void measuresAsTheGraphicsSystemDoes() {
    // Two readers of the same font: its tables read by us, and the platform's own layout.
    String text = "Discharge 268.5 m³/s, depth of the bed";
    double platform =
        Face.REGULAR
            .size(8)
            .getStringBounds(text, new java.awt.font.FontRenderContext(null, true, true))
            .getWidth();
    assertEquals(platform, INK.width(text), 0.02);
  }
}
