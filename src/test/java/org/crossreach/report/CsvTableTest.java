package org.crossreach.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** A table that cannot be written says so as every other file does. */
class CsvTableTest {

  @Test
  void tellsOfAFullDiskAsAnIoException() {
    OutputStream full =
        new OutputStream() {
          @Override
          public void write(int value) throws IOException {
            throw new IOException("No space left on device");
          }
        };
    List<CsvTable.Column<Integer>> columns = List.of(CsvTable.number("value", i -> i));
    CsvTable<Integer> table = new CsvTable<>(columns);
    List<Integer> many = IntStream.range(0, 10_000).boxed().toList();
    IOException failure = assertThrows(IOException.class, () -> table.write(many, full));
    assertEquals("No space left on device", failure.getMessage());
  }
}
