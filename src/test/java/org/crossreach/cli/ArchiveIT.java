package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/**
 * The packaged program keeps what it kept, whatever the disk under the archive or the folders above
 * the measurements do.
 *
 * <p>Disks of a test live in a mount namespace of its own, and end with it.
 */
@EnabledOnOs(OS.LINUX)
class ArchiveIT {

  private static final String PROGRAM =
      Path.of("target", "crossreach", "bin", "crossreach").toAbsolutePath().toString();

  /** Takes from root the right to pass by permissions; others do not have it. */
  private static final String WITHOUT_PRIVILEGE =
      "setpriv --bounding-set=-dac_override,-dac_read_search ";

  @TempDir Path folder;
  private ExampleTree tree;

  @BeforeEach
  void makeTree() throws IOException {
    tree = new ExampleTree(folder.resolve("tree"));
    for (int m = 0; m < 6; m++) {
      tree.copy("m" + m);
    }
    Files.createDirectory(folder.resolve("disk"));
  }

  private Ended shell(String... lines) throws Exception {
    return call(List.of("sh", "-c", String.join("\n", lines)));
  }

  /** Runs lines of a shell that may mount; where nobody may, the test does not count. */
  private Ended mounting(String... lines) throws Exception {
    List<String> words = List.of("unshare", "--map-root-user", "--mount", "sh", "-c");
    List<String> trial = new ArrayList<>(words);
    trial.add("mount -t tmpfs tmpfs disk");
    assumeTrue(mayCall(trial), "no right to mount");
    List<String> all = new ArrayList<>(words);
    all.add(String.join("\n", lines));
    return call(all);
  }

  private boolean mayCall(List<String> words) throws Exception {
    try {
      return call(words).code() == 0;
    } catch (IOException noSuchProgram) {
      return false;
    }
  }

  private Ended call(List<String> words) throws Exception {
    return Ended.of(
        folder,
        Map.of("CROSSREACH_CACHE", "off", "LC_ALL", "C.UTF-8"),
        words.toArray(new String[0]));
  }

  private static String archive(String root, String target) {
    return "'" + PROGRAM + "' archive " + root + " --out " + target + " --write json,csv --quiet";
  }

  private Map<String, String> kept(String target) throws IOException {
    return ExampleTree.bytes(folder.resolve(target));
  }

  /** The files of two archives, told by name where they differ. */
  private void assertSame(String wanted, String target) throws IOException {
    Map<String, String> files = new TreeMap<>(kept(wanted));
    Map<String, String> others = kept(target);
    assertEquals(files.keySet(), others.keySet());
    files.entrySet().removeAll(others.entrySet());
    assertEquals(Set.of(), files.keySet(), "these differ");
  }

  /** Every file is as it was before or as it is to be, and none of those before is missing. */
  private static void assertWhole(
      Map<String, String> before, Map<String, String> now, Map<String, String> wanted) {
    assertTrue(now.keySet().containsAll(before.keySet()), now.keySet().toString());
    now.forEach(
        (name, bytes) ->
            assertTrue(
                bytes.equals(before.get(name)) || bytes.equals(wanted.get(name)),
                name + " is neither the earlier file nor the whole new one"));
  }

  @Test
  void keepsWhatStoodOnADiskThatGetsFullAndGoesOnWhenThereIsRoom() throws Exception {
    String other = archive("tree", "disk") + " --set top=constant";
    Ended ended =
        mounting(
            "mount -t tmpfs -o size=20m tmpfs disk",
            "mkdir few && cp -r tree/m0 tree/m1 few",
            archive("few", "disk") + " || exit 101",
            "cp -r disk before",
            "used=$(du -sk disk | cut -f 1)",
            "mount -o remount,size=$((used + 60))k disk",
            other,
            "echo code $?",
            "cp -r disk full",
            "mount -o remount,size=20m disk",
            other + " || exit 102",
            "cp -r disk after",
            other.replace("--out disk", "--out wanted"));
    assertEquals(0, ended.code(), ended.err());
    assertTrue(ended.out().contains("code " + ExitCode.CANNOT_WRITE), ended.out());
    assertTrue(ended.err().startsWith("crossreach: cannot write disk: "), ended.err());
    assertTrue(ended.err().contains("No space left on device"), ended.err());
    assertWhole(kept("before"), kept("full"), kept("wanted"));
    assertSame("wanted", "after");
  }

  /** Needs no right to mount: the system refuses to let any file grow beyond 4 KiB. */
  @Test
  void keepsWhatStoodWhereNoFileMayGrow() throws Exception {
    Ended ended =
        shell(
            archive("tree", "kept") + " || exit 101",
            "cp -r kept before",
            "(ulimit -f 8; " + archive("tree", "kept") + " --set top=constant); echo code $?",
            "cp -r kept full",
            archive("tree", "kept") + " --set top=constant || exit 102",
            archive("tree", "wanted") + " --set top=constant");
    assertEquals(0, ended.code(), ended.err());
    assertTrue(ended.out().contains("code " + ExitCode.CANNOT_WRITE), ended.out());
    assertTrue(ended.err().startsWith("crossreach: cannot write kept: "), ended.err());
    assertWhole(kept("before"), kept("full"), kept("wanted"));
    assertSame("wanted", "kept");
  }

  @Test
  void refusesATargetThatTakesNoFilesAndLeavesItAlone() throws Exception {
    Ended ended =
        mounting(
            "mount -t tmpfs tmpfs disk",
            archive("tree/m0", "disk") + " || exit 101",
            "cp -r disk before",
            "mount -o remount,ro disk",
            archive("tree", "disk"),
            "echo code $?",
            "cp -r disk after");
    assertTrue(ended.out().contains("code " + ExitCode.CANNOT_WRITE), ended.out());
    assertTrue(ended.err().contains("cannot write disk: "), ended.err());
    assertTrue(ended.err().contains("Read-only file system"), ended.err());
    assertSame("before", "after");
  }

  @Test
  void refusesATargetBelowAFile() throws Exception {
    Ended ended = shell("touch file", archive("tree", "file/below"));
    assertEquals(ExitCode.CANNOT_WRITE, ended.code());
    assertTrue(ended.err().startsWith("crossreach: cannot write file/below: "), ended.err());
    assertEquals(0, Files.size(folder.resolve("file")));
  }

  @Test
  void namesFoldersAndFilesThatMayNotBeReadAndDoesTheOthers() throws Exception {
    Path locked = tree.root().resolve("m1");
    Path file = tree.root().resolve("m2/pass-01.csv");
    String privilege =
        mayCall(List.of("sh", "-c", WITHOUT_PRIVILEGE + "true")) ? WITHOUT_PRIVILEGE : "";
    permit(locked, "---------");
    permit(file, "---------");
    try {
      assumeTrue(shell(privilege + "ls tree/m1").code() != 0, "permissions do not count here");
      Ended ended = shell(privilege + archive("tree", "kept").replace("--quiet", ""));
      assertEquals(ExitCode.FAULTS_FOUND, ended.code(), ended.err());
      assertTrue(ended.out().startsWith("4 done, 0 unchanged, 2 failed"), ended.out());
      assertTrue(ended.err().contains("tree/m1: this cannot be looked into"), ended.err());
      assertTrue(
          ended.err().contains("m2: failed: cannot read pass-01.csv: permission denied"),
          ended.err());
      String manifest = Files.readString(folder.resolve("kept/m2/manifest.json"));
      assertTrue(manifest.contains("pass-02.csv"), "what can be read is named");
      assertFalse(manifest.contains("\"file\": \"pass-01.csv\""), manifest);
    } finally {
      permit(locked, "rwxr-xr-x");
      permit(file, "rw-r--r--");
    }
  }

  private static void permit(Path file, String permissions) throws IOException {
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString(permissions));
  }

  @Test
  void twoProcessesAtOnceKeepTheSameAsOne() throws Exception {
    Ended ended =
        shell(
            archive("tree", "alone") + " || exit 101",
            archive("tree", "shared") + " & first=$!",
            archive("tree", "shared") + " || exit 102",
            "wait $first");
    assertEquals(0, ended.code(), ended.err());
    assertTrue(kept("alone").containsKey("m5/manifest.json"));
    assertSame("alone", "shared");
  }
}
