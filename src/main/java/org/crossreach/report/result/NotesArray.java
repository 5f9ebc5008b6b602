package org.crossreach.report.result;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import org.crossreach.notation.JsonText;
import org.crossreach.survey.Note;

/** Notes as an array of objects. */
final class NotesArray {

  private NotesArray() {}

  static void write(List<Note> notes, JsonText json) throws IOException {
    json.objects(
        "notes",
        notes,
        (Note note) -> {
          json.text("level", note.level().name().toLowerCase(Locale.ROOT));
          json.text("code", note.code());
          json.text("text", note.text());
        });
  }
}
