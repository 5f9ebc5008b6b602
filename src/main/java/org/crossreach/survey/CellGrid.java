package org.crossreach.survey;

import java.util.Arrays;

/**
 * One quantity for every cell of every ensemble: rows are ensembles, columns are cells, NaN where
 * nothing was recorded.
 *
 * <p>Rows lie in blocks of {@value #ROWS_PER_BLOCK} so that a grid can grow while it is read
 * without being copied. Immutable once built; safe to share between threads.
 */
public final class CellGrid {

  private static final int ROWS_PER_BLOCK = 1024;

  private final double[][] blocks;
  private final int rows;
  private final int cells;

  private CellGrid(double[][] blocks, int rows, int cells) {
    this.blocks = blocks;
    this.rows = rows;
    this.cells = cells;
  }

  /** Number of ensembles. */
  public int rows() {
    return rows;
  }

  /** Number of cells in every row. */
  public int cells() {
    return cells;
  }

  /**
   * The value of one cell, in the unit of the grid's quantity.
   *
   * @param row ensemble, from 0
   * @param cell cell, from 0 at the top
   * @return the value, NaN when missing
   */
  public double get(int row, int cell) {
    return blocks[row / ROWS_PER_BLOCK][row % ROWS_PER_BLOCK * cells + cell];
  }

  /**
   * Copies one row.
   *
   * @param row ensemble, from 0
   * @param target receives {@link #cells()} values from index 0
   */
  public void copyRow(int row, double[] target) {
    System.arraycopy(blocks[row / ROWS_PER_BLOCK], row % ROWS_PER_BLOCK * cells, target, 0, cells);
  }

  /** Collects a grid row by row. */
  public static final class Builder {
    private double[][] blocks = new double[4][];
    private int rows;
    private final int cells;

    /**
     * Starts an empty grid.
     *
     * @param cells number of cells in every row, at least 1
     */
    public Builder(int cells) {
      if (cells < 1) {
        throw new IllegalArgumentException("cells must be at least 1, not " + cells);
      }
      this.cells = cells;
    }

    /**
     * Appends a row.
     *
     * @param values at least as many values as the grid has cells; they are copied
     */
    public void addRow(double[] values) {
      addRow(values, 0);
    }

    /**
     * Appends a row.
     *
     * @param values holds as many values as the grid has cells, from {@code offset} on; they are
     *     copied
     * @param offset index of the first cell's value
     */
    public void addRow(double[] values, int offset) {
      int block = rows / ROWS_PER_BLOCK;
      if (block == blocks.length) {
        blocks = Arrays.copyOf(blocks, 2 * block);
      }
      if (blocks[block] == null) {
        blocks[block] = new double[ROWS_PER_BLOCK * cells];
      }
      System.arraycopy(values, offset, blocks[block], rows % ROWS_PER_BLOCK * cells, cells);
      rows++;
    }

    /** The grid of the rows so far; the builder is not to be used afterwards. */
    public CellGrid build() {
      CellGrid grid = new CellGrid(blocks, rows, cells);
      blocks = null;
      return grid;
    }
  }
}
