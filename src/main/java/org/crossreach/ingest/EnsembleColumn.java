package org.crossreach.ingest;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Frame;

/**
 * What a column of an ensemble CSV means, found by its name.
 *
 * @param name name of the column, for example {@code east_mps_7}
 * @param role where its values go
 * @param ensembleQuantity the quantity, {@code null} unless the role is {@link Role#ENSEMBLE}
 * @param cellQuantity the quantity, {@code null} unless the role is {@link Role#CELL}
 * @param cell number of the cell from 1, 0 unless the role is {@link Role#CELL}
 * @param frames the frames in whose records the column may stand
 */
record EnsembleColumn(
    String name,
    Role role,
    EnsembleQuantity ensembleQuantity,
    CellQuantity cellQuantity,
    int cell,
    Set<Frame> frames) {

  /** Most cells that an ensemble can have. */
  static final int MOST_CELLS = 1000;

  static final String NUMBER = "ensemble";
  static final String TIME = "time";
  static final String CELLS = "cells";
  static final String FIRST_CELL = "first_cell_m";
  static final String CELL_SIZE = "cell_size_m";
  static final String HEADING = "heading_deg";

  /** Where the values of a column go. */
  enum Role {
    /** The ensemble's number. */
    NUMBER,
    /** The ensemble's time. */
    TIME,
    /** The ensemble's number of cells. */
    CELLS,
    /** A quantity of the ensemble. */
    ENSEMBLE,
    /** A quantity of one cell. */
    CELL
  }

  private static final Set<Frame> ANY = Collections.unmodifiableSet(EnumSet.allOf(Frame.class));
  private static final Map<String, EnsembleColumn> FIXED = new LinkedHashMap<>();
  private static final Map<String, EnsembleColumn> PER_CELL = new LinkedHashMap<>();

  static {
    fixed(NUMBER, Role.NUMBER);
    fixed(TIME, Role.TIME);
    fixed(CELLS, Role.CELLS);
    fixed(FIRST_CELL, EnsembleQuantity.FIRST_CELL_M);
    fixed(CELL_SIZE, EnsembleQuantity.CELL_SIZE_M);
    for (Frame frame : Frame.values()) {
      List<String> axes = axes(frame);
      for (int i = 0; i < axes.size(); i++) {
        velocity(axes.get(i), i, frame);
      }
    }
    fixed("gnss_lat_deg", EnsembleQuantity.GNSS_LATITUDE_DEG);
    fixed("gnss_lon_deg", EnsembleQuantity.GNSS_LONGITUDE_DEG);
    fixed("gnss_alt_m", EnsembleQuantity.GNSS_ALTITUDE_M);
    fixed("gnss_quality", EnsembleQuantity.GNSS_QUALITY);
    fixed("gnss_hdop", EnsembleQuantity.GNSS_HDOP);
    fixed("gnss_satellites", EnsembleQuantity.GNSS_SATELLITES);
    fixed("gnss_east_mps", EnsembleQuantity.GNSS_EAST_MPS);
    fixed("gnss_north_mps", EnsembleQuantity.GNSS_NORTH_MPS);
    fixed(HEADING, EnsembleQuantity.HEADING_DEG);
    fixed("pitch_deg", EnsembleQuantity.PITCH_DEG);
    fixed("roll_deg", EnsembleQuantity.ROLL_DEG);
    fixed("temperature_degc", EnsembleQuantity.TEMPERATURE_DEGC);
    fixed("depth_beam1_m", EnsembleQuantity.DEPTH_BEAM_1_M);
    fixed("depth_beam2_m", EnsembleQuantity.DEPTH_BEAM_2_M);
    fixed("depth_beam3_m", EnsembleQuantity.DEPTH_BEAM_3_M);
    fixed("depth_beam4_m", EnsembleQuantity.DEPTH_BEAM_4_M);
    fixed("depth_vertical_m", EnsembleQuantity.DEPTH_VERTICAL_M);
    perCell("correlation", CellQuantity.CORRELATION, ANY);
    perCell("intensity_db", CellQuantity.INTENSITY_DB, ANY);
    perCell("good_pct", CellQuantity.GOOD_PCT, ANY);
  }

  /** The names of a frame's axes, as they stand in column names. */
  private static List<String> axes(Frame frame) {
    return switch (frame) {
      case EARTH -> List.of("east", "north", "up", "error");
      case SHIP -> List.of("starboard", "forward", "up", "error");
      case INSTRUMENT -> List.of("x", "y", "z", "error");
      case BEAM -> List.of("beam1", "beam2", "beam3", "beam4");
    };
  }

  /** Number of components without which velocities of a frame cannot be turned. */
  static int neededComponents(Frame frame) {
    return switch (frame) {
      case EARTH, SHIP -> 2;
      case INSTRUMENT -> 3;
      case BEAM -> 4;
    };
  }

  /** Name of the column of a component of the water's velocity, component and cell from 1. */
  static String waterName(Frame frame, int component, int cell) {
    return axes(frame).get(component - 1) + "_mps_" + cell;
  }

  /** Name of the column of a component of bottom tracking, component from 1. */
  static String bottomName(Frame frame, int component) {
    return "bt_" + axes(frame).get(component - 1) + "_mps";
  }

  /** Name of the column of a quantity in the records of a frame. */
  static String nameOf(EnsembleQuantity quantity, Frame frame) {
    int component = quantity.ordinal() - EnsembleQuantity.BOTTOM_1.ordinal();
    if (component < 4) {
      return bottomName(frame, component + 1);
    }
    return FIXED.values().stream()
        .filter(column -> column.ensembleQuantity == quantity)
        .map(EnsembleColumn::name)
        .findFirst()
        .orElseThrow();
  }

  /** Name of the columns of a quantity in the records of a frame, without the cell's number. */
  static String nameOf(CellQuantity quantity, Frame frame) {
    int component = quantity.ordinal() - CellQuantity.WATER_1.ordinal();
    if (component < 4) {
      return axes(frame).get(component) + "_mps";
    }
    return PER_CELL.entrySet().stream()
        .filter(entry -> entry.getValue().cellQuantity == quantity)
        .map(Map.Entry::getKey)
        .findFirst()
        .orElseThrow();
  }

  private static void fixed(String name, Role role) {
    FIXED.put(name, new EnsembleColumn(name, role, null, null, 0, ANY));
  }

  private static void fixed(String name, EnsembleQuantity quantity) {
    FIXED.put(name, new EnsembleColumn(name, Role.ENSEMBLE, quantity, null, 0, ANY));
  }

  private static void perCell(String name, CellQuantity quantity, Set<Frame> frames) {
    PER_CELL.put(name, new EnsembleColumn(name, Role.CELL, null, quantity, 0, frames));
  }

  /** Registers an axis for water and bottom track; an axis of several frames is registered once. */
  private static void velocity(String axis, int component, Frame frame) {
    EnsembleQuantity bottom =
        EnsembleQuantity.values()[EnsembleQuantity.BOTTOM_1.ordinal() + component];
    CellQuantity water = CellQuantity.values()[CellQuantity.WATER_1.ordinal() + component];
    EnsembleColumn known = PER_CELL.get(axis + "_mps");
    Set<Frame> frames = known == null ? EnumSet.of(frame) : EnumSet.copyOf(known.frames);
    frames.add(frame);
    perCell(axis + "_mps", water, frames);
    String name = "bt_" + axis + "_mps";
    FIXED.put(name, new EnsembleColumn(name, Role.ENSEMBLE, bottom, null, 0, frames));
  }

  /** Finds the column that a name stands for, empty when there is none. */
  static Optional<EnsembleColumn> find(String name) {
    EnsembleColumn fixed = FIXED.get(name);
    if (fixed != null) {
      return Optional.of(fixed);
    }
    int cell = cellOf(name);
    if (cell < 1) {
      return Optional.empty();
    }
    EnsembleColumn quantity = PER_CELL.get(name.substring(0, name.lastIndexOf('_')));
    return quantity == null
        ? Optional.empty()
        : Optional.of(
            new EnsembleColumn(
                name, Role.CELL, null, quantity.cellQuantity, cell, quantity.frames));
  }

  /** The valid name that is nearest to a name which is not valid. */
  static Optional<String> nearest(String name) {
    List<String> names = new ArrayList<>(FIXED.keySet());
    int cell = cellOf(name);
    for (String quantity : PER_CELL.keySet()) {
      names.add(quantity + "_" + Math.max(1, cell));
    }
    return NearestName.find(name, names);
  }

  /** The number at the end of a name, from 1 to {@link #MOST_CELLS}; 0 when there is none. */
  private static int cellOf(String name) {
    int from = name.lastIndexOf('_') + 1;
    if (from < 2 || from == name.length() || name.length() - from > 4 || name.charAt(from) == '0') {
      return 0;
    }
    int cell = 0;
    for (int i = from; i < name.length(); i++) {
      char digit = name.charAt(i);
      if (digit < '0' || digit > '9') {
        return 0;
      }
      cell = 10 * cell + digit - '0';
    }
    return cell > MOST_CELLS ? 0 : cell;
  }

  /** The range of the column's values. */
  PhysicalRange range() {
    return switch (role) {
      case NUMBER, TIME -> PhysicalRange.NUMBER;
      case CELLS -> PhysicalRange.CELLS;
      case ENSEMBLE -> PhysicalRange.of(ensembleQuantity);
      case CELL ->
          switch (cellQuantity) {
            case WATER_1, WATER_2, WATER_3, WATER_4 -> PhysicalRange.VELOCITY;
            case CORRELATION -> PhysicalRange.CORRELATION;
            case INTENSITY_DB -> PhysicalRange.INTENSITY;
            case GOOD_PCT -> PhysicalRange.PERCENTAGE;
          };
    };
  }
}
