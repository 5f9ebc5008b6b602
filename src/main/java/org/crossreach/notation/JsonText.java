package org.crossreach.notation;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.OutputStream;
import java.util.List;

/**
 * Writes JSON that reads back as the same values: indented by two blanks, lines end with LF, a
 * number that is not finite is {@code null}, doubles have the fewest digits that tell them apart.
 */
public final class JsonText implements AutoCloseable {

  private final JsonGenerator json;

  /** Something that writes members or elements. */
  public interface Content {
    void write() throws IOException;
  }

  /** Something that writes one element. */
  public interface Element<T> {
    void write(T element) throws IOException;
  }

  /**
   * Opens the text.
   *
   * @param target receives UTF-8; it is left open
   */
  public JsonText(OutputStream target) throws IOException {
    DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
    json =
        JsonFactory.builder()
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .disable(StreamWriteFeature.AUTO_CLOSE_TARGET)
            .build()
            .createGenerator(target)
            .setPrettyPrinter(
                new DefaultPrettyPrinter(
                        Separators.createDefaultInstance()
                            .withObjectFieldValueSpacing(Separators.Spacing.AFTER))
                    .withObjectIndenter(indenter)
                    .withArrayIndenter(indenter));
  }

  /** The outermost object, or an object in an array. */
  public void object(Content members) throws IOException {
    json.writeStartObject();
    members.write();
    json.writeEndObject();
  }

  /** An object as a member. */
  public void object(String name, Content members) throws IOException {
    json.writeFieldName(name);
    object(members);
  }

  /** An array of objects as a member. */
  public <T> void objects(String name, Iterable<T> elements, Element<T> members)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (T element : elements) {
      object(() -> members.write(element));
    }
    json.writeEndArray();
  }

  /** An array of numbers as a member. */
  public void numbers(String name, double... values) throws IOException {
    json.writeArrayFieldStart(name);
    for (double value : values) {
      number(value);
    }
    json.writeEndArray();
  }

  /** An array of texts as a member. */
  public void texts(String name, List<String> values) throws IOException {
    json.writeArrayFieldStart(name);
    for (String value : values) {
      json.writeString(value);
    }
    json.writeEndArray();
  }

  /** A text as a member. */
  public void text(String name, String value) throws IOException {
    json.writeStringField(name, value);
  }

  /** A truth value as a member. */
  public void flag(String name, boolean value) throws IOException {
    json.writeBooleanField(name, value);
  }

  /** A whole number as a member. */
  public void whole(String name, long value) throws IOException {
    json.writeNumberField(name, value);
  }

  /** A number as a member, {@code null} when it is not finite. */
  public void number(String name, double value) throws IOException {
    json.writeFieldName(name);
    number(value);
  }

  /** Nothing as a member. */
  public void nothing(String name) throws IOException {
    json.writeNullField(name);
  }

  private void number(double value) throws IOException {
    if (Double.isFinite(value)) {
      json.writeNumber(value + 0.0); // -0.0 becomes 0.0
    } else {
      json.writeNull();
    }
  }

  @Override
  public void close() throws IOException {
    json.writeRaw('\n');
    json.close();
  }
}
