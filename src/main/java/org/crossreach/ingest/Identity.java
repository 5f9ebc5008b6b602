package org.crossreach.ingest;

/** The name of a measurement, which names its files and folders too. */
public final class Identity {

  private static final int LONGEST = 100;

  private Identity() {}

  /**
   * Reads a required name; a problem when it cannot be the name of a file.
   *
   * @param fields where it stands
   * @param key its key
   */
  public static String of(JsonFields fields, String key) {
    String identity = fields.text(key);
    if (fields.has(key) && !isIdentity(identity)) {
      fields.refuse(
          key,
          Quoted.of(identity),
          "letters, digits, hyphens, points and underscores, the first one a letter or digit",
          "");
    }
    return identity;
  }

  private static boolean isIdentity(String text) {
    if (text.isEmpty() || text.length() > LONGEST || !Character.isLetterOrDigit(text.charAt(0))) {
      return false;
    }
    for (int i = 0; i < text.length(); i++) {
      char character = text.charAt(i);
      if (!Character.isLetterOrDigit(character) && "-._".indexOf(character) < 0) {
        return false;
      }
    }
    return true;
  }
}
