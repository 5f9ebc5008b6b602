package org.crossreach.survey;

import java.time.OffsetDateTime;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/**
 * The ensembles of one file as primitive columns.
 *
 * <p>SI units and degrees, NaN for a missing value. A quantity that the record does not have has no
 * column. Immutable; safe to share between threads.
 */
public final class Ensembles {

  private final Frame frame;
  private final OffsetDateTime start;
  private final long[] number;
  private final double[] elapsedS;
  private final int[] cells;
  private final int maxCells;
  private final Map<EnsembleQuantity, double[]> columns;
  private final Map<CellQuantity, CellGrid> grids;

  /**
   * Takes over the columns; the caller must not change the arrays afterwards.
   *
   * @param frame axes of the velocities
   * @param start time of the first ensemble
   * @param number ensemble numbers, strictly increasing
   * @param elapsedS time of each ensemble after the first (s), strictly increasing from 0
   * @param cells number of depth cells in each ensemble
   * @param columns quantities recorded once per ensemble
   * @param grids quantities recorded once per cell
   * @throws IllegalArgumentException when lengths differ or a required quantity is missing
   */
  public Ensembles(
      Frame frame,
      OffsetDateTime start,
      long[] number,
      double[] elapsedS,
      int[] cells,
      Map<EnsembleQuantity, double[]> columns,
      Map<CellQuantity, CellGrid> grids) {
    this.frame = frame;
    this.start = start;
    this.number = number;
    this.elapsedS = elapsedS;
    this.cells = cells;
    this.columns = new EnumMap<>(columns);
    this.grids = new EnumMap<>(grids);
    requireLength("elapsedS", elapsedS.length);
    requireLength("cells", cells.length);
    columns.forEach((quantity, values) -> requireLength(quantity.name(), values.length));
    grids.forEach((quantity, grid) -> requireLength(quantity.name(), grid.rows()));
    grid(CellQuantity.WATER_2);
    this.maxCells = grid(CellQuantity.WATER_1).cells();
  }

  private void requireLength(String name, int length) {
    if (length != number.length) {
      throw new IllegalArgumentException(
          name + " has " + length + " rows, expected " + number.length);
    }
  }

  /** Number of ensembles. */
  public int size() {
    return number.length;
  }

  /** Largest number of depth cells that an ensemble can have here. */
  public int maxCells() {
    return maxCells;
  }

  /** Axes of the velocities. */
  public Frame frame() {
    return frame;
  }

  /** Time of the first ensemble. */
  public OffsetDateTime start() {
    return start;
  }

  /** Recorded number of an ensemble. */
  public long number(int ensemble) {
    return number[ensemble];
  }

  /** Time of an ensemble after the first one (s): the end of its averaging interval. */
  public double elapsedS(int ensemble) {
    return elapsedS[ensemble];
  }

  /** Number of depth cells of an ensemble. */
  public int cells(int ensemble) {
    return cells[ensemble];
  }

  /** Whether the record has a quantity. */
  public boolean has(EnsembleQuantity quantity) {
    return columns.containsKey(quantity);
  }

  /** Whether the record has a quantity. */
  public boolean has(CellQuantity quantity) {
    return grids.containsKey(quantity);
  }

  /**
   * The value of a quantity in one ensemble.
   *
   * @return the value in the quantity's unit, NaN when missing or when the record has no such
   *     column
   */
  public double value(EnsembleQuantity quantity, int ensemble) {
    double[] column = columns.get(quantity);
    return column == null ? Double.NaN : column[ensemble];
  }

  /**
   * The grid of a quantity.
   *
   * @throws IllegalArgumentException when the record has no such quantity; see {@link #find}
   */
  public CellGrid grid(CellQuantity quantity) {
    return find(quantity)
        .orElseThrow(() -> new IllegalArgumentException("the record has no " + quantity));
  }

  /** The grid of a quantity, empty when the record has none. */
  public Optional<CellGrid> find(CellQuantity quantity) {
    return Optional.ofNullable(grids.get(quantity));
  }
}
