package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** The page on screening lists every reason, every limit and every note, and none that is not. */
class ScreeningPageTest {

  @Test
  void listsEveryReason() throws Exception {
    Set<String> reasons = new TreeSet<>();
    for (Reason reason : Reason.values()) {
      reasons.add(reason.key());
    }
    assertEquals(reasons, listed("## Reasons"));
  }

  @Test
  void listsEveryLimit() throws Exception {
    Set<String> limits = new TreeSet<>();
    for (Criterion criterion : Criterion.values()) {
      limits.add(criterion.key());
    }
    assertEquals(limits, listed("## Screens and their limits"));
  }

  @Test
  void listsEveryNote() throws Exception {
    Pattern code = Pattern.compile("\"([a-z]+(?:-[a-z]+)+)\",");
    Set<String> codes = new TreeSet<>();
    for (String source : new String[] {"ScreenNotes", "SoundSpeedScreen"}) {
      Matcher matcher =
          code.matcher(
              Files.readString(Path.of("src/main/java/org/crossreach/screen/" + source + ".java")));
      while (matcher.find()) {
        codes.add(matcher.group(1));
      }
    }
    codes.add("tilt");
    codes.add("excluded");
    assertTrue(codes.size() > 10);
    assertEquals(codes, listed("## Notes"));
  }

  /** First column of the table under a heading. */
  private static Set<String> listed(String heading) throws Exception {
    String page = Files.readString(Path.of("formats/screening.md"));
    int from = page.indexOf(heading);
    int to = page.indexOf("\n## ", from + 1);
    Matcher row =
        Pattern.compile("(?m)^\\| `([^`]+)`")
            .matcher(page.substring(from, to < 0 ? page.length() : to));
    Set<String> keys = new TreeSet<>();
    while (row.find()) {
      keys.add(row.group(1));
    }
    return keys;
  }
}
