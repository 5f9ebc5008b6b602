package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** A reader that goes away is no failure; lost output is. */
class StandardOutputTest {

  @Test
  void passesBytesOn() {
    ByteArrayOutputStream target = new ByteArrayOutputStream();
    StandardOutput output = new StandardOutput(target);
    try (PrintWriter writer = new PrintWriter(output, true, StandardCharsets.UTF_8)) {
      writer.print("m³/s");
      writer.flush();
    }
    assertEquals("m³/s", target.toString(StandardCharsets.UTF_8));
    assertDoesNotThrow(output::requireComplete);
  }

  @Test
  void isQuietWhenTheReaderHasGone() {
    StandardOutput output = new StandardOutput(failing("Broken pipe"));
    output.write('x');
    assertDoesNotThrow(output::requireComplete);
  }

  @Test
  void tellsOfAFullDisk() {
    StandardOutput output = new StandardOutput(failing("No space left on device"));
    output.write('x');
    CannotWrite lost = assertThrows(CannotWrite.class, output::requireComplete);
    assertEquals("standard output: No space left on device", lost.getMessage());
  }

  private static OutputStream failing(String message) {
    return new OutputStream() {
      @Override
      public void write(int value) throws IOException {
        throw new IOException(message);
      }
    };
  }
}
