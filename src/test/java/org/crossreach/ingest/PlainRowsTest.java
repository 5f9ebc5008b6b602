package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import org.crossreach.survey.CellQuantity;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A row is read the same, whether straight from the bytes or through the parser. */
class PlainRowsTest {

  /** Hands out a few bytes at a time, so that rows are cut anywhere. */
  private static final class Drip extends FilterInputStream {
    private final Random random;

    Drip(byte[] bytes, Random random) {
      super(new ByteArrayInputStream(bytes));
      this.random = random;
    }

    @Override
    public int read(byte[] target, int offset, int length) throws IOException {
      return super.read(target, offset, Math.min(length, 1 + random.nextInt(90)));
    }
  }

  /** The table as read, or its problems. */
  private static String outcome(InputStream bytes) throws IOException {
    try {
      FileProblems problems = new FileProblems("pass-01.csv");
      return text(EnsembleCsv.read(bytes, false, problems).ensembles());
    } catch (UnusableInput e) {
      return e.problems().toString();
    }
  }

  private static String outcome(String text, Random random) throws IOException {
    return outcome(new Drip(text.getBytes(StandardCharsets.UTF_8), random));
  }

  private static String text(Ensembles ensembles) {
    StringBuilder text = new StringBuilder().append(ensembles.start());
    for (int i = 0; i < ensembles.size(); i++) {
      text.append('\n').append(ensembles.number(i)).append(' ').append(ensembles.elapsedS(i));
      text.append(' ').append(ensembles.cells(i));
      for (EnsembleQuantity quantity : EnsembleQuantity.values()) {
        text.append(' ').append(ensembles.value(quantity, i));
      }
      for (CellQuantity quantity : List.of(CellQuantity.WATER_1, CellQuantity.WATER_2)) {
        for (int k = 0; k < ensembles.maxCells(); k++) {
          text.append(' ').append(ensembles.grid(quantity).get(i, k));
        }
      }
    }
    return text.toString();
  }

  private static String number(Random random) {
    return switch (random.nextInt(12)) {
      case 0 -> "";
      case 1 -> "NaN";
      case 2 -> "NA";
      case 3 -> "-" + random.nextInt(19);
      case 4 -> "." + random.nextInt(1000);
      case 5 -> random.nextInt(19) + ".";
      case 6 -> "-0";
      case 7 -> "0." + Math.abs(random.nextLong());
      case 8 -> random.nextInt(9) + "e-1";
      case 9 -> "+1.5";
      default -> (random.nextInt(38_000) - 19_000) / 1000.0 + "";
    };
  }

  /** What a damaged file may hold where a number belongs. */
  private static String oddity(Random random) {
    String[] oddities = {
      "x",
      "-",
      ".",
      "1.2.3",
      "--1",
      "99",
      "N",
      "Na",
      "NaNs",
      "1-",
      "\"1.5\"",
      "\"1\n\"",
      "\"",
      " 1",
      "1\t",
      "1\r2",
      "1,5",
      "ü",
      "-.",
      "1 5",
      "\u0000",
      "12345678901234567890"
    };
    return oddities[random.nextInt(oddities.length)];
  }

  private static String table(Random random, String end, double odd) {
    StringBuilder text = new StringBuilder(TableText.HEADER).append(",stranger").append(end);
    int rows = 1 + random.nextInt(30);
    for (int row = 0; row < rows; row++) {
      int second = 10 + row;
      text.append(row + 1).append(",2031-04-18T09:30:").append(second).append('Z');
      for (int field = 2; field < 13; field++) {
        boolean strange = random.nextDouble() < odd;
        String plain =
            switch (field) {
              case 4 -> "4.25";
              case 5 -> Integer.toString(random.nextInt(3));
              case 6, 7 -> "0.5";
              default -> number(random);
            };
        text.append(',').append(strange ? oddity(random) : plain);
      }
      boolean last = row == rows - 1 && random.nextBoolean();
      text.append(last ? "" : random.nextInt(30) == 0 ? end + end : end);
    }
    return text.toString();
  }

  /** The same table, of which no row is plain any more: the parser reads all of it. */
  private static String throughParser(String text) {
    return text.replace(",2031-", ", 2031-");
  }

  @ParameterizedTest
  @ValueSource(strings = {"\n", "\r\n", "\r"})
  void givesWhatTheParserGives(String end) throws Exception {
    for (int seed = 0; seed < 300; seed++) {
      Random random = new Random(seed);
      String text = table(random, end, seed % 3 == 0 ? 0 : 0.01);
      assertEquals(outcome(throughParser(text), random), outcome(text, random), seed + "\n" + text);
    }
  }

  @Test
  void countsTheLinesBeforeAProblem() throws Exception {
    StringBuilder text = new StringBuilder(TableText.HEADER);
    for (int row = 1; row <= 40; row++) {
      String speed = row == 30 ? "fast" : row == 20 ? "\"0.5\"" : "0.5";
      text.append("\n%d,2031-04-18T09:30:%dZ,%s,0,4,0,,,,,,".formatted(row, row + 10, speed));
    }
    String outcome = outcome(text + "\n", new Random(1));
    assertTrue(outcome.contains("csv:31,"), outcome);
  }

  @Test
  void tellsTheLineOfAPlainRowThatComesTooEarly() throws Exception {
    String late = "%d,2031-04-18T09:30:%dZ,0.5,0,4,0,,,,,,\n";
    String text = TableText.HEADER + "\n" + late.formatted(1, 20) + late.formatted(2, 10);
    String outcome = outcome(text, new Random(1));
    assertTrue(outcome.contains("csv:3,") && outcome.contains("not after"), outcome);
  }

  @Test
  void doesNotTakeALineWithinAQuotedFieldForARow() throws Exception {
    String row = ",2031-04-18T09:30:11Z,0.5,0,4,0,,,,,,";
    String text = TableText.HEADER + "\n\"\n2" + row + "\n\"" + row + "\n";
    String outcome = outcome(text, new Random(1));
    assertTrue(outcome.contains("csv:2,") && !outcome.contains("csv:3,"), outcome);
  }

  @Test
  void leavesARowLongerThanItsRoomToTheParser() throws Exception {
    String zeros = "0".repeat(300_000);
    String text = TableText.HEADER + "\n1,2031-04-18T09:30:11Z,0." + zeros + ",0,4,0,,,,,,\n";
    assertTrue(outcome(text, new Random(1)).contains("65536"), "a field that is too long");
  }
}
