package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/**
 * The folder that the build leaves can be copied anywhere, started from anywhere, and run on any
 * JDK from 17; it says nothing but what was asked for.
 */
@DisabledOnOs(OS.WINDOWS)
class DistributionIT {

  private static final Path BUILT = Path.of("target", "crossreach").toAbsolutePath();
  private static final Path EXAMPLE = Path.of("formats", "example").toAbsolutePath();

  /** Where Linux distributions keep their JDKs. */
  private static final Path JDKS = Path.of("/usr/lib/jvm");

  @TempDir Path folder;
  private Path cache;

  @BeforeEach
  void findCache() {
    cache = folder.resolve("cache");
  }

  private Ended start(Path from, Map<String, String> environment, String... words)
      throws Exception {
    Map<String, String> all = new HashMap<>(Map.of("CROSSREACH_CACHE", cache.toString()));
    all.putAll(environment);
    return Ended.of(from, all, words);
  }

  private Ended reduce(Path launcher) throws Exception {
    return start(folder, Map.of(), launcher.toString(), "reduce", EXAMPLE.toString(), "--json");
  }

  private static Path launcher(Path installed) {
    return installed.resolve("bin").resolve("crossreach");
  }

  private static void assertReduced(Ended ended) {
    assertEquals("", ended.err());
    assertEquals(Run.of("reduce", EXAMPLE.toString(), "--json").out(), ended.out());
    assertEquals(ExitCode.DONE, ended.code());
  }

  private Path copyTo(String name) throws Exception {
    Path copy = folder.resolve(name);
    Ended copied = start(folder, Map.of(), "cp", "-r", BUILT.toString(), copy.toString());
    assertEquals(0, copied.code(), copied.err());
    return copy;
  }

  private List<String> cached() throws IOException {
    try (Stream<Path> files = Files.list(cache)) {
      return files.map(file -> file.getFileName().toString()).toList();
    }
  }

  @Test
  void startsWhereItWasBuiltAndNeedsNoCache() throws Exception {
    assertReduced(reduce(launcher(BUILT)));
    assertFalse(Files.exists(cache));
  }

  @Test
  void startsThroughSymbolicLinksAndBlanksFromAnywhere() throws Exception {
    Path far = Files.createDirectories(folder.resolve("a b").resolve("c"));
    Files.createSymbolicLink(far.resolve("one"), launcher(BUILT));
    Files.createSymbolicLink(folder.resolve("two"), Path.of("a b", "c", "one"));
    Ended ended = reduce(folder.resolve("two"));
    Files.delete(folder.resolve("two"));
    Files.delete(far.resolve("one"));
    assertReduced(ended);
  }

  @Test
  void makesItsArchiveOnceWhereItWasCopied() throws Exception {
    Path copy = copyTo("copied here");
    assertReduced(reduce(launcher(copy)));
    assertEquals(1, cached().size(), cached().toString());
    Path archive = cache.resolve(cached().get(0));
    assertTrue(Files.size(archive) > 1_000_000, archive + " has " + Files.size(archive) + " bytes");
    Object made = Files.getAttribute(archive, "unix:ino");
    assertReduced(reduce(launcher(copy)));
    assertEquals(made, Files.getAttribute(archive, "unix:ino"));
  }

  @Test
  void firstStartsSideBySideDoNotDisturbEachOther() throws Exception {
    Path copy = copyTo("copy");
    String one = "'" + launcher(copy) + "' reduce '" + EXAMPLE + "' --json";
    Ended ended =
        start(
            folder,
            Map.of(),
            "sh",
            "-c",
            "for i in 1 2 3 4; do " + one + " >$i.out 2>&1 & done; wait");
    assertEquals("", ended.err());
    for (int i = 1; i <= 4; i++) {
      assertEquals(
          Run.of("reduce", EXAMPLE.toString(), "--json").out(),
          Files.readString(folder.resolve(i + ".out")));
    }
    assertEquals(1, cached().size(), cached().toString());
  }

  @Test
  void startsWhereNoArchiveCanBeKept() throws Exception {
    Path copy = copyTo("copy");
    Path file = Files.createFile(folder.resolve("file"));
    String[] words = {launcher(copy).toString(), "reduce", EXAMPLE.toString(), "--json"};
    for (Map<String, String> environment :
        List.of(
            Map.of("CROSSREACH_CACHE", "off"),
            Map.of("CROSSREACH_CACHE", file.resolve("below a file").toString()),
            Map.of("CROSSREACH_CACHE", "", "XDG_CACHE_HOME", "", "HOME", ""))) {
      assertReduced(start(folder, environment, words));
    }
  }

  @Test
  void anArchiveThatDoesNotFitIsIgnoredInSilence() throws Exception {
    Path copy = copyTo("copy");
    assertReduced(reduce(launcher(copy)));
    Path archive = cache.resolve(cached().get(0));
    archive.toFile().setWritable(true);
    for (byte[] spoiled :
        List.of(new byte[0], "no archive".getBytes(StandardCharsets.UTF_8), new byte[100_000])) {
      Files.write(archive, spoiled);
      assertReduced(reduce(launcher(copy)));
    }
  }

  @Test
  void startsOnEveryJdkFrom17() throws Exception {
    List<Path> homes = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"))));
    if (Files.isDirectory(JDKS)) {
      try (Stream<Path> installed = Files.list(JDKS)) {
        installed.filter(home -> release(home) >= 17).forEach(homes::add);
      }
    }
    for (Path home : homes) {
      for (int i = 0; i < 2; i++) {
        assertReduced(
            start(
                folder,
                Map.of("JAVA_HOME", home.toString()),
                launcher(BUILT).toString(),
                "reduce",
                EXAMPLE.toString(),
                "--json"));
      }
    }
  }

  /** The feature release of a JDK, 0 when it cannot be told. */
  private static int release(Path home) {
    try (Stream<String> lines = Files.lines(home.resolve("release"))) {
      return lines
          .filter(line -> line.startsWith("JAVA_VERSION=\""))
          .map(line -> line.replaceAll("JAVA_VERSION=\"(\\d+).*", "$1"))
          .mapToInt(Integer::parseInt)
          .findFirst()
          .orElse(0);
    } catch (IOException noJdk) {
      return 0;
    }
  }

  @Test
  void saysWhichJavaIsMissing() throws Exception {
    Ended ended =
        start(
            folder, Map.of("JAVA_HOME", "/nowhere"), launcher(BUILT).toString(), "check", "there");
    assertEquals(
        "crossreach: JAVA_HOME is /nowhere, but there is no bin/java in it\n", ended.err());
    assertEquals(ExitCode.PROGRAM_FAULT, ended.code());
  }

  @Test
  void takesOptionsForTheVirtualMachine() throws Exception {
    Map<String, String> options =
        Map.of("CROSSREACH_JAVA_OPTS", "-XX:+UseParallelGC -Xmx200m -Dmark=*");
    assertReduced(
        start(folder, options, launcher(BUILT).toString(), "reduce", EXAMPLE.toString(), "--json"));
  }

  @Test
  void takesTheThoroughCompilerForLargeBatchesOfPagesAndForDigestingMuch() throws Exception {
    Path large = Files.createDirectory(folder.resolve("large one"));
    Files.createFile(large.resolve("measurement.json"));
    String report = "-XX:+PrintFlagsFinal -XX:+UseSerialGC -XX:+UnlockDiagnosticVMOptions";
    String quick = "TieredStopAtLevel                        = 1 ";
    String directed = "compilers.json";
    String program = launcher(BUILT).toString();
    Map<String, String> options = Map.of("CROSSREACH_JAVA_OPTS", report + " -XX:+DisplayVMOutput");
    String small = start(folder, options, program, "check", large.toString()).out();
    assertTrue(small.contains(quick) && !small.contains(directed), small);
    String few = start(folder, options, program, "archive", large.toString()).out();
    assertTrue(few.contains(quick) && !few.contains(directed), few);
    Path list = Files.write(folder.resolve("list"), Collections.nCopies(300, large.toString()));
    String from = "--from=" + list;
    String many = start(folder, options, program, "archive", from).out();
    assertFalse(many.contains(directed) || many.contains(quick), many);
    String twice = "--write";
    Ended tables = start(folder, options, program, "archive", from, twice, "json", twice, "csv");
    assertTrue(tables.out().contains(quick) && !tables.out().contains(directed), tables.out());
    assertFalse(tables.err().contains(program + ": "), tables.err());
    Files.write(large.resolve("pass-01.csv"), new byte[21_000_000]);
    String much = start(folder, options, program, "check", large.toString()).out();
    assertTrue(much.contains(directed) && !much.contains(quick), much);
  }

  @Test
  void saysNothingOfCompilersInAResult() throws Exception {
    Path copy = folder.resolve("much of it");
    Files.createDirectory(copy);
    try (Stream<Path> files = Files.list(EXAMPLE)) {
      for (Path file : files.toList()) {
        Files.copy(file, copy.resolve(file.getFileName()));
      }
    }
    Files.write(copy.resolve("ballast"), new byte[21_000_000]);
    assertReduced(
        start(folder, Map.of(), launcher(BUILT).toString(), "reduce", copy.toString(), "--json"));
  }

  @Test
  void readsNamesThatAreNotAsciiWithoutALocale() throws Exception {
    Path script = folder.resolve("script");
    Files.writeString(
        script,
        "cp -r '%s' 'Fluß-Übergang' && '%s' reduce 'Fluß-Übergang' --json"
            .formatted(EXAMPLE, launcher(BUILT)));
    assertReduced(
        start(folder, Map.of("LC_ALL", "", "LC_CTYPE", "", "LANG", ""), "sh", script.toString()));
  }

  @Test
  void archivesNamesThatAreNotAsciiUnderALocaleThatIsNotInstalled() throws Exception {
    Path script = folder.resolve("script");
    Files.writeString(
        script,
        "mkdir tree && cp -r '%s' 'tree/Fluß-Übergang' && '%s' archive tree --out kept --write json"
            .formatted(EXAMPLE, launcher(BUILT)));
    Map<String, String> locale = Map.of("LC_ALL", "xx_XX.UTF-8");
    Ended ended = start(folder, locale, "sh", script.toString());
    assertEquals("1 done, 0 unchanged, 0 failed; 2 passes in kept\n", ended.out(), ended.err());
  }

  @Test
  void isQuietWhenTheReaderHasGone() throws Exception {
    Ended ended =
        start(
            folder,
            Map.of(),
            "sh",
            "-c",
            "'" + launcher(BUILT) + "' reduce '" + EXAMPLE + "' --json | head -n 1");
    assertEquals("{\n", ended.out());
    assertEquals("", ended.err());
  }

  @Test
  void tellsOfAFullDisk() throws Exception {
    assumeTrue(Files.exists(Path.of("/dev/full")));
    Ended ended =
        start(folder, Map.of(), "sh", "-c", "'" + launcher(BUILT) + "' --help >/dev/full");
    assertTrue(ended.err().startsWith("crossreach: cannot write standard output: "), ended.err());
    assertEquals(ExitCode.CANNOT_WRITE, ended.code());
  }

  @Test
  void passesTheExitCodeOn() throws Exception {
    assertEquals(
        ExitCode.WRONG_USAGE, start(folder, Map.of(), launcher(BUILT).toString(), "reduc").code());
    assertEquals(
        ExitCode.UNREADABLE_INPUT,
        start(folder, Map.of(), launcher(BUILT).toString(), "reduce", "nowhere").code());
  }
}
