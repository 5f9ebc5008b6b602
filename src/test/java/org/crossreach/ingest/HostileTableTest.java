package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.io.RandomAccessFile;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Bytes that are no table at all, or are meant to take all memory or time, are refused with one
 * clear problem, and soon.
 */
class HostileTableTest {

  /** Generous for a shared machine; reading on to the end would take minutes or all memory. */
  private static final Duration SOON = Duration.ofSeconds(20);

  @TempDir Path folder;

  private Problem onlyProblem(String name, byte[] bytes) throws IOException {
    List<Problem> problems = problems(TableText.write(folder, name, bytes));
    assertEquals(1, problems.size(), problems::toString);
    return problems.get(0);
  }

  private static List<Problem> problems(Path file) {
    String name = file.getFileName().toString();
    return assertTimeout(
            SOON, () -> assertThrows(UnusableInput.class, () -> EnsembleCsv.read(file, name)))
        .problems();
  }

  private static byte[] encoded(Charset charset) {
    return TableText.valid().text().getBytes(charset);
  }

  @Test
  void tellsTheLikelyEncoding() throws IOException {
    for (Charset charset :
        List.of(StandardCharsets.UTF_16, StandardCharsets.UTF_16LE, StandardCharsets.UTF_16BE)) {
      Problem problem = onlyProblem("pass-01.csv", encoded(charset));
      assertEquals("UTF-16 text", problem.found(), charset.name());
      assertEquals("save the file as UTF-8", problem.remedy());
    }
    byte[] latin =
        TableText.valid()
            .replace(3, "0.625", "0.6\u00b5")
            .text()
            .getBytes(StandardCharsets.ISO_8859_1);
    Problem problem = onlyProblem("pass-01.csv", latin);
    assertEquals(3, problem.line());
    assertEquals("the byte 0xb5 where no such byte can be", problem.found());
    assertEquals("UTF-8 text", problem.expected());
    assertTrue(problem.remedy().contains("ISO 8859-1"));
  }

  @Test
  void refusesOtherKindsOfFiles() throws IOException {
    byte[] packed = TableText.packed(TableText.valid().bytes());
    assertEquals("gzip data", onlyProblem("pass-01.csv", packed).found());
    byte[] zip = Arrays.copyOf(new byte[] {'P', 'K', 3, 4, 20, 0}, 500);
    assertEquals("a zip archive or a spreadsheet", onlyProblem("pass-01.csv", zip).found());
  }

  @Test
  void refusesBinaryJunk() throws IOException {
    Random random = new Random(17);
    for (int trial = 0; trial < 200; trial++) {
      byte[] junk = new byte[1 + random.nextInt(100_000)];
      random.nextBytes(junk);
      assertEquals("pass-01.csv", onlyProblem("pass-01.csv", junk).file());
    }
  }

  @Test
  void refusesNulBytes() throws IOException {
    byte[] holed = TableText.valid().bytes();
    int at = TableText.valid().text().indexOf("0.625");
    Arrays.fill(holed, at, at + 3, (byte) 0);
    Problem problem = onlyProblem("pass-01.csv", holed);
    assertEquals(3, problem.line());
    assertEquals("bt_east_mps", problem.place());
    assertEquals("\"\\u0000\\u0000\\u000025\"", problem.found());
    assertEquals("the file is damaged: copy it again", problem.remedy());
    onlyProblem("pass-01.csv", new byte[200_000]);
  }

  @Test
  void refusesARowOfAMillionFields() throws IOException {
    byte[] header = ",".repeat(1_000_000).getBytes(StandardCharsets.US_ASCII);
    Problem problem = onlyProblem("pass-01.csv", header);
    assertEquals(1, problem.line());
    assertEquals("a row of more than 10000 fields", problem.found());
    String text = TableText.valid().line(3, "1,".repeat(1_000_000)).text();
    problem = onlyProblem("pass-01.csv", text.getBytes(StandardCharsets.US_ASCII));
    assertEquals(3, problem.line());
    assertEquals("a row of more than 10000 fields", problem.found());
  }

  @Test
  void refusesALineOfHundredsOfMegabytes() throws IOException {
    for (String filling : List.of("1", ",", "\"", " ", "\r")) {
      String text = TableText.HEADER + "\n" + filling.repeat(4 << 20);
      onlyProblem("pass-01.csv", text.getBytes(StandardCharsets.US_ASCII));
    }
    Path file = TableText.write(folder, "pass-01.csv", TableText.valid().bytes());
    try (RandomAccessFile holed = new RandomAccessFile(file.toFile(), "rw")) {
      holed.setLength(400L << 20); // NUL bytes that take no room on the disk
    }
    List<Problem> problems = problems(file);
    assertEquals(1, problems.size());
    assertEquals(5, problems.get(0).line());
    assertEquals("a field of more than 65536 characters", problems.get(0).found());
  }

  @Test
  void refusesGzipThatIsDamaged() throws IOException {
    byte[] whole = TableText.packed(TableText.valid().bytes());
    for (int size = 0; size < whole.length; size++) {
      Problem problem = onlyProblem("pass-01.csv.gz", Arrays.copyOf(whole, size));
      assertEquals("a whole gzip file", problem.expected(), "cut to " + size);
    }
    byte[] wrongSum = whole.clone();
    wrongSum[whole.length - 6] ^= 1;
    assertEquals("damaged gzip data", onlyProblem("pass-01.csv.gz", wrongSum).found());
    assertEquals(
        "something that is not gzip",
        onlyProblem("pass-01.csv.gz", TableText.valid().bytes()).found());
  }

  /** A gigabyte in a megabyte, deflate's limit being 1032 to 1: a member that comes again. */
  @Test
  void refusesAGzipBomb() throws IOException {
    for (String filling : List.of("1", ",", " ", "\n")) {
      byte[] member = TableText.packed(filling.repeat(1 << 20).getBytes(StandardCharsets.US_ASCII));
      Path file = folder.resolve("bomb.csv.gz");
      try (OutputStream out = Files.newOutputStream(file)) {
        out.write(TableText.packed((TableText.HEADER + "\n").getBytes(StandardCharsets.US_ASCII)));
        for (int i = 0; i < 1024; i++) {
          out.write(member);
        }
      }
      List<Problem> problems = problems(file);
      assertEquals(1, problems.size());
      if (filling.equals("\n")) {
        assertEquals("gzip data that expand more than 100-fold", problems.get(0).found());
      }
    }
  }

  @Test
  void refusesWhatIsNoFile() throws IOException {
    assertEquals(
        "a folder", problems(Files.createDirectory(folder.resolve("a.csv"))).get(0).found());
    assertEquals("no such file", problems(folder.resolve("none.csv")).get(0).found());
  }
}
