package org.crossreach.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.IFactory;

/**
 * Makes what repeated options are collected in. The library's own factory would look through every
 * jar for a class that is not there, at every start.
 */
final class Collected implements IFactory {

  @Override
  public <K> K create(Class<K> type) {
    if (type == List.class) {
      return type.cast(new ArrayList<>());
    }
    if (type == Map.class) {
      return type.cast(new LinkedHashMap<>());
    }
    throw new IllegalArgumentException("no option is collected in a " + type.getName());
  }
}
