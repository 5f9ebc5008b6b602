package org.crossreach.ingest;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.util.ArrayList;
import java.util.List;

/**
 * Receives the fields of an ensemble CSV one by one from the parser's buffer and checks each where
 * it stands: of the header, and of the rows that {@link PlainRows} leaves.
 */
final class EnsembleFields extends AbstractBaseCsvCallbackHandler<Object> {

  /** Most columns that a row can have. */
  static final int MOST_COLUMNS = 10_000;

  private static final String MISSING_REMEDY = "leave the field empty for a missing value";

  private final FileProblems problems;
  private final StrictUtf8Reader text;
  private final PlainRows plain;
  private final EnsembleTable table;
  private final List<String> names = new ArrayList<>();
  private boolean blank;
  private boolean endsQuoted;
  private long problemsBefore;

  /**
   * Starts before the header.
   *
   * @param text where the characters come from; tells whether the file has ended
   * @param plain where its bytes come from, and which rows it takes itself
   * @param table receives the rows
   * @param problems receives what is wrong
   */
  EnsembleFields(
      StrictUtf8Reader text, PlainRows plain, EnsembleTable table, FileProblems problems) {
    this.text = text;
    this.plain = plain;
    this.table = table;
    this.problems = problems;
  }

  /** Line in which the row that is being read starts. */
  long line() {
    return getStartingLineNumber() + plain.lines();
  }

  @Override
  protected void handleBegin(long startingLine) {
    blank = false;
    plain.beginRow(startingLine);
  }

  @Override
  protected void handleEmpty() {
    blank = true;
  }

  @Override
  protected void handleField(int field, char[] buffer, int offset, int length, boolean quoted) {
    if (field == 0) {
      problemsBefore = problems.count();
    }
    endsQuoted = quoted;
    double[] numbers = table.row();
    if (field >= numbers.length) {
      handleBeyond(field, buffer, offset, length);
    } else if (length == 0) {
      numbers[field] = Double.NaN;
    } else {
      double[] limits = table.limits();
      double value = Decimal.parse(buffer, offset, offset + length);
      numbers[field] =
          value >= limits[2 * field] && value <= limits[2 * field + 1]
              ? value
              : unusual(field, buffer, offset, offset + length);
    }
  }

  private void handleBeyond(int field, char[] buffer, int offset, int length) {
    if (field >= MOST_COLUMNS) {
      problems.takeBack(problemsBefore);
      problems.add(
          line(),
          "",
          "a row of more than " + MOST_COLUMNS + " fields",
          "at most " + MOST_COLUMNS,
          "end each row with a line break");
      throw new Stopped();
    }
    if (table.header() == null) {
      names.add(new String(buffer, offset, length));
    }
  }

  /** A field that is not plainly a number in range: another column, missing, spaced, or wrong. */
  private double unusual(int field, char[] buffer, int start, int end) {
    EnsembleColumn column = table.header().column(field);
    if (column == null) {
      return Double.NaN;
    }
    int from = start;
    int to = end;
    while (from < to && isSpace(buffer[from])) {
      from++;
    }
    while (from < to && isSpace(buffer[to - 1])) {
      to--;
    }
    if (isMissing(buffer, from, to)) {
      return Double.NaN;
    }
    if (column.role() == EnsembleColumn.Role.TIME) {
      return readTime(buffer, from, to);
    }
    double value = Decimal.parse(buffer, from, to);
    if (column.range().holds(value)) {
      return value;
    }
    problems.add(
        line(),
        column.name(),
        Quoted.of(buffer, from, to),
        Double.isNaN(value) ? "a number" : column.range().phrase(),
        Double.isNaN(value) ? remedyFor(buffer, from, to) : MISSING_REMEDY);
    return EnsembleSequence.FAULTY;
  }

  /** Reads the time of the row; 0 when it was read. */
  private double readTime(char[] buffer, int from, int to) {
    if (table.time().parse(buffer, from, to)) {
      return 0;
    }
    problems.add(
        line(),
        EnsembleColumn.TIME,
        Quoted.of(buffer, from, to),
        "a date and time with offset, for example 2031-04-18T09:30:00.25+01:00",
        "");
    return EnsembleSequence.FAULTY;
  }

  private static String remedyFor(char[] buffer, int from, int to) {
    for (int i = from; i < to; i++) {
      if (buffer[i] == ',') {
        return "use a decimal point";
      }
      if (buffer[i] == 0) {
        return "the file is damaged: copy it again";
      }
    }
    return MISSING_REMEDY;
  }

  private static boolean isSpace(char character) {
    return character == ' ' || character == '\t';
  }

  /** Whether a slice is empty, {@code NaN} or {@code NA}. */
  private static boolean isMissing(char[] buffer, int from, int to) {
    int length = to - from;
    return length == 0
        || (length >= 2
            && length <= 3
            && buffer[from] == 'N'
            && (length == 2 || buffer[from + 1] == 'a')
            && buffer[to - 1] == (length == 2 ? 'A' : 'N'));
  }

  @Override
  protected Object buildRecord() {
    if (blank) {
      return null;
    }
    boolean openQuote = endsQuoted && text.ended() && text.last() != '"';
    if (openQuote) {
      problems.takeBack(problemsBefore); // the mark swallowed what follows it
      problems.add(line(), "", "a quotation mark without its partner", "a closing one", "");
    }
    if (table.header() == null) {
      table.takeHeader(names, line());
      if (!table.header().isUsable()) {
        throw new Stopped();
      }
    } else if (openQuote) {
      table.noteRow();
    } else {
      endRow(getFieldCount());
    }
    return null;
  }

  private void endRow(int fields) {
    int expected = table.row().length;
    if (fields != expected) {
      problems.takeBack(problemsBefore); // the fields were taken for those of other columns
      reportWidth(fields, expected);
      table.noteRow();
    } else if (!table.hasRoom()) {
      problems.add(
          line(),
          "",
          "more than " + EnsembleTable.MOST_NUMBERS + " numbers so far",
          "at most " + EnsembleTable.MOST_NUMBERS + " in a file",
          "split the file, or leave out columns that are not needed");
      throw new Stopped();
    } else {
      table.takeRow(line());
    }
  }

  private void reportWidth(int found, int expected) {
    String remedy;
    if (found > expected) {
      remedy = "if commas stand for decimal points, write points";
    } else if (text.ended()) {
      remedy = "the file ends within this row: copy it again, or delete the row";
    } else {
      remedy = "complete the row, or delete it";
    }
    problems.add(
        line(),
        "",
        found + (found == 1 ? " field" : " fields"),
        expected + " as in the header",
        remedy);
  }

  /** Ends the reading before the end of the file, after the reason was added to the problems. */
  static final class Stopped extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }
}
