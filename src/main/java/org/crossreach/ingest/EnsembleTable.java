package org.crossreach.ingest;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.survey.Ensembles;

/**
 * Receives the fields of an ensemble CSV one by one from the parser's buffer and checks each where
 * it stands.
 *
 * <p>Rows are kept as long as nothing is wrong; from the first problem on they are only checked.
 */
final class EnsembleTable extends AbstractBaseCsvCallbackHandler<Object> {

  /** Most columns that a row can have. */
  static final int MOST_COLUMNS = 10_000;

  /** Most numbers that are kept of one file (2 GiB). */
  static final long MOST_NUMBERS = 1L << 28;

  private static final String MISSING_REMEDY = "leave the field empty for a missing value";

  private final FileProblems problems;
  private final StrictUtf8Reader text;
  private final List<String> names = new ArrayList<>();
  private final Rfc3339 time = new Rfc3339();
  private EnsembleHeader header;
  private EnsembleSequence sequence;
  private EnsembleRows rows;
  private boolean anyRow;
  private boolean blank;
  private boolean endsQuoted;
  private long problemsBefore;

  /** The numbers of the row that is being read, by field; empty until the header is known. */
  private double[] row = new double[0];

  /** For each field the lowest and the highest number; NaN for fields that are no numbers. */
  private double[] limits;

  /**
   * Starts an empty table.
   *
   * @param text where the characters come from; tells whether the file has ended
   * @param problems receives what is wrong
   */
  EnsembleTable(StrictUtf8Reader text, FileProblems problems) {
    this.text = text;
    this.problems = problems;
  }

  /** The header, {@code null} when there was none. */
  EnsembleHeader header() {
    return header;
  }

  /** Whether any row followed the header, usable or not. */
  boolean hasRows() {
    return anyRow;
  }

  /** The ensembles; to be called once, when there are rows and no problem. */
  Ensembles build() {
    return rows.build(sequence.start());
  }

  /** Line in which the row that is being read starts. */
  long line() {
    return getStartingLineNumber();
  }

  @Override
  protected void handleBegin(long startingLine) {
    blank = false;
    problemsBefore = problems.count();
  }

  @Override
  protected void handleEmpty() {
    blank = true;
  }

  @Override
  protected void handleField(int field, char[] buffer, int offset, int length, boolean quoted) {
    endsQuoted = quoted;
    double[] numbers = row;
    if (field >= numbers.length) {
      handleBeyond(field, buffer, offset, length);
    } else if (length == 0) {
      numbers[field] = Double.NaN;
    } else {
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
    if (header == null) {
      names.add(new String(buffer, offset, length));
    }
  }

  /** A field that is not plainly a number in range: another column, missing, spaced, or wrong. */
  private double unusual(int field, char[] buffer, int start, int end) {
    EnsembleColumn column = header.column(field);
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
    if (time.parse(buffer, from, to)) {
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
    if (header == null) {
      takeHeader();
    } else {
      anyRow = true;
      if (!openQuote && getFieldCount() == row.length) {
        takeRow();
      } else if (!openQuote) {
        problems.takeBack(problemsBefore); // the fields were taken for those of other columns
        reportWidth(getFieldCount());
      }
    }
    return null;
  }

  private void takeHeader() {
    header = new EnsembleHeader(names, line(), problems);
    if (!header.isUsable()) {
      throw new Stopped();
    }
    sequence = new EnsembleSequence(header, problems);
    rows = new EnsembleRows(header);
    limits = new double[2 * header.width()];
    for (int field = 0; field < header.width(); field++) {
      EnsembleColumn column = header.column(field);
      boolean number = column != null && column.role() != EnsembleColumn.Role.TIME;
      limits[2 * field] = number ? column.range().lowest() : Double.NaN;
      limits[2 * field + 1] = number ? column.range().highest() : Double.NaN;
    }
    row = new double[header.width()];
  }

  private void reportWidth(int found) {
    String remedy;
    if (found > row.length) {
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
        row.length + " as in the header",
        remedy);
  }

  private void takeRow() {
    sequence.check(line(), row, time);
    if (!problems.isEmpty()) {
      return;
    }
    if ((long) (rows.size() + 1) * rows.width() > MOST_NUMBERS) {
      problems.add(
          line(),
          "",
          "more than " + MOST_NUMBERS + " numbers so far",
          "at most " + MOST_NUMBERS + " in a file",
          "split the file, or leave out columns that are not needed");
      throw new Stopped();
    }
    rows.add(sequence.number(row), sequence.elapsedS(time), sequence.cells(row), row);
  }

  /** Ends the reading before the end of the file, after the reason was added to the problems. */
  static final class Stopped extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }
}
