package org.crossreach.ingest;

import java.time.OffsetDateTime;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Collects the ensembles of one file as primitive columns.
 *
 * <p>A row's numbers are handed over in one array: first the quantities of the ensemble, then all
 * cells of each quantity of cells, in the order of the enumerations, of those that the header has.
 */
final class EnsembleRows {

  private static final int FIRST_ROWS = 1024;

  private final EnsembleHeader header;
  private final EnsembleQuantity[] quantities;
  private final CellQuantity[] cellQuantities;
  private final double[][] columns;
  private final CellGrid.Builder[] grids;
  private long[] number = new long[FIRST_ROWS];
  private double[] elapsedS = new double[FIRST_ROWS];
  private int[] cells = new int[FIRST_ROWS];
  private int rows;

  EnsembleRows(EnsembleHeader header) {
    this.header = header;
    quantities =
        Arrays.stream(EnsembleQuantity.values())
            .filter(header::has)
            .toArray(EnsembleQuantity[]::new);
    cellQuantities =
        Arrays.stream(CellQuantity.values()).filter(header::has).toArray(CellQuantity[]::new);
    columns = new double[quantities.length][FIRST_ROWS];
    grids = new CellGrid.Builder[cellQuantities.length];
    for (int i = 0; i < grids.length; i++) {
      grids[i] = new CellGrid.Builder(header.maxCells());
    }
  }

  /** Number of numbers in a row. */
  int width() {
    return quantities.length + cellQuantities.length * header.maxCells();
  }

  /** Index of a column's value in a row; the column is of an ensemble's or a cell's quantity. */
  int slot(EnsembleColumn column) {
    if (column.role() == EnsembleColumn.Role.ENSEMBLE) {
      return slot(column.ensembleQuantity());
    }
    return quantities.length
        + Arrays.asList(cellQuantities).indexOf(column.cellQuantity()) * header.maxCells()
        + column.cell()
        - 1;
  }

  /** Index of a quantity's value in a row, -1 when there is none. */
  int slot(EnsembleQuantity quantity) {
    return Arrays.asList(quantities).indexOf(quantity);
  }

  /** Number of rows so far. */
  int size() {
    return rows;
  }

  /**
   * Appends an ensemble.
   *
   * @param ensemble its number
   * @param secondsAfterFirst its time after the first ensemble (s)
   * @param cellCount its number of cells; what the row holds beyond them is cleared
   * @param row its numbers
   */
  void add(long ensemble, double secondsAfterFirst, int cellCount, double[] row) {
    if (rows == number.length) {
      grow();
    }
    number[rows] = ensemble;
    elapsedS[rows] = secondsAfterFirst;
    cells[rows] = cellCount;
    for (int i = 0; i < columns.length; i++) {
      columns[i][rows] = row[i];
    }
    int maxCells = header.maxCells();
    for (int i = 0; i < grids.length; i++) {
      int from = columns.length + i * maxCells;
      Arrays.fill(row, from + cellCount, from + maxCells, Double.NaN);
      grids[i].addRow(row, from);
    }
    rows++;
  }

  private void grow() {
    int capacity = 2 * rows;
    number = Arrays.copyOf(number, capacity);
    elapsedS = Arrays.copyOf(elapsedS, capacity);
    cells = Arrays.copyOf(cells, capacity);
    for (int i = 0; i < columns.length; i++) {
      columns[i] = Arrays.copyOf(columns[i], capacity);
    }
  }

  /**
   * The ensembles so far; nothing may be added afterwards.
   *
   * @param start time of the first ensemble
   */
  Ensembles build(OffsetDateTime start) {
    Map<EnsembleQuantity, double[]> ensembleColumns = new EnumMap<>(EnsembleQuantity.class);
    for (int i = 0; i < columns.length; i++) {
      ensembleColumns.put(quantities[i], Arrays.copyOf(columns[i], rows));
      columns[i] = null;
    }
    Map<CellQuantity, CellGrid> cellGrids = new EnumMap<>(CellQuantity.class);
    for (int i = 0; i < grids.length; i++) {
      cellGrids.put(cellQuantities[i], grids[i].build());
    }
    return new Ensembles(
        header.frame(),
        start,
        Arrays.copyOf(number, rows),
        Arrays.copyOf(elapsedS, rows),
        Arrays.copyOf(cells, rows),
        ensembleColumns,
        cellGrids);
  }
}
