package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** What goes wrong around one measurement, or beside the run, harms nothing else. */
class ArchiveTroublesTest {

  @TempDir Path folder;
  private ExampleTree tree;
  private Path target;

  @BeforeEach
  void makeTree() throws IOException {
    tree = new ExampleTree(folder.resolve("tree"));
    target = folder.resolve("archive");
    for (String place : List.of("a/first", "a/second", "b/third", "b/fourth")) {
      tree.copy(place);
    }
  }

  private Run archive(Path root, Path out) {
    return Run.of("archive", root.toString(), "--out", out.toString(), "--write", "json,csv");
  }

  private Run archive() {
    return archive(tree.root(), target);
  }

  @Test
  void doesTheOthersWhereOnePlaceCannotBeWritten() throws IOException {
    Files.createDirectories(target.resolve("a/second/result.json/in the way"));
    Run run = archive();
    assertEquals(ExitCode.FAULTS_FOUND, run.code(), run.err());
    assertTrue(run.out().startsWith("3 done, 0 unchanged, 1 failed"), run.out());
    assertTrue(run.err().contains("a/second: failed: cannot write "), run.err());
    assertTrue(Files.exists(target.resolve("b/third/manifest.json")));
    assertFalse(Files.exists(target.resolve(".probe")));
  }

  @Test
  void namesTheInputsOfAMeasurementThatFailed() throws IOException {
    Path torn = tree.root().resolve("a/first/pass-01.csv");
    Files.writeString(torn, "torn");
    Files.delete(tree.root().resolve("a/second/pass-02.csv"));
    Files.writeString(tree.root().resolve("b/third/measurement.json"), "{");
    assertEquals(ExitCode.FAULTS_FOUND, archive().code());
    String first = Files.readString(target.resolve("a/first/manifest.json"));
    assertTrue(first.contains("\"file\": \"pass-02.csv\""), first);
    // echo -n torn | sha256sum
    String digest = "00cc10cc5ab0a89fbf4d84a229bf234e739ba6294a832d2c042ce8d9a1949cf7";
    assertTrue(first.contains("\"bytes\": 4,") && first.contains(digest), first);
    String second = Files.readString(target.resolve("a/second/manifest.json"));
    assertTrue(second.contains("\"file\": \"pass-01.csv\""), second);
    assertFalse(second.contains("\"file\": \"pass-02.csv\""), second);
    String third = Files.readString(target.resolve("b/third/manifest.json"));
    assertTrue(third.contains("\"bytes\": 1,") && !third.contains("pass-01.csv"), third);
  }

  @Test
  void takesEachFolderOfAListOnceAndNamesLinesThatAreNoPaths() throws IOException {
    Path first = tree.root().resolve("a/first");
    Path alias = Files.createSymbolicLink(folder.resolve("alias"), first);
    Path list = folder.resolve("list.txt");
    Files.writeString(
        list,
        String.join(
            "\n", first.toString(), tree.root() + "/a/./first/", alias.toString(), "no\0path"));
    Run run =
        Run.of("archive", "--from", list.toString(), "--out", target.toString(), "--write", "json");
    assertEquals(ExitCode.FAULTS_FOUND, run.code(), run.err());
    assertTrue(run.out().startsWith("1 done, 0 unchanged, 1 failed"), run.out());
    assertTrue(run.err().contains("in the list: no?path"), run.err());
  }

  @Test
  void removesWhatADeadRunLeftAlsoWhereNothingChanged() throws IOException {
    archive();
    Path left = target.resolve("a/first/.result.json.1.elsewhere.7.part");
    Files.writeString(left, "half");
    Files.setLastModifiedTime(left, FileTime.from(Instant.now().minusSeconds(200_000)));
    assertTrue(archive().out().startsWith("0 done, 4 unchanged"));
    assertFalse(Files.exists(left));
  }

  @Test
  void twoRunsAtOnceMakeTheSameAsOne() throws Exception {
    archive();
    Map<String, String> alone = ExampleTree.bytes(target);
    for (int trial = 0; trial < 5; trial++) {
      Path shared = folder.resolve("shared-" + trial);
      atOnce(shared, tree.root(), tree.root());
      assertEquals(alone, ExampleTree.bytes(shared));
    }
  }

  @Test
  void runsOnPartsOfATreeLeaveAnIndexOfAll() throws Exception {
    for (int trial = 0; trial < 5; trial++) {
      Path shared = folder.resolve("shared-" + trial);
      atOnce(shared, tree.root().resolve("a"), tree.root().resolve("b"));
      Map<String, String> together = ExampleTree.bytes(shared);
      Run.of("archive", "--index-only", "--out", shared.toString());
      assertEquals(ExampleTree.bytes(shared), together);
    }
  }

  private void atOnce(Path out, Path... roots) throws Exception {
    ExecutorService runs = Executors.newFixedThreadPool(roots.length);
    try {
      List<Future<Run>> started = new ArrayList<>();
      for (Path root : roots) {
        started.add(runs.submit(() -> archive(root, out)));
      }
      for (Future<Run> each : started) {
        assertEquals(ExitCode.DONE, each.get().code(), each.get().err());
      }
    } finally {
      runs.shutdownNow();
    }
  }

  /** A disk of its own that has room for the first measurements only; needs the right to mount. */
  @Test
  @EnabledOnOs(OS.LINUX)
  void stopsOnAFullDiskAndGoesOnWhenThereIsRoom() throws Exception {
    Files.createDirectories(target);
    assumeTrue(call("mount", "-t", "tmpfs", "-o", "size=60k", "tmpfs", target.toString()));
    try {
      Run full = archive();
      assertEquals(ExitCode.CANNOT_WRITE, full.code(), full.err());
      assertTrue(full.err().contains("No space left on device"), full.err());
      Map<String, String> kept = ExampleTree.bytes(target);
      assertFalse(kept.keySet().stream().anyMatch(name -> name.endsWith(".part")), "left over");
      assertTrue(call("mount", "-o", "remount,size=20m", target.toString()));
      assertEquals(ExitCode.DONE, archive().code());
      Map<String, String> whole = ExampleTree.bytes(target);
      assertTrue(whole.entrySet().containsAll(kept.entrySet()), "what was kept is whole");
      archive(tree.root(), folder.resolve("elsewhere"));
      assertEquals(ExampleTree.bytes(folder.resolve("elsewhere")), whole);
    } finally {
      call("umount", target.toString());
    }
  }

  private static boolean call(String... words) throws Exception {
    try {
      return new ProcessBuilder(words).redirectErrorStream(true).start().waitFor() == 0;
    } catch (IOException noSuchProgram) {
      return false;
    }
  }
}
