package org.crossreach.ingest;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.Frame;
import org.crossreach.survey.Note;

/**
 * The header row of an ensemble CSV: which column stands where, in which frame the velocities are,
 * and how many cells there are.
 *
 * <p>Names may have spaces around them. What is wrong goes to the file's problems; the header can
 * still be used then, to check the rows.
 */
final class EnsembleHeader {

  private static final int NAMES_IN_NOTE = 10;

  private final List<String> names;
  private final long line;
  private final FileProblems problems;
  private final List<EnsembleColumn> columns = new ArrayList<>();
  private final List<String> unknown = new ArrayList<>();
  private final Map<String, Integer> places = new LinkedHashMap<>();
  private final Map<CellQuantity, Integer> cellsOf = new EnumMap<>(CellQuantity.class);
  private final Frame frame;
  private final int maxCells;

  /**
   * Reads a header row.
   *
   * @param names the fields of the row
   * @param line line of the row, from 1
   * @param problems receives what is wrong
   */
  EnsembleHeader(List<String> names, long line, FileProblems problems) {
    this.names = names;
    this.line = line;
    this.problems = problems;
    for (int i = 0; i < names.size(); i++) {
      recognise(names.get(i).strip(), i + 1);
    }
    frame = findFrame();
    maxCells = cellsOf.isEmpty() ? 0 : Collections.max(cellsOf.values());
    if (places.isEmpty()) {
      refuse(names.isEmpty() ? "" : names.get(0));
    } else {
      checkFrame();
      checkRequired();
      checkCells();
    }
  }

  /** Number of columns, known or not. */
  int width() {
    return columns.size();
  }

  /** The column at a place from 0, {@code null} when it is not known or repeated. */
  EnsembleColumn column(int place) {
    return columns.get(place);
  }

  /** The place from 0 of the column with a name, -1 when there is none. */
  int fieldOf(String name) {
    return places.getOrDefault(name, 0) - 1;
  }

  /** Whether the row holds any known name at all. */
  boolean isUsable() {
    return !places.isEmpty();
  }

  /** The frame of the velocities. */
  Frame frame() {
    return frame;
  }

  /** Number of cells, 0 when there is no column of any cell. */
  int maxCells() {
    return maxCells;
  }

  /** Whether there is a column of a quantity, whatever its cell. */
  boolean has(CellQuantity quantity) {
    return cellsOf.containsKey(quantity);
  }

  /** One note that names every column that is not known, if there are any. */
  List<Note> notes() {
    if (unknown.isEmpty()) {
      return List.of();
    }
    StringBuilder text = new StringBuilder("columns that are not known are ignored: ");
    for (int i = 0; i < Math.min(unknown.size(), NAMES_IN_NOTE); i++) {
      text.append(i == 0 ? "" : ", ").append(Quoted.of(unknown.get(i)));
      EnsembleColumn.nearest(unknown.get(i))
          .ifPresent(near -> text.append(" (nearest known name: ").append(near).append(')'));
    }
    if (unknown.size() > NAMES_IN_NOTE) {
      text.append(" and ").append(unknown.size() - NAMES_IN_NOTE).append(" more");
    }
    return List.of(new Note(Note.Level.CAUTION, "unknown-column", text.toString()));
  }

  private void recognise(String name, int place) {
    EnsembleColumn column = EnsembleColumn.find(name).orElse(null);
    if (column == null) {
      columns.add(null);
      unknown.add(name);
      return;
    }
    Integer before = places.putIfAbsent(name, place);
    if (before != null) {
      columns.add(null);
      problems.add(
          line,
          name,
          "the name in columns " + before + " and " + place,
          "every name once",
          "rename or remove one of them");
      return;
    }
    columns.add(column);
    if (column.role() == EnsembleColumn.Role.CELL) {
      cellsOf.merge(column.cellQuantity(), column.cell(), Math::max);
    }
  }

  private void refuse(String first) {
    String remedy = "name the columns in the first row, with commas between the names";
    if (names.size() == 1 && (first.indexOf(';') >= 0 || first.indexOf('\t') >= 0)) {
      remedy = "separate the columns by commas";
    }
    problems.add(line, "", Quoted.of(first), "a header row with known column names", remedy);
  }

  /** The frame with most columns of cells, or else of bottom track. */
  private Frame findFrame() {
    Frame best = Frame.EARTH;
    int most = 0;
    for (Frame candidate : Frame.values()) {
      int votes = 0;
      for (EnsembleColumn column : columns) {
        if (column != null && column.frames().contains(candidate)) {
          votes += column.role() == EnsembleColumn.Role.CELL ? 100 : 1;
        }
      }
      if (votes > most) {
        most = votes;
        best = candidate;
      }
    }
    return best;
  }

  private void checkFrame() {
    List<String> foreign = new ArrayList<>();
    for (EnsembleColumn column : columns) {
      if (column != null && !column.frames().contains(frame)) {
        foreign.add(column.name());
      }
    }
    if (!foreign.isEmpty()) {
      String example = EnsembleColumn.waterName(frame, 1, 1);
      problems.add(
          line,
          foreign.get(0),
          foreign.size() == 1
              ? "a velocity of another frame than " + example
              : foreign.size() + " columns with velocities of another frame than " + example,
          "velocities of one frame",
          "keep the columns of one frame");
    }
  }

  private void checkRequired() {
    require(EnsembleColumn.NUMBER);
    require(EnsembleColumn.TIME);
    require(EnsembleColumn.CELLS);
    require(EnsembleColumn.FIRST_CELL);
    require(EnsembleColumn.CELL_SIZE);
    if (frame != Frame.EARTH) {
      require(EnsembleColumn.HEADING);
    }
    requireBoatVelocity();
    requireDepth();
    for (int i = 1; i <= EnsembleColumn.neededComponents(frame); i++) {
      if (!has(CellQuantity.values()[CellQuantity.WATER_1.ordinal() + i - 1])) {
        require(EnsembleColumn.waterName(frame, i, 1));
      }
    }
  }

  private void require(String name) {
    if (!places.containsKey(name)) {
      problems.add(line, name, "no such column", "the column " + name, remedyFor(name));
    }
  }

  /** What to do about a missing column: rename the one that was meant, or add it. */
  private String remedyFor(String name) {
    return NearestName.find(name, unknown)
        .map(near -> "rename " + Quoted.of(near) + " to " + name)
        .orElse("add it");
  }

  private void requireBoatVelocity() {
    List<String> bottom = new ArrayList<>();
    for (int i = 1; i <= EnsembleColumn.neededComponents(frame); i++) {
      bottom.add(EnsembleColumn.bottomName(frame, i));
    }
    List<List<String>> sources =
        List.of(
            bottom,
            List.of("gnss_lat_deg", "gnss_lon_deg"),
            List.of("gnss_east_mps", "gnss_north_mps"));
    boolean any = false;
    for (List<String> source : sources) {
      if (source.stream().anyMatch(places::containsKey)) {
        any = true;
        source.forEach(this::require);
      }
    }
    if (!any) {
      problems.add(
          line,
          bottom.get(0),
          "no column for the boat's velocity",
          String.join(" with ", bottom)
              + ", or gnss_lat_deg with gnss_lon_deg, or gnss_east_mps with gnss_north_mps",
          remedyFor(bottom.get(0)));
    }
  }

  private void requireDepth() {
    for (EnsembleColumn column : columns) {
      if (column != null && column.range() == PhysicalRange.DEPTH) {
        return;
      }
    }
    problems.add(
        line,
        "depth_beam1_m",
        "no column for the depth",
        "depth_beam1_m to depth_beam4_m, or depth_vertical_m",
        remedyFor("depth_beam1_m"));
  }

  /** Every quantity of cells has to have a column for each of them. */
  private void checkCells() {
    Map<CellQuantity, boolean[]> present = new EnumMap<>(CellQuantity.class);
    Map<CellQuantity, String> stems = new EnumMap<>(CellQuantity.class);
    for (EnsembleColumn column : columns) {
      if (column != null && column.role() == EnsembleColumn.Role.CELL) {
        present
                .computeIfAbsent(column.cellQuantity(), key -> new boolean[maxCells])[
                column.cell() - 1] =
            true;
        String name = column.name();
        stems.putIfAbsent(column.cellQuantity(), name.substring(0, name.lastIndexOf('_') + 1));
      }
    }
    present.forEach((quantity, cells) -> checkGap(stems.get(quantity), cells));
  }

  private void checkGap(String stem, boolean[] cells) {
    for (int i = 0; i < cells.length; i++) {
      if (!cells[i]) {
        String name = stem + (i + 1);
        problems.add(
            line,
            name,
            "no such column",
            stem + "1 to " + stem + cells.length + " without a gap",
            remedyFor(name));
        return;
      }
    }
  }
}
