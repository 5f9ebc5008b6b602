package org.crossreach.ingest;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the name that somebody probably meant. */
final class NearestName {

  /** Longest text that is compared; longer ones are no slip of a name. */
  private static final int LONGEST = 80;

  private static final int SHORTEST_START = 4;

  private NearestName() {}

  /**
   * The valid name with the fewest changes from a text, if it is near enough.
   *
   * <p>A change is an inserted, deleted or replaced character or two exchanged neighbours; letter
   * case does not count. Near enough is one change in every three characters of the text. Of
   * equally near names the first is taken. Where none is near enough, a text of at least {@value
   * #SHORTEST_START} characters stands for the first name that starts with it, as when the unit was
   * forgotten.
   */
  static Optional<String> find(String text, Collection<String> valid) {
    if (text.isBlank() || text.length() > LONGEST) {
      return Optional.empty();
    }
    String wanted = text.strip().toLowerCase(Locale.ROOT);
    String nearest = null;
    int fewest = Math.max(1, wanted.length() / 3) + 1;
    for (String name : valid) {
      int changes = changes(wanted, name.toLowerCase(Locale.ROOT));
      if (changes < fewest) {
        fewest = changes;
        nearest = name;
      }
    }
    for (String name : valid) {
      if (nearest == null && wanted.length() >= SHORTEST_START && name.startsWith(wanted)) {
        nearest = name;
      }
    }
    return Optional.ofNullable(nearest);
  }

  /**
   * Distance in the sense of Damerau 1964 and Levenshtein 1966 in its restricted form (no piece is
   * changed twice).
   */
  private static int changes(String from, String to) {
    int[][] distance = new int[from.length() + 1][to.length() + 1];
    for (int i = 0; i <= from.length(); i++) {
      for (int j = 0; j <= to.length(); j++) {
        if (i == 0 || j == 0) {
          distance[i][j] = i + j;
          continue;
        }
        int replace = from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1;
        int best =
            Math.min(
                distance[i - 1][j - 1] + replace,
                1 + Math.min(distance[i - 1][j], distance[i][j - 1]));
        if (i > 1
            && j > 1
            && from.charAt(i - 1) == to.charAt(j - 2)
            && from.charAt(i - 2) == to.charAt(j - 1)) {
          best = Math.min(best, distance[i - 2][j - 2] + 1);
        }
        distance[i][j] = best;
      }
    }
    return distance[from.length()][to.length()];
  }
}
