package org.crossreach.report;

import com.fasterxml.jackson.core.io.NumberOutput;
import de.siegmar.fastcsv.writer.CsvWriter;
import de.siegmar.fastcsv.writer.LineDelimiter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * A table for machines: RFC 4180 with LF, one header row, numbers that read back as the same
 * doubles, an empty field for a missing value.
 *
 * @param columns the columns in order
 * @param <R> what a row is made of
 */
public record CsvTable<R>(List<Column<R>> columns) {

  /**
   * A column.
   *
   * @param name its name, with the unit
   * @param text its text in a row
   */
  public record Column<R>(String name, Field<R> text) {}

  /** The text of one field. */
  public interface Field<R> {
    String of(R row);
  }

  /** A number of one field. */
  public interface Figure<R> {
    double of(R row);
  }

  /** A column of numbers. */
  public static <R> Column<R> number(String name, Figure<R> figure) {
    return new Column<>(name, row -> text(figure.of(row)));
  }

  /** The fewest digits that tell a double from its neighbours, empty when it is not finite. */
  public static String text(double value) {
    return Double.isFinite(value) ? NumberOutput.toString(value + 0.0, true) : "";
  }

  /**
   * Writes the table.
   *
   * @param rows its rows
   * @param target receives UTF-8; it is left open
   */
  public void write(Iterable<R> rows, OutputStream target) throws IOException {
    Writer writer = new OutputStreamWriter(target, StandardCharsets.UTF_8);
    CsvWriter csv = CsvWriter.builder().lineDelimiter(LineDelimiter.LF).build(writer);
    try {
      write(rows, csv);
    } catch (UncheckedIOException hidden) { // so the CSV library tells of a full disk
      throw hidden.getCause();
    }
  }

  private void write(Iterable<R> rows, CsvWriter csv) throws IOException {
    String[] fields = new String[columns.size()];
    for (int c = 0; c < fields.length; c++) {
      fields[c] = columns.get(c).name();
    }
    csv.writeRecord(fields);
    for (R row : rows) {
      for (int c = 0; c < fields.length; c++) {
        fields[c] = columns.get(c).text().of(row);
      }
      csv.writeRecord(fields);
    }
    csv.flush();
  }
}
