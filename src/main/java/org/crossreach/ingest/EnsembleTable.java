package org.crossreach.ingest;

import java.util.List;
import org.crossreach.survey.Ensembles;

/**
 * The rows of an ensemble CSV as they are read, by whichever way: {@link PlainRows} fills in a row
 * straight from the bytes, {@link EnsembleFields} field by field from the parser.
 *
 * <p>Rows are kept as long as nothing is wrong; from the first problem on they are only checked.
 */
final class EnsembleTable {

  /** Most numbers that are kept of one file (2 GiB). */
  static final long MOST_NUMBERS = 1L << 28;

  private final FileProblems problems;
  private final Rfc3339 time = new Rfc3339();
  private EnsembleHeader header;
  private EnsembleSequence sequence;
  private EnsembleRows rows;
  private int timeField;
  private boolean anyRow;

  /** The numbers of the row that is being read, by field; empty until the header is known. */
  private double[] row = new double[0];

  private double[] limits = new double[0];

  /**
   * Starts an empty table.
   *
   * @param problems receives what is wrong
   */
  EnsembleTable(FileProblems problems) {
    this.problems = problems;
  }

  /**
   * Takes the header row; the table is ready for rows when it can be {@linkplain
   * EnsembleHeader#isUsable() used}.
   *
   * @param names its fields
   * @param line its line, from 1
   */
  void takeHeader(List<String> names, long line) {
    header = new EnsembleHeader(names, line, problems);
    if (!header.isUsable()) {
      return;
    }
    sequence = new EnsembleSequence(header, problems);
    rows = new EnsembleRows(header);
    timeField = header.fieldOf(EnsembleColumn.TIME);
    limits = new double[2 * header.width()];
    for (int field = 0; field < header.width(); field++) {
      EnsembleColumn column = header.column(field);
      if (column == null) {
        limits[2 * field] = Double.NEGATIVE_INFINITY;
        limits[2 * field + 1] = Double.POSITIVE_INFINITY;
      } else {
        boolean number = column.role() != EnsembleColumn.Role.TIME;
        limits[2 * field] = number ? column.range().lowest() : Double.NaN;
        limits[2 * field + 1] = number ? column.range().highest() : Double.NaN;
      }
    }
    row = new double[header.width()];
  }

  /** The header, {@code null} when there was none. */
  EnsembleHeader header() {
    return header;
  }

  /** Whether any row followed the header, usable or not. */
  boolean hasRows() {
    return anyRow;
  }

  /** Whether another row can be kept. */
  boolean hasRoom() {
    return (long) (rows.size() + 1) * rows.width() <= MOST_NUMBERS;
  }

  /** Room for the numbers of a row by field; in the field of the time 0 when it was read. */
  double[] row() {
    return row;
  }

  /**
   * For each field the lowest and the highest number that it can have, side by side: any number in
   * a column that is not known, NaN for the time.
   */
  double[] limits() {
    return limits;
  }

  /** The field of the time. */
  int timeField() {
    return timeField;
  }

  /** Room for the time of a row. */
  Rfc3339 time() {
    return time;
  }

  /** Notes that a row is there, though it cannot be taken. */
  void noteRow() {
    anyRow = true;
  }

  /**
   * Takes the row that stands in {@link #row()} and {@link #time()}; there must be {@linkplain
   * #hasRoom() room}.
   *
   * @param line its line, from 1
   */
  void takeRow(long line) {
    anyRow = true;
    sequence.check(line, row, time);
    if (problems.isEmpty()) {
      rows.add(sequence.number(row), sequence.elapsedS(time), sequence.cells(row), row);
    }
  }

  /** The ensembles; to be called once, when there are rows and no problem. */
  Ensembles build() {
    return rows.build(sequence.start());
  }
}
