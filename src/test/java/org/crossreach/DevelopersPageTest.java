package org.crossreach;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** DEVELOPERS.md speaks of the code as it is: its classes, packages and lines exist. */
class DevelopersPageTest {

  private static final Path MAIN = Path.of("src", "main", "java", "org", "crossreach");

  private static String page() throws IOException {
    return Files.readString(Path.of("DEVELOPERS.md"));
  }

  private static Stream<Path> sources() throws IOException {
    return Files.walk(Path.of("src")).filter(file -> file.toString().endsWith(".java"));
  }

  @Test
  void theMapHasEveryPackage() throws IOException {
    Set<String> packages;
    try (Stream<Path> entries = Files.list(MAIN)) {
      packages =
          entries
              .filter(Files::isDirectory)
              .map(each -> each.getFileName().toString())
              .collect(Collectors.toCollection(TreeSet::new));
    }
    Set<String> listed = new TreeSet<>();
    Matcher rows = Pattern.compile("(?m)^\\| `([a-z]+)` \\| .* \\| `[A-Z].*`").matcher(page());
    while (rows.find()) {
      listed.add(rows.group(1));
    }
    assertEquals(packages, listed);
  }

  @Test
  void everyClassThatIsNamedExists() throws IOException {
    Set<String> known;
    try (Stream<Path> files = sources()) {
      known =
          files
              .map(each -> each.getFileName().toString().replace(".java", ""))
              .collect(Collectors.toSet());
    }
    known.addAll(Set.of("IllegalArgumentException", "IOException", "String"));
    Matcher names = Pattern.compile("`([A-Z][a-z]+[A-Za-z]*)(?:\\.[A-Za-z]+)?`").matcher(page());
    int count = 0;
    while (names.find()) {
      count++;
      if (!names.group(1).equals("ThingTest") && !names.group(1).equals("Thing")) {
        assertTrue(known.contains(names.group(1)), "there is no " + names.group(1));
      }
    }
    assertTrue(count > 40, count + " names");
  }

  @Test
  void theLinesOfRegistrationStandInTheCode() throws IOException {
    String code;
    try (Stream<Path> files = Files.walk(MAIN)) {
      code =
          files
              .filter(Files::isRegularFile)
              .map(DevelopersPageTest::text)
              .collect(Collectors.joining());
    }
    for (String line :
        Set.of(
            "case THREE_POINT -> new ThreePointLaw();",
            "fixed(\"temperature_degc\", EnsembleQuantity.TEMPERATURE_DEGC);",
            "new CautionsSection(),")) {
      assertTrue(page().contains(line), line);
      assertTrue(code.contains(line), line);
    }
  }

  private static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  @Test
  void everyLinkLeadsSomewhere() throws IOException {
    Set<Path> pages = new TreeSet<>(Set.of(Path.of("DEVELOPERS.md"), Path.of("README.md")));
    try (var formats = Files.newDirectoryStream(Path.of("formats"), "*.md")) {
      formats.forEach(pages::add);
    }
    for (Path page : pages) {
      Matcher links = Pattern.compile("\\]\\(([^)#:]+)\\)").matcher(Files.readString(page));
      while (links.find()) {
        assertTrue(
            Files.exists(page.resolveSibling(links.group(1))),
            page + " links to " + links.group(1));
      }
    }
  }
}
