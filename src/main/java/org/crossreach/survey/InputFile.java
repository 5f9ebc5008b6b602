package org.crossreach.survey;

/**
 * A file that was read.
 *
 * @param file its path relative to the measurement's folder, with forward slashes
 * @param bytes its size as stored
 * @param sha256 SHA-256 of its bytes as stored, 64 lower-case hexadecimal digits
 */
public record InputFile(String file, long bytes, String sha256) {}
