package org.crossreach.archive;

import java.nio.file.Path;

/**
 * A measurement that was found.
 *
 * @param folder its folder
 * @param place where its results go below the target, with forward slashes; unique in a run
 */
public record Found(Path folder, String place) {}
