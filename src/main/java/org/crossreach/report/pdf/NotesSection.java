package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.survey.Note;

/** What is to be said: the program's notes and the party's remarks. */
final class NotesSection implements TransectSection, MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    List<Note> notes = new ArrayList<>(pass.pass().notes());
    notes.addAll(pass.notes());
    return blocks(subject, notes, pass.pass().note());
  }

  @Override
  public List<Block> blocks(Subject subject) {
    return blocks(subject, subject.result().summary().notes(), subject.measurement().remarks());
  }

  private static List<Block> blocks(Subject subject, List<Note> notes, String remark) {
    PageStyle style = subject.style();
    List<Block> blocks = new ArrayList<>();
    blocks.add(style.section("Notes"));
    if (!remark.isBlank()) {
      blocks.add(Text.paragraph(style.remark(), "Remark of the party: " + remark));
      blocks.add(new Gap(2));
    }
    if (notes.isEmpty()) {
      blocks.add(Text.paragraph(style.body(), "The program has nothing to note."));
      return blocks;
    }
    Table table =
        new Table(
            style.tables(),
            List.of(
                Table.Heading.words("Level"),
                Table.Heading.words("About"),
                Table.Heading.prose("Note")));
    for (Note note : notes) {
      table.row(level(note.level()), note.code().replace('-', ' '), note.text());
    }
    blocks.add(table);
    return blocks;
  }

  /** Faults stand out by a sign, not by colour. */
  private static String level(Note.Level level) {
    String word = level.name().toLowerCase(Locale.ROOT);
    return switch (level) {
      case NOTE -> word;
      case CAUTION -> "! " + word;
      case FAULT -> "!! " + word;
    };
  }
}
