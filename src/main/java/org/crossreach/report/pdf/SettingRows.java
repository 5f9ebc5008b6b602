package org.crossreach.report.pdf;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.report.Decimals;
import org.crossreach.report.SettingsJson;
import org.crossreach.settings.Settings;

/**
 * The settings as keys and values, under the keys of {@code settings.json}: a choice that is added
 * to that file appears here without a further line.
 */
final class SettingRows {

  private SettingRows() {}

  /**
   * One choice.
   *
   * @param key its path, for example {@code screening.minimum_cells}
   * @param value what was chosen, as the file has it
   */
  record Row(String key, String value) {}

  static List<Row> of(Settings settings) {
    ByteArrayOutputStream json = new ByteArrayOutputStream();
    try {
      SettingsJson.write(settings, json);
      try (JsonParser parser = new JsonFactory().createParser(json.toByteArray())) {
        return rows(parser);
      }
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }

  private static List<Row> rows(JsonParser parser) throws IOException {
    List<Row> rows = new ArrayList<>();
    for (JsonToken token = parser.nextToken(); token != null; token = parser.nextToken()) {
      if (token.isScalarValue()) {
        String key = key(parser);
        if (!key.equals("format")) {
          rows.add(new Row(key, value(parser)));
        }
      } else if (token == JsonToken.END_ARRAY && parser.getParsingContext().inObject()) {
        boolean empty = rows.isEmpty() || !rows.get(rows.size() - 1).key().startsWith(key(parser));
        if (empty) {
          rows.add(new Row(key(parser), "none"));
        }
      }
    }
    return rows;
  }

  /** The path in the file, for example screening.exclusions.0.pass. */
  private static String key(JsonParser parser) {
    return parser.getParsingContext().pathAsPointer().toString().substring(1).replace('/', '.');
  }

  private static String value(JsonParser parser) throws IOException {
    return switch (parser.currentToken()) {
      case VALUE_NULL -> Decimals.NONE;
      case VALUE_TRUE -> "yes";
      case VALUE_FALSE -> "no";
      case VALUE_NUMBER_FLOAT -> Plain.number(parser.getDoubleValue());
      default -> parser.getText();
    };
  }
}
