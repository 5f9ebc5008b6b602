package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** A terminal shows every line that was printed, and the status below them, without remnants. */
class StatusLineTest {

  private final StringWriter written = new StringWriter();
  private final StatusLine line = new StatusLine(new PrintWriter(written));

  /** What a terminal shows that knows carriage return and line feed and nothing else. */
  private List<String> shown() {
    List<String> rows = new ArrayList<>();
    for (String row : written.toString().split("\n", -1)) {
      StringBuilder cells = new StringBuilder();
      for (String over : row.split("\r", -1)) {
        cells.replace(0, Math.min(over.length(), cells.length()), over);
      }
      rows.add(cells.toString().stripTrailing());
    }
    return rows;
  }

  @Test
  void keepsLinesThatArePrintedAboveIt() {
    line.accept("status one of some length");
    line.above("a failed");
    line.above("b failed");
    line.accept("status two");
    assertEquals(List.of("a failed", "b failed", "status two"), shown());
    line.close();
    assertEquals(List.of("a failed", "b failed", "status two", ""), shown());
  }

  @Test
  void isNeverWiderThanTheTerminal() {
    line.accept("x".repeat(10_000));
    assertTrue(shown().get(0).length() <= line.getMaxRenderedLength());
  }
}
