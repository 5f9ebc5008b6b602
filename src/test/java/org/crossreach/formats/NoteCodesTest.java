package org.crossreach.formats;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every code that a note can carry is explained on a page. */
class NoteCodesTest {

  private static final Path SOURCES = Path.of("src", "main", "java", "org", "crossreach");

  /** A level, or the list that notes are added to, and then the code. */
  private static final Pattern CODE =
      Pattern.compile("(?:Level\\.\\w+|add\\(\\s*notes|level),\\s*\"([a-z]+(?:-[a-z]+)*)\"");

  @Test
  void everyCodeIsExplained() throws Exception {
    Set<String> codes = new TreeSet<>();
    try (Stream<Path> files = Files.walk(SOURCES)) {
      for (Path file : files.filter(each -> each.toString().endsWith(".java")).toList()) {
        String text = Format.text(file);
        if (text.contains("survey.Note;")) {
          CODE.matcher(text).results().forEach(match -> codes.add(match.group(1)));
        }
      }
    }
    assertTrue(codes.size() > 15, codes.toString());
    String pages = Format.text("result.md") + Format.text("screening.md");
    for (String code : codes) {
      assertTrue(pages.contains("| `" + code + "` |"), "no page explains the note " + code);
    }
  }
}
