package org.crossreach.ingest;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.crossreach.survey.CellGrid;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Collects the ensembles of one file as primitive columns.
 *
 * <p>A row's numbers are handed over by field, in the order of the file.
 */
final class EnsembleRows {

  private static final int FIRST_ROWS = 1024;

  private final EnsembleHeader header;
  private final List<EnsembleQuantity> quantities = new ArrayList<>();
  private final List<CellQuantity> cellQuantities = new ArrayList<>();

  /** For each quantity of the ensemble its field. */
  private final int[] quantityFields;

  /** For each quantity of cells the fields of its cells. */
  private final int[][] cellFields;

  /** For each quantity of cells whether its fields lie side by side in the order of the cells. */
  private final boolean[] inOrder;

  private final double[][] columns;
  private final CellGrid.Builder[] grids;
  private final double[] gathered;
  private long[] number = new long[FIRST_ROWS];
  private double[] elapsedS = new double[FIRST_ROWS];
  private int[] cells = new int[FIRST_ROWS];
  private int rows;

  EnsembleRows(EnsembleHeader header) {
    this.header = header;
    int maxCells = header.maxCells();
    int[] fields = new int[EnsembleQuantity.values().length];
    int[][] fieldsByCell = new int[CellQuantity.values().length][];
    for (int field = 0; field < header.width(); field++) {
      EnsembleColumn column = header.column(field);
      if (column != null && column.role() == EnsembleColumn.Role.ENSEMBLE) {
        fields[quantities.size()] = field;
        quantities.add(column.ensembleQuantity());
      } else if (column != null && column.role() == EnsembleColumn.Role.CELL) {
        int index = cellQuantities.indexOf(column.cellQuantity());
        if (index < 0) {
          index = cellQuantities.size();
          cellQuantities.add(column.cellQuantity());
          fieldsByCell[index] = new int[maxCells];
        }
        fieldsByCell[index][column.cell() - 1] = field;
      }
    }
    quantityFields = Arrays.copyOf(fields, quantities.size());
    cellFields = Arrays.copyOf(fieldsByCell, cellQuantities.size());
    inOrder = new boolean[cellFields.length];
    for (int i = 0; i < cellFields.length; i++) {
      inOrder[i] = isInOrder(cellFields[i]);
    }
    columns = new double[quantities.size()][FIRST_ROWS];
    gathered = new double[maxCells];
    grids = new CellGrid.Builder[cellQuantities.size()];
    for (int i = 0; i < grids.length; i++) {
      grids[i] = new CellGrid.Builder(maxCells);
    }
  }

  private static boolean isInOrder(int[] fields) {
    for (int i = 1; i < fields.length; i++) {
      if (fields[i] != fields[0] + i) {
        return false;
      }
    }
    return true;
  }

  /** Number of numbers that are kept of a row. */
  int width() {
    return columns.length + grids.length * header.maxCells();
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
   * @param cellCount its number of cells; what the row holds beyond them is dropped
   * @param row its numbers by field; those of cells beyond the number of cells may be changed
   */
  void add(long ensemble, double secondsAfterFirst, int cellCount, double[] row) {
    if (rows == number.length) {
      grow();
    }
    number[rows] = ensemble;
    elapsedS[rows] = secondsAfterFirst;
    cells[rows] = cellCount;
    for (int i = 0; i < columns.length; i++) {
      columns[i][rows] = row[quantityFields[i]];
    }
    for (int i = 0; i < grids.length; i++) {
      int[] fields = cellFields[i];
      if (inOrder[i]) {
        Arrays.fill(row, fields[0] + cellCount, fields[0] + fields.length, Double.NaN);
        grids[i].addRow(row, fields[0]);
      } else {
        Arrays.fill(gathered, Double.NaN);
        for (int cell = 0; cell < cellCount; cell++) {
          gathered[cell] = row[fields[cell]];
        }
        grids[i].addRow(gathered);
      }
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
      ensembleColumns.put(quantities.get(i), Arrays.copyOf(columns[i], rows));
      columns[i] = null;
    }
    Map<CellQuantity, CellGrid> cellGrids = new EnumMap<>(CellQuantity.class);
    for (int i = 0; i < grids.length; i++) {
      cellGrids.put(cellQuantities.get(i), grids[i].build());
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
