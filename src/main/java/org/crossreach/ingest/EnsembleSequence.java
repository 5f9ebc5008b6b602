package org.crossreach.ingest;

import java.time.OffsetDateTime;

/**
 * Checks what the rows of a table say about each other and about their cells: numbers and times
 * that increase, cells that have columns and places.
 *
 * <p>Each row is compared with the one before it, so that one wrong row is told once or twice and
 * not again in every row that follows.
 */
final class EnsembleSequence {

  /** Longest time from the first ensemble to the last (s): 31 days. */
  static final long LONGEST_S = 31L * 86_400;

  /** Stands in a row for a field whose fault was told already. */
  static final double FAULTY = Double.POSITIVE_INFINITY;

  private final FileProblems problems;
  private final int maxCells;
  private final int numberField;
  private final int timeField;
  private final int cellsField;
  private final int firstCellField;
  private final int cellSizeField;

  private double previousNumber = Double.NaN;
  private OffsetDateTime start;
  private long firstSecond;
  private int firstNano;
  private long previousSecond = Long.MIN_VALUE;
  private int previousNano;

  EnsembleSequence(EnsembleHeader header, FileProblems problems) {
    this.problems = problems;
    maxCells = header.maxCells();
    numberField = header.fieldOf(EnsembleColumn.NUMBER);
    timeField = header.fieldOf(EnsembleColumn.TIME);
    cellsField = header.fieldOf(EnsembleColumn.CELLS);
    firstCellField = header.fieldOf(EnsembleColumn.FIRST_CELL);
    cellSizeField = header.fieldOf(EnsembleColumn.CELL_SIZE);
  }

  /** Time of the first ensemble. */
  OffsetDateTime start() {
    return start;
  }

  /** Time of an ensemble after the first one (s), to the nanosecond. */
  double elapsedS(Rfc3339 time) {
    long nanos = (time.epochSecond() - firstSecond) * 1_000_000_000L + time.nano() - firstNano;
    return nanos / 1e9;
  }

  /** The number of the ensemble in a row without problems. */
  long number(double[] row) {
    return (long) row[numberField];
  }

  /** The number of cells in a row without problems. */
  int cells(double[] row) {
    return (int) row[cellsField];
  }

  /**
   * Checks a row.
   *
   * @param line its line
   * @param row its numbers by field; in the field of the time 0 when the time was read
   * @param time its time, if it was read
   */
  void check(long line, double[] row, Rfc3339 time) {
    if (numberField >= 0) {
      checkNumber(line, row[numberField]);
    }
    if (timeField >= 0) {
      checkTime(line, row[timeField], time);
    }
    if (cellsField >= 0) {
      checkCells(line, row);
    }
  }

  private void checkNumber(long line, double number) {
    if (isWhole(line, EnsembleColumn.NUMBER, number)) {
      if (number <= previousNumber) {
        problems.add(
            line,
            EnsembleColumn.NUMBER,
            Quoted.of(Quoted.number(number)) + " after " + Quoted.of(Quoted.number(previousNumber)),
            "a number above that of the row before",
            "sort the rows, or remove repeated ones");
      }
      previousNumber = number;
    }
  }

  /** Whether a number is there and whole; tells when it is not. */
  private boolean isWhole(long line, String name, double number) {
    if (number == FAULTY) {
      return false;
    }
    if (Double.isNaN(number)) {
      problems.add(line, name, "nothing", "a value in every row", "complete the row");
      return false;
    }
    if (number != Math.rint(number)) {
      problems.add(line, name, Quoted.of(Quoted.number(number)), "a whole number", "");
      return false;
    }
    return true;
  }

  private void checkTime(long line, double read, Rfc3339 time) {
    if (!isWhole(line, EnsembleColumn.TIME, read)) {
      return;
    }
    long second = time.epochSecond();
    int nano = time.nano();
    if (start == null) {
      start = time.toOffsetDateTime();
      firstSecond = second;
      firstNano = nano;
    }
    long distance = Math.abs(second - firstSecond);
    if (second < previousSecond || second == previousSecond && nano <= previousNano) {
      problems.add(
          line,
          EnsembleColumn.TIME,
          "a time that is not after that of the row before",
          "increasing times",
          "sort the rows, or correct the clock");
    } else if (distance > LONGEST_S) {
      problems.add(
          line,
          EnsembleColumn.TIME,
          "a time " + distance / 86_400 + " days from the first one",
          "all ensembles within " + LONGEST_S / 86_400 + " days",
          "correct the date");
    }
    previousSecond = second;
    previousNano = nano;
  }

  private void checkCells(long line, double[] row) {
    double cells = row[cellsField];
    if (!isWhole(line, EnsembleColumn.CELLS, cells)) {
      return;
    }
    if (cells > maxCells) {
      problems.add(
          line,
          EnsembleColumn.CELLS,
          Quoted.of(Quoted.number(cells)),
          "at most " + maxCells + ", the number of cells that have columns",
          "add the missing columns, or correct the number");
    } else if (cells > 0) {
      requirePlace(line, row, firstCellField, EnsembleColumn.FIRST_CELL);
      requirePlace(line, row, cellSizeField, EnsembleColumn.CELL_SIZE);
    }
  }

  private void requirePlace(long line, double[] row, int field, String name) {
    if (field >= 0 && Double.isNaN(row[field])) {
      problems.add(line, name, "nothing", "a number wherever there are cells", "");
    }
  }
}
