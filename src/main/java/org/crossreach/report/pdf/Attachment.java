package org.crossreach.report.pdf;

/**
 * A file that travels inside the PDF.
 *
 * @param name its name, without folder
 * @param mediaType its type, for example {@code application/json}
 * @param relation what it is to the pages
 * @param description one phrase for a person
 * @param bytes its bytes; must not be changed afterwards
 */
public record Attachment(
    String name, String mediaType, Relation relation, String description, byte[] bytes) {

  /** What an attachment is to the pages, in the words of PDF/A-3. */
  public enum Relation {
    /** What the pages were made from. */
    SOURCE("Source"),
    /** The figures that the pages show. */
    DATA("Data"),
    /** Something beside the pages. */
    SUPPLEMENT("Supplement");

    private final String key;

    Relation(String key) {
      this.key = key;
    }

    String key() {
      return key;
    }
  }
}
