package org.crossreach.ingest;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.crossreach.survey.UnusableInput;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Reading one ensemble CSV, against a hand-written loop over the same bytes that parses every
 * number and does nothing else with it but add it up: no checks, no columns, no digest.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@State(Scope.Benchmark)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 2)
@Fork(
    value = 3,
    jvmArgs = {"-Xmx2g"})
public class ReadingBenchmark {

  private static final double[] TEN_TO = {1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9};

  /** Quantities of each cell: the two that are required, or all seven. */
  @Param({"2", "7"})
  public int quantities;

  private Path file;

  @Setup
  public void write() throws IOException {
    file = Files.createTempFile("reading", ".csv");
    try (BufferedWriter out = Files.newBufferedWriter(file)) {
      writeTable(out, /* rows= */ quantities == 2 ? 20_000 : 6_000, /* cells= */ 60);
    }
  }

  @TearDown
  public void delete() throws IOException {
    Files.delete(file);
  }

  private void writeTable(BufferedWriter out, int rows, int cells) throws IOException {
    String[] names = {
      "east_mps_",
      "north_mps_",
      "up_mps_",
      "error_mps_",
      "correlation_",
      "intensity_db_",
      "good_pct_"
    };
    out.write(
        "ensemble,time,bt_east_mps,bt_north_mps,bt_up_mps,bt_error_mps,heading_deg,pitch_deg");
    out.write(",roll_deg,temperature_degc,depth_beam1_m,depth_beam2_m,depth_beam3_m,depth_beam4_m");
    out.write(",cells,first_cell_m,cell_size_m");
    for (int i = 0; i < quantities; i++) {
      for (int cell = 1; cell <= cells; cell++) {
        out.write("," + names[i] + cell);
      }
    }
    Random random = new Random(2);
    Instant start = Instant.parse("2031-04-18T09:30:00.125Z");
    for (int row = 0; row < rows; row++) {
      out.write("\n" + (row + 1) + "," + start.plusMillis(500L * row));
      for (int i = 0; i < 4; i++) {
        out.write("," + thousandths((int) (800 * random.nextGaussian())));
      }
      out.write("," + thousandths(random.nextInt(360_000)) + ",0.41,-1.25,14.2");
      for (int i = 0; i < 4; i++) {
        out.write("," + thousandths(5000 + random.nextInt(2000)));
      }
      out.write("," + cells + ",0.75,0.25");
      int usable = (int) (cells * (0.7 + 0.3 * random.nextDouble()));
      for (int i = 0; i < quantities; i++) {
        for (int cell = 0; cell < cells; cell++) {
          out.write(cell < usable ? "," + thousandths(cellValue(i, random)) : ",");
        }
      }
    }
    out.write("\n");
  }

  private static int cellValue(int quantity, Random random) {
    return switch (quantity) {
      case 4 -> random.nextInt(1000);
      case 5 -> 40_000 + random.nextInt(60_000);
      case 6 -> 1000 * random.nextInt(101);
      default -> (int) (900 * random.nextGaussian());
    };
  }

  private static String thousandths(int value) {
    int size = Math.abs(value);
    String decimals = Integer.toString(1000 + size % 1000).substring(1);
    return (value < 0 ? "-" : "") + size / 1000 + "." + decimals;
  }

  @Benchmark
  public double baseline() throws IOException {
    byte[] block = new byte[1 << 16];
    double sum = 0;
    long whole = 0;
    int digits = 0;
    int decimals = 0;
    boolean afterPoint = false;
    boolean negative = false;
    boolean number = true;
    try (InputStream in = Files.newInputStream(file)) {
      for (int size = in.read(block); size > 0; size = in.read(block)) {
        for (int i = 0; i < size; i++) {
          int character = block[i];
          int digit = character - '0';
          if (digit >= 0 && digit <= 9) {
            whole = 10 * whole + digit;
            digits++;
            if (afterPoint) {
              decimals++;
            }
          } else if (character == ',' || character == '\n') {
            if (number && digits > 0) {
              double value = whole / TEN_TO[decimals];
              sum += negative ? -value : value;
            }
            whole = 0;
            digits = 0;
            decimals = 0;
            afterPoint = false;
            negative = false;
            number = true;
          } else if (character == '.') {
            afterPoint = true;
          } else if (character == '-' && digits == 0) {
            negative = true;
          } else {
            number = false;
          }
        }
      }
    }
    return sum;
  }

  @Benchmark
  public EnsembleFile reader() throws IOException, UnusableInput {
    return EnsembleCsv.read(file, "pass-01.csv");
  }
}
