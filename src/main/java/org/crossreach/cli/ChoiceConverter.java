package org.crossreach.cli;

import org.crossreach.settings.Choice;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * Reads a {@link Choice} by its key, and lists the keys there are when it is none of them.
 *
 * @param <E> the options to choose from
 */
final class ChoiceConverter<E extends Enum<E> & Choice> implements ITypeConverter<E> {

  private final Class<E> options;

  ChoiceConverter(Class<E> options) {
    this.options = options;
  }

  @Override
  public E convert(String key) {
    return Choice.find(options, key)
        .orElseThrow(
            () ->
                new TypeConversionException(
                    "found \""
                        + key
                        + "\", expected "
                        + String.join(" or ", Choice.keys(options))));
  }
}
