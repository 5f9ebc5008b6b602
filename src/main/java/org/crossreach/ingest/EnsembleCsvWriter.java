package org.crossreach.ingest;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;

/**
 * Writes ensembles as the CSV that {@link EnsembleCsv} reads.
 *
 * <p>Numbers have a fixed count of decimals; a missing value is an empty field. A value that is a
 * multiple of the last decimal is read back as the same double.
 */
public final class EnsembleCsvWriter {

  private final Ensembles ensembles;
  private final int decimals;
  private final List<EnsembleQuantity> quantities = new ArrayList<>();
  private final List<CellQuantity> cellQuantities = new ArrayList<>();

  private EnsembleCsvWriter(Ensembles ensembles, int decimals) {
    this.ensembles = ensembles;
    this.decimals = decimals;
    for (EnsembleQuantity quantity : EnsembleQuantity.values()) {
      if (ensembles.has(quantity)) {
        quantities.add(quantity);
      }
    }
    for (CellQuantity quantity : CellQuantity.values()) {
      if (ensembles.has(quantity)) {
        cellQuantities.add(quantity);
      }
    }
  }

  /**
   * Writes a file.
   *
   * @param ensembles what it is to hold
   * @param decimals decimals of every number but times, counts and positions, 0 to 12
   * @param target receives UTF-8; it is left open
   */
  public static void write(Ensembles ensembles, int decimals, OutputStream target)
      throws IOException {
    Writer writer = new BufferedWriter(new OutputStreamWriter(target, StandardCharsets.UTF_8));
    new EnsembleCsvWriter(ensembles, decimals).write(writer);
    writer.flush();
  }

  private void write(Writer writer) throws IOException {
    writer.write(header());
    StringBuilder row = new StringBuilder();
    for (int i = 0; i < ensembles.size(); i++) {
      row.setLength(0);
      row.append(ensembles.number(i)).append(',').append(time(i));
      row.append(',').append(ensembles.cells(i));
      for (EnsembleQuantity quantity : quantities) {
        append(row, ensembles.value(quantity, i), decimals(quantity));
      }
      for (CellQuantity quantity : cellQuantities) {
        for (int k = 0; k < ensembles.maxCells(); k++) {
          append(row, ensembles.grid(quantity).get(i, k), decimals);
        }
      }
      writer.write(row.append('\n').toString());
    }
  }

  private String header() {
    StringBuilder header = new StringBuilder(EnsembleColumn.NUMBER);
    header.append(',').append(EnsembleColumn.TIME).append(',').append(EnsembleColumn.CELLS);
    for (EnsembleQuantity quantity : quantities) {
      header.append(',').append(EnsembleColumn.nameOf(quantity, ensembles.frame()));
    }
    for (CellQuantity quantity : cellQuantities) {
      String name = EnsembleColumn.nameOf(quantity, ensembles.frame());
      for (int k = 1; k <= ensembles.maxCells(); k++) {
        header.append(',').append(name).append('_').append(k);
      }
    }
    return header.append('\n').toString();
  }

  private String time(int ensemble) {
    long nanos = Math.round(1e9 * ensembles.elapsedS(ensemble));
    return DateTimeFormatter.ISO_OFFSET_DATE_TIME.format(ensembles.start().plusNanos(nanos));
  }

  private int decimals(EnsembleQuantity quantity) {
    return switch (quantity) {
      case GNSS_LATITUDE_DEG, GNSS_LONGITUDE_DEG -> 10;
      case GNSS_QUALITY, GNSS_SATELLITES -> 0;
      default -> decimals;
    };
  }

  private static void append(StringBuilder row, double value, int decimals) {
    row.append(',');
    if (!Double.isNaN(value)) {
      row.append(new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString());
    }
  }
}
