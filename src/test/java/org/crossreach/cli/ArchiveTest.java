package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The archive job does every good measurement, names every bad one, does nothing twice, and gives
 * the same bytes however the work was cut up.
 */
class ArchiveTest {

  @TempDir Path folder;
  private Path tree;
  private Path target;

  @BeforeEach
  void makeTree() throws IOException {
    tree = folder.resolve("tree");
    target = folder.resolve("archive");
    for (String place : new String[] {"a/first", "a/second", "b/with blank", "b/grün-河", "deep"}) {
      copy(place);
    }
    copy("deep/" + "n".repeat(200));
  }

  private Path copy(String place) throws IOException {
    return new ExampleTree(tree).copy(place);
  }

  private Run archive(String... more) {
    String[] words = new String[6 + more.length];
    String[] always = {
      "archive", tree.toString(), "--out", target.toString(), "--write", "json,csv"
    };
    System.arraycopy(always, 0, words, 0, 6);
    System.arraycopy(more, 0, words, 6, more.length);
    return Run.of(words);
  }

  @Test
  void keepsEveryMeasurementOnceAndThenLeavesItAlone() throws IOException {
    Run first = archive();
    assertEquals(ExitCode.DONE, first.code(), first.err());
    assertTrue(first.out().startsWith("6 done, 0 unchanged, 0 failed; 12 passes"), first.out());
    Map<String, String> before = ExampleTree.bytes(target);
    Run second = archive();
    assertTrue(second.out().startsWith("0 done, 6 unchanged, 0 failed"), second.out());
    assertEquals(before, ExampleTree.bytes(target));
    assertEquals(7, Files.readString(target.resolve("index-measurements.csv")).lines().count());
    assertEquals(13, Files.readString(target.resolve("index-passes.csv")).lines().count());
  }

  @Test
  void doesAgainWhatChanged() throws IOException {
    archive();
    Path csv = tree.resolve("a/first/pass-01.csv");
    Files.writeString(csv, Files.readString(csv).replaceFirst("0\\.708", "0.709"));
    Files.writeString(target.resolve("a/second/passes.csv"), "damaged");
    Files.writeString(
        tree.resolve("deep/settings.json"),
        "{\"format\": \"crossreach-settings/1\", \"top\": \"constant\"}");
    Files.delete(target.resolve("b/with blank/pass-01.ensembles.csv"));
    assertTrue(archive().out().startsWith("4 done, 2 unchanged"));
    assertFalse(Files.readString(target.resolve("a/second/passes.csv")).equals("damaged"));
    assertTrue(archive("--set", "top=constant").out().startsWith("6 done"), "another plan");
  }

  @Test
  void namesEveryBadMeasurementAndDoesTheOthers() throws IOException {
    Files.delete(tree.resolve("a/first/pass-02.csv"));
    Path torn = tree.resolve("a/second/pass-01.csv");
    String text = Files.readString(torn);
    Files.writeString(torn, text.substring(0, text.length() - 40));
    Files.createSymbolicLink(tree.resolve("b/loop"), tree);
    Files.createDirectories(tree.resolve("c"));
    Files.writeString(tree.resolve("c/measurement.json"), "{");
    Run run = archive();
    assertEquals(ExitCode.FAULTS_FOUND, run.code());
    assertTrue(run.out().startsWith("4 done, 0 unchanged, 3 failed"), run.out() + run.err());
    assertTrue(run.err().contains("a/first: failed: measurement.json"), run.err());
    assertTrue(run.err().contains("a/second: failed: pass-01.csv:"), run.err());
    assertTrue(run.err().contains("c: failed: measurement.json"), run.err());
    assertTrue(
        Files.readString(target.resolve("index-measurements.csv")).contains("a/first,failed,"));
    assertEquals(1, Files.list(target.resolve("c")).count(), "nothing but the manifest");
  }

  @Test
  void takesAwayWhatABrokenMeasurementHadBefore() throws IOException {
    archive();
    Files.delete(tree.resolve("a/first/pass-02.csv"));
    archive();
    assertFalse(Files.exists(target.resolve("a/first/result.json")));
    copyBack();
    assertTrue(archive().out().startsWith("1 done, 5 unchanged"));
  }

  private void copyBack() throws IOException {
    Files.copy(ExampleTree.EXAMPLE.resolve("pass-02.csv"), tree.resolve("a/first/pass-02.csv"));
  }

  @Test
  void shardsMakeTheSameAsOneRun() throws IOException {
    archive();
    Map<String, String> whole = ExampleTree.bytes(target);
    target = folder.resolve("in-shards");
    int done = 0;
    for (int k = 1; k <= 3; k++) {
      String out = archive("--shard", k + "/3").out();
      done += Integer.parseInt(out.substring(0, out.indexOf(' ')));
    }
    assertEquals(6, done);
    assertFalse(Files.exists(target.resolve("index.json")), "shards leave the index alone");
    Run.of("archive", "--index-only", "--out", target.toString());
    assertEquals(whole, ExampleTree.bytes(target));
  }

  @Test
  void keepsARealFolderUnderItsOwnNameWhateverLinksLeadToIt() throws IOException {
    Files.createSymbolicLink(tree.resolve("a/alias"), tree.resolve("b/with blank"));
    assertTrue(archive().out().startsWith("6 done"));
    assertTrue(Files.exists(target.resolve("b/with blank/manifest.json")));
    assertFalse(Files.exists(target.resolve("a/alias")));
  }

  @Test
  void takesAList() throws IOException {
    Path list = folder.resolve("list.txt");
    Files.writeString(list, tree.resolve("a/first") + "\n" + tree.resolve("deep") + "\n");
    Run run =
        Run.of(
            "archive",
            "--from",
            list.toString(),
            "--out",
            target.toString(),
            "--write",
            "json",
            "--json");
    assertEquals(ExitCode.DONE, run.code(), run.err());
    assertTrue(run.out().contains("\"done\": 2"), run.out());
  }

  @Test
  void refusesWhatCannotBe() throws IOException {
    assertEquals(ExitCode.WRONG_USAGE, archive("--shard", "4/3").code());
    assertEquals(ExitCode.WRONG_USAGE, archive("--shard", "x").code());
    assertEquals(ExitCode.WRONG_USAGE, archive("--jobs", "0").code());
    assertEquals(ExitCode.WRONG_USAGE, Run.of("archive", "--out", target.toString()).code());
    assertEquals(
        ExitCode.UNREADABLE_INPUT, Run.of("archive", folder.resolve("nowhere").toString()).code());
    Path file = folder.resolve("a-file");
    Files.writeString(file, "not a folder");
    Run run = Run.of("archive", tree.toString(), "--out", file.toString(), "--write", "json");
    assertEquals(ExitCode.CANNOT_WRITE, run.code(), run.err());
    assertEquals("not a folder", Files.readString(file));
  }
}
