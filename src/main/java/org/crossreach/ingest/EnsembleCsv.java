package org.crossreach.ingest;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.crossreach.survey.UnusableInput;

/**
 * Reads an ensemble CSV, plain or packed by gzip.
 *
 * <p>One pass over the bytes: they are digested, unpacked, checked to be UTF-8, split by the rules
 * of RFC 4180 and turned into numbers without a String per field, in memory that depends on the
 * numbers kept and not on what the file looks like. Rows of plain numbers, which most rows are,
 * take a short way through {@link PlainRows}. Beyond the format's own rules: blank lines are
 * skipped; spaces and tabs around names, numbers and times are ignored; numbers are as {@link
 * Decimal} says and within {@link PhysicalRange}, also in cells beyond the ensemble's number of
 * cells, whose values are then dropped.
 *
 * <p>Bounds, beyond which a file is refused: {@value EnsembleFields#MOST_COLUMNS} columns, {@value
 * EnsembleColumn#MOST_CELLS} cells, {@value #LONGEST_FIELD} characters in a field, {@value
 * EnsembleTable#MOST_NUMBERS} numbers kept, 31 days from the first ensemble to the last; for gzip
 * those of {@link BoundedGunzip}.
 */
public final class EnsembleCsv {

  /** Most characters in a field. */
  static final int LONGEST_FIELD = 1 << 16;

  private EnsembleCsv() {}

  /**
   * Reads a file.
   *
   * @param file the file; packed when its name ends with {@code .gz}
   * @param shownName how problems call it
   * @return its ensembles, at least one
   * @throws UnusableInput with every problem of the file
   * @throws IOException when the file cannot be read from its disk
   */
  public static EnsembleFile read(Path file, String shownName) throws UnusableInput, IOException {
    FileProblems problems = new FileProblems(shownName);
    StoredFile.check(file, problems);
    try (InputStream stored = Files.newInputStream(file)) {
      return read(stored, file.toString().endsWith(".gz"), problems);
    } catch (IOException e) {
      throw StoredFile.named(shownName, e);
    }
  }

  /**
   * Reads the bytes of a file.
   *
   * @param bytes the bytes as stored
   * @param packed whether they are packed by gzip
   * @param problems receives what is wrong; names the file
   */
  static EnsembleFile read(InputStream bytes, boolean packed, FileProblems problems)
      throws UnusableInput, IOException {
    try (DigestedStream stored = new DigestedStream(bytes)) {
      EnsembleTable table = readTable(stored, packed, problems);
      problems.throwIfAny();
      return new EnsembleFile(table.build(), stored.input(problems.file()), table.header().notes());
    }
  }

  private static EnsembleTable readTable(InputStream stored, boolean packed, FileProblems problems)
      throws UnusableInput, IOException {
    EnsembleTable table = new EnsembleTable(problems);
    PlainRows plain;
    try {
      plain = new PlainRows(packed ? new BoundedGunzip(stored) : stored, table);
    } catch (UnreadableText e) {
      problems.add(0, "", e.found(), e.expected(), e.remedy());
      throw new UnusableInput(problems.list());
    }
    StrictUtf8Reader text = new StrictUtf8Reader(plain);
    if (parse(text, new EnsembleFields(text, plain, table, problems), problems)) {
      if (table.header() == null) {
        problems.add(0, "", "an empty file", "a header row and rows of ensembles", "");
      } else if (!table.hasRows()) {
        problems.add(0, "", "a header row only", "rows of ensembles", "");
      }
    }
    return table;
  }

  /** Sends the text through the fields; false when it had to stop before the end. */
  private static boolean parse(StrictUtf8Reader text, EnsembleFields fields, FileProblems problems)
      throws IOException {
    try {
      CsvReader.builder()
          .skipEmptyLines(false)
          .allowExtraFields(true)
          .allowMissingFields(true)
          .allowExtraCharsAfterClosingQuote(false)
          .maxBufferSize(LONGEST_FIELD)
          .build(fields, text)
          .iterator()
          .hasNext();
      return true;
    } catch (UncheckedIOException e) {
      if (e.getCause() instanceof UnreadableText unreadable) {
        problems.add(
            fields.line(), "", unreadable.found(), unreadable.expected(), unreadable.remedy());
        return false;
      }
      throw e.getCause();
    } catch (CsvParseException e) {
      if (e.getCause() instanceof EnsembleFields.Stopped) {
        return false;
      }
      if (!(e.getCause() instanceof CsvParseException)) {
        throw unexpected(e.getCause());
      }
      reportQuoting(text, fields, problems);
      return false;
    }
  }

  /** The parser gives up for two reasons; the size of the buffer it was filling tells which. */
  private static void reportQuoting(
      StrictUtf8Reader text, EnsembleFields fields, FileProblems problems) {
    if (text.largestTarget() >= LONGEST_FIELD) {
      problems.add(
          fields.line(),
          "",
          "a field of more than " + LONGEST_FIELD + " characters",
          "at most " + LONGEST_FIELD,
          "look for a quotation mark without its partner, or missing line breaks");
    } else {
      problems.add(
          fields.line(),
          "",
          "text after a closing quotation mark",
          "a comma or the end of the row",
          "write a quotation mark within a quoted field twice");
    }
  }

  private static RuntimeException unexpected(Throwable cause) {
    if (cause instanceof Error error) {
      throw error;
    }
    return new IllegalStateException(cause);
  }
}
