package org.crossreach.ingest;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.GZIPOutputStream;

/** A small valid ensemble CSV of three ensembles and two cells, and ways to spoil it. */
final class TableText {

  static final String HEADER =
      "ensemble,time,bt_east_mps,bt_north_mps,depth_beam1_m,cells,first_cell_m,cell_size_m,"
          + "east_mps_1,east_mps_2,north_mps_1,north_mps_2";

  private final List<String> lines = new ArrayList<>();

  private TableText(List<String> lines) {
    this.lines.addAll(lines);
  }

  static TableText valid() {
    return new TableText(
        List.of(
            HEADER,
            "1,2031-04-18T09:30:00.25+01:00,0.5,-0.25,4.5,2,0.75,0.5,1.125,1.0,-0.5,NaN",
            "2,2031-04-18T09:30:00.75+01:00,0.625,,4.25,1,0.75,0.5,1.25,9,-0.5,NA",
            "3,2031-04-18T08:30:01.25Z,0.75,-0.125,4,0,,,,,,"));
  }

  /** The same table with a text replaced on one line, counted from 1. */
  TableText replace(int line, String target, String replacement) {
    String before = lines.get(line - 1);
    if (!before.contains(target)) {
      throw new IllegalArgumentException("line " + line + " has no " + target);
    }
    TableText spoiled = new TableText(lines);
    spoiled.lines.set(line - 1, before.replace(target, replacement));
    return spoiled;
  }

  /** The same table with another line in place of one, counted from 1. */
  TableText line(int line, String replacement) {
    TableText spoiled = new TableText(lines);
    spoiled.lines.set(line - 1, replacement);
    return spoiled;
  }

  /** The table with LF after each line. */
  String text() {
    return String.join("\n", lines) + "\n";
  }

  byte[] bytes() {
    return text().getBytes(StandardCharsets.UTF_8);
  }

  static byte[] packed(byte[] bytes) throws IOException {
    ByteArrayOutputStream packed = new ByteArrayOutputStream();
    try (GZIPOutputStream gzip = new GZIPOutputStream(packed)) {
      gzip.write(bytes);
    }
    return packed.toByteArray();
  }

  static Path write(Path folder, String name, byte[] bytes) throws IOException {
    return Files.write(folder.resolve(name), bytes);
  }
}
