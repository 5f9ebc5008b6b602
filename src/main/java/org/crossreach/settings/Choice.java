package org.crossreach.settings;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * A choice among named options; the key is its name in files, on the command line and in results.
 */
public interface Choice {

  /** Name of the option, lower case with hyphens, for example {@code section-normal}. */
  String key();

  /** Finds an option by its key, empty when there is none. */
  static <E extends Enum<E> & Choice> Optional<E> find(Class<E> options, String key) {
    return Arrays.stream(options.getEnumConstants())
        .filter(option -> option.key().equals(key))
        .findFirst();
  }

  /** The keys of all options, in order. */
  static <E extends Enum<E> & Choice> List<String> keys(Class<E> options) {
    return Arrays.stream(options.getEnumConstants()).map(Choice::key).toList();
  }
}
