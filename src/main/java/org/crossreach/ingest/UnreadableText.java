package org.crossreach.ingest;

import java.io.IOException;

/**
 * Says that the bytes of a file are not the text they should be, so that reading cannot go on.
 *
 * <p>Travels through the CSV library to {@link EnsembleCsv}, which makes a problem of it and adds
 * the line; nobody outside the package sees it.
 */
final class UnreadableText extends IOException {

  private static final long serialVersionUID = 1L;

  private final String found;
  private final String expected;
  private final String remedy;

  UnreadableText(String found, String expected, String remedy) {
    super(found);
    this.found = found;
    this.expected = expected;
    this.remedy = remedy;
  }

  String found() {
    return found;
  }

  String expected() {
    return expected;
  }

  String remedy() {
    return remedy;
  }
}
