package org.crossreach.report.pdf;

import java.time.OffsetDateTime;

/**
 * What a PDF says about itself.
 *
 * @param title its title
 * @param description what it is about
 * @param creator the program with its version
 * @param time when the last of its data was recorded; there is no other clock
 * @param fingerprint tells this document from others: the same for the same inputs, choices and
 *     version
 */
record Imprint(
    String title, String description, String creator, OffsetDateTime time, String fingerprint) {}
