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
 * Collects the ensembles of one file and turns them into primitive columns.
 *
 * <p>A row's numbers are handed over by field, in the order of the file. While the file is read
 * everything lies in blocks that never move, since the number of rows is not known before its end.
 */
final class EnsembleRows {

  /** Places in {@link #perEnsemble}, before the quantities. */
  private static final int NUMBER = 0;

  private static final int ELAPSED_S = 1;
  private static final int CELLS = 2;
  private static final int FIRST_QUANTITY = 3;

  private final EnsembleHeader header;
  private final List<EnsembleQuantity> quantities = new ArrayList<>();
  private final List<CellQuantity> cellQuantities = new ArrayList<>();

  /** For each quantity of the ensemble its field. */
  private final int[] quantityFields;

  /** For each quantity of cells the fields of its cells. */
  private final int[][] cellFields;

  /** For each quantity of cells whether its fields lie side by side in the order of the cells. */
  private final boolean[] inOrder;

  private final CellGrid.Builder perEnsemble;
  private final CellGrid.Builder[] perCell;
  private final double[] gathered;
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
    perCell = new CellGrid.Builder[cellFields.length];
    for (int i = 0; i < cellFields.length; i++) {
      inOrder[i] = isInOrder(cellFields[i]);
      perCell[i] = new CellGrid.Builder(maxCells);
    }
    perEnsemble = new CellGrid.Builder(FIRST_QUANTITY + quantities.size());
    gathered = new double[Math.max(maxCells, FIRST_QUANTITY + quantities.size())];
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
    return FIRST_QUANTITY + quantities.size() + perCell.length * header.maxCells();
  }

  /** Number of rows so far. */
  int size() {
    return rows;
  }

  /**
   * Appends an ensemble.
   *
   * @param number its number
   * @param elapsedS its time after the first ensemble (s)
   * @param cellCount its number of cells; what the row holds beyond them is dropped
   * @param row its numbers by field; those of cells beyond the number of cells may be changed
   */
  void add(long number, double elapsedS, int cellCount, double[] row) {
    gathered[NUMBER] = number;
    gathered[ELAPSED_S] = elapsedS;
    gathered[CELLS] = cellCount;
    for (int i = 0; i < quantityFields.length; i++) {
      gathered[FIRST_QUANTITY + i] = row[quantityFields[i]];
    }
    perEnsemble.addRow(gathered);
    for (int i = 0; i < perCell.length; i++) {
      int[] fields = cellFields[i];
      if (inOrder[i]) {
        Arrays.fill(row, fields[0] + cellCount, fields[0] + fields.length, Double.NaN);
        perCell[i].addRow(row, fields[0]);
      } else {
        Arrays.fill(gathered, Double.NaN);
        for (int cell = 0; cell < cellCount; cell++) {
          gathered[cell] = row[fields[cell]];
        }
        perCell[i].addRow(gathered);
      }
    }
    rows++;
  }

  /**
   * The ensembles so far; nothing may be added afterwards.
   *
   * @param start time of the first ensemble
   */
  Ensembles build(OffsetDateTime start) {
    CellGrid ensembles = perEnsemble.build();
    long[] number = new long[rows];
    int[] cells = new int[rows];
    for (int row = 0; row < rows; row++) {
      number[row] = (long) ensembles.get(row, NUMBER);
      cells[row] = (int) ensembles.get(row, CELLS);
    }
    Map<EnsembleQuantity, double[]> columns = new EnumMap<>(EnsembleQuantity.class);
    for (int i = 0; i < quantities.size(); i++) {
      columns.put(quantities.get(i), column(ensembles, FIRST_QUANTITY + i));
    }
    Map<CellQuantity, CellGrid> grids = new EnumMap<>(CellQuantity.class);
    for (int i = 0; i < perCell.length; i++) {
      grids.put(cellQuantities.get(i), perCell[i].build());
    }
    return new Ensembles(
        header.frame(), start, number, column(ensembles, ELAPSED_S), cells, columns, grids);
  }

  private static double[] column(CellGrid grid, int place) {
    double[] column = new double[grid.rows()];
    for (int row = 0; row < column.length; row++) {
      column[row] = grid.get(row, place);
    }
    return column;
  }
}
