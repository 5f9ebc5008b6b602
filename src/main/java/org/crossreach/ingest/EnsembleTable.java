package org.crossreach.ingest;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.crossreach.survey.EnsembleQuantity;
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

  /** Longest time from the first ensemble to the last (s): 31 days. */
  static final long LONGEST_S = 31L * 86_400;

  private static final String MISSING_REMEDY = "leave the field empty for a missing value";

  private final FileProblems problems;
  private final StrictUtf8Reader text;
  private final List<String> names = new ArrayList<>();
  private final Rfc3339 time = new Rfc3339();
  private EnsembleHeader header;
  private EnsembleRows rows;
  private OffsetDateTime start;
  private int width;
  private boolean endsQuoted;
  private boolean blank;
  private boolean anyRow;
  private long problemsBefore;

  /** For each field: index in {@link #row}, or one of the negative values below. */
  private int[] slots;

  private static final int IGNORED = -1;
  private static final int NUMBER = -2;
  private static final int TIME = -3;
  private static final int CELLS = -4;

  private double[] lowest;
  private double[] highest;
  private double[] row;
  private int firstCellSlot;
  private int cellSizeSlot;
  private double number;
  private double cells;
  private boolean timeRead;
  private double previousNumber = Double.NaN;
  private boolean previousTimeRead;
  private long previousSecond;
  private int previousNano;
  private boolean anyTime;
  private long firstSecond;
  private int firstNano;

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
    return rows.build(start);
  }

  /** Line in which the row that is being read starts. */
  long line() {
    return getStartingLineNumber();
  }

  @Override
  protected void handleBegin(long startingLine) {
    number = Double.NaN;
    cells = Double.NaN;
    timeRead = false;
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
    if (field >= width) {
      handleBeyond(field, buffer, offset, length);
      return;
    }
    int slot = slots[field];
    if (slot >= 0) {
      if (length == 0) {
        row[slot] = Double.NaN;
        return;
      }
      double value = Decimal.parse(buffer, offset, offset + length);
      row[slot] =
          value >= lowest[field] && value <= highest[field]
              ? value
              : unusual(field, buffer, offset, offset + length);
    } else if (slot != IGNORED) {
      handleKey(slot, field, buffer, offset, offset + length);
    }
  }

  private void handleBeyond(int field, char[] buffer, int offset, int length) {
    if (field >= MOST_COLUMNS) {
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

  /** A field that is not plainly a number in range: missing, with spaces around it, or wrong. */
  private double unusual(int field, char[] buffer, int start, int end) {
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
    double value = Decimal.parse(buffer, from, to);
    if (value >= lowest[field] && value <= highest[field]) {
      return value;
    }
    PhysicalRange range = header.column(field).range();
    String found = Quoted.of(buffer, start, end);
    if (Double.isNaN(value)) {
      problems.add(line(), header.name(field), found, "a number", remedyFor(buffer, from, to));
    } else {
      problems.add(line(), header.name(field), found, range.phrase(), MISSING_REMEDY);
    }
    return Double.NaN;
  }

  private static String remedyFor(char[] buffer, int from, int to) {
    for (int i = from; i < to; i++) {
      if (buffer[i] == ',') {
        return "use a decimal point";
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

  private void handleKey(int key, int field, char[] buffer, int start, int end) {
    if (key == TIME) {
      handleTime(field, buffer, start, end);
      return;
    }
    double value = unusual(field, buffer, start, end);
    if (Double.isNaN(value)) {
      if (isMissing(buffer, start, end)) {
        problems.add(line(), header.name(field), Quoted.of(buffer, start, end), "a number", "");
      }
    } else if (value != Math.rint(value)) {
      problems.add(line(), header.name(field), Quoted.of(buffer, start, end), "a whole number", "");
      value = Double.NaN;
    }
    if (key == NUMBER) {
      number = value;
    } else {
      cells = value;
    }
  }

  private void handleTime(int field, char[] buffer, int start, int end) {
    int from = start;
    int to = end;
    while (from < to && isSpace(buffer[from])) {
      from++;
    }
    while (from < to && isSpace(buffer[to - 1])) {
      to--;
    }
    timeRead = time.parse(buffer, from, to);
    if (!timeRead) {
      problems.add(
          line(),
          header.name(field),
          Quoted.of(buffer, start, end),
          "a date and time with offset, for example 2031-04-18T09:30:00.25+01:00",
          "");
    }
  }

  @Override
  protected Object buildRecord() {
    if (blank) {
      return null;
    }
    if (endsQuoted && text.ended() && text.last() != '"') {
      problems.add(line(), "", "a quotation mark without its partner", "a closing one", "");
    }
    if (header == null) {
      takeHeader();
    } else {
      anyRow = true;
      if (getFieldCount() == width) {
        takeRow();
      } else {
        problems.takeBack(problemsBefore); // the fields were taken for those of other columns
        reportWidth(getFieldCount());
      }
    }
    return null;
  }

  private void takeHeader() {
    header = new EnsembleHeader(names, line(), problems);
    width = header.width();
    if (!header.isUsable()) {
      throw new Stopped();
    }
    rows = new EnsembleRows(header);
    row = new double[rows.width()];
    Arrays.fill(row, Double.NaN);
    slots = new int[width];
    lowest = new double[width];
    highest = new double[width];
    for (int i = 0; i < width; i++) {
      EnsembleColumn column = header.column(i);
      slots[i] = column == null ? IGNORED : slot(column);
      if (column != null) {
        lowest[i] = column.range().lowest();
        highest[i] = column.range().highest();
      }
    }
    firstCellSlot = rows.slot(EnsembleQuantity.FIRST_CELL_M);
    cellSizeSlot = rows.slot(EnsembleQuantity.CELL_SIZE_M);
  }

  private int slot(EnsembleColumn column) {
    return switch (column.role()) {
      case NUMBER -> NUMBER;
      case TIME -> TIME;
      case CELLS -> CELLS;
      case ENSEMBLE, CELL -> rows.slot(column);
    };
  }

  private void reportWidth(int found) {
    String remedy;
    if (found > width) {
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
        width + " as in the header",
        remedy);
  }

  private void takeRow() {
    checkNumber();
    checkTime();
    checkCells();
    if (!problems.isEmpty()) {
      return;
    }
    if ((long) (rows.size() + 1) * row.length > MOST_NUMBERS) {
      problems.add(
          line(),
          "",
          "more than " + MOST_NUMBERS + " numbers so far",
          "at most " + MOST_NUMBERS + " in a file",
          "split the file, or leave out columns that are not needed");
      throw new Stopped();
    }
    long nanos = (time.epochSecond() - firstSecond) * 1_000_000_000L + time.nano() - firstNano;
    rows.add((long) number, nanos / 1e9, (int) cells, row);
  }

  private void checkNumber() {
    if (number <= previousNumber) {
      problems.add(
          line(),
          EnsembleColumn.NUMBER,
          '"' + Long.toString((long) number) + "\" after \"" + (long) previousNumber + '"',
          "a number above that of the row before",
          "sort the rows, or remove repeated ones");
    }
    previousNumber = number;
  }

  private void checkTime() {
    if (timeRead) {
      long second = time.epochSecond();
      if (!anyTime) {
        anyTime = true;
        firstSecond = second;
        firstNano = time.nano();
        start = time.toOffsetDateTime();
      } else if (previousTimeRead
          && (second < previousSecond || second == previousSecond && time.nano() <= previousNano)) {
        problems.add(
            line(),
            EnsembleColumn.TIME,
            "a time that is not after that of the row before",
            "increasing times",
            "sort the rows, or correct the clock");
      } else if (Math.abs(second - firstSecond) > LONGEST_S) {
        problems.add(
            line(),
            EnsembleColumn.TIME,
            "a time " + Math.abs(second - firstSecond) / 86_400 + " days from the first one",
            "all ensembles within " + LONGEST_S / 86_400 + " days",
            "correct the date");
      }
      previousSecond = second;
      previousNano = time.nano();
    }
    previousTimeRead = timeRead;
  }

  private void checkCells() {
    if (cells > header.maxCells()) {
      problems.add(
          line(),
          EnsembleColumn.CELLS,
          '"' + Integer.toString((int) cells) + '"',
          "at most " + header.maxCells() + ", the number of cells that have columns",
          "add the missing columns, or correct the number");
    } else if (cells > 0) {
      requireForCells(firstCellSlot, EnsembleColumn.FIRST_CELL);
      requireForCells(cellSizeSlot, EnsembleColumn.CELL_SIZE);
    }
  }

  private void requireForCells(int slot, String name) {
    if (slot >= 0 && Double.isNaN(row[slot]) && problems.isEmpty()) {
      problems.add(line(), name, "nothing", "a number wherever there are cells", "");
    }
  }

  /** Ends the reading before the end of the file, after the reason was added to the problems. */
  static final class Stopped extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }
}
