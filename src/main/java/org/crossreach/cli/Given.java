package org.crossreach.cli;

import picocli.CommandLine.Model.ArgSpec;

/**
 * What a person gave for an option or an operand, once the command line is read.
 *
 * @param <T> the type of what is given
 */
final class Given<T> {

  private final ArgSpec word;
  private final T otherwise;

  Given(ArgSpec word, T otherwise) {
    this.word = word;
    this.otherwise = otherwise;
  }

  /** What was given, or else what holds where nothing is; that may be null. */
  T value() {
    T given = word.getValue();
    return given == null ? otherwise : given;
  }
}
