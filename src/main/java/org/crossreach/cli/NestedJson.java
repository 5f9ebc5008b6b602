package org.crossreach.cli;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.util.LinkedHashMap;
import java.util.Map;

/** JSON out of keys with dots: {@code depth.source=vertical} is an object in an object. */
final class NestedJson {

  private NestedJson() {}

  /**
   * The object in which each value stands under its key.
   *
   * @param values numbers, {@code true}, {@code false} and arrays or objects are taken as they are,
   *     anything else is a text
   */
  static String of(Map<String, String> values) {
    Map<String, Object> tree = new LinkedHashMap<>();
    values.forEach((key, value) -> put(tree, key, value));
    StringBuilder json = new StringBuilder();
    append(tree, json);
    return json.toString();
  }

  @SuppressWarnings("unchecked")
  private static void put(Map<String, Object> tree, String key, String value) {
    int dot = key.indexOf('.');
    if (dot < 0) {
      tree.put(key, value);
      return;
    }
    String outer = key.substring(0, dot);
    if (!(tree.get(outer) instanceof Map)) {
      tree.put(outer, new LinkedHashMap<String, Object>());
    }
    put((Map<String, Object>) tree.get(outer), key.substring(dot + 1), value);
  }

  private static void append(Object value, StringBuilder json) {
    if (value instanceof Map<?, ?> members) {
      String separator = "{";
      for (Map.Entry<?, ?> member : members.entrySet()) {
        json.append(separator);
        appendText(member.getKey().toString(), json);
        json.append(':');
        append(member.getValue(), json);
        separator = ",";
      }
      json.append('}');
    } else if (isLiteral(value.toString())) {
      json.append(value);
    } else {
      appendText(value.toString(), json);
    }
  }

  private static void appendText(String text, StringBuilder json) {
    json.append('"').append(JsonStringEncoder.getInstance().quoteAsString(text)).append('"');
  }

  private static boolean isLiteral(String text) {
    if (text.equals("true")
        || text.equals("false")
        || text.startsWith("[")
        || text.startsWith("{")) {
      return true;
    }
    try {
      return Double.isFinite(Double.parseDouble(text))
          && "-0123456789".indexOf(text.charAt(0)) >= 0
          && Character.isDigit(text.charAt(text.length() - 1));
    } catch (NumberFormatException notANumber) {
      return false;
    }
  }
}
