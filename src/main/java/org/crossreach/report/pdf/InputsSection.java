package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.survey.InputFile;

/** The files that the result was made from, and those that go with it, with their hashes. */
final class InputsSection implements TransectSection, MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    List<InputFile> inputs = new ArrayList<>();
    List<String> others =
        subject.measurement().passes().stream()
            .map(each -> each.file())
            .filter(file -> !file.equals(pass.pass().file()))
            .toList();
    for (InputFile input : subject.measurement().inputs()) {
      if (!others.contains(input.file())) {
        inputs.add(input);
      }
    }
    return blocks(subject, inputs);
  }

  @Override
  public List<Block> blocks(Subject subject) {
    return blocks(subject, subject.measurement().inputs());
  }

  private static List<Block> blocks(Subject subject, List<InputFile> inputs) {
    PageStyle style = subject.style();
    Table table =
        new Table(
            style.tables(),
            List.of(
                Table.Heading.words("File"),
                Table.Heading.words("Where"),
                Table.Heading.prose("SHA-256")));
    for (InputFile input : inputs) {
      table.row(input.file(), "input", input.sha256());
    }
    for (Packed file : subject.attachments().inside()) {
      table.row(file.attachment().name(), "inside this PDF", file.sha256());
    }
    for (Packed file : subject.attachments().beside()) {
      table.row(file.attachment().name(), "too large to be inside", file.sha256());
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(style.section("Files"));
    if (!table.isEmpty()) {
      blocks.add(table);
      blocks.add(new Gap(3));
    }
    blocks.add(Text.paragraph(style.body(), "Reduced by " + Subject.program() + "."));
    return blocks;
  }
}
