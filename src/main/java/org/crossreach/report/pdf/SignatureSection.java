package org.crossreach.report.pdf;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.crossreach.discharge.PassDischarge;

/** Places to sign. */
final class SignatureSection implements TransectSection, MeasurementSection {

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    return blocks(subject);
  }

  @Override
  public List<Block> blocks(Subject subject) {
    PageStyle style = subject.style();
    Color line = style.chart().quiet();
    List<List<Block>> places = new ArrayList<>();
    for (String role : List.of("Measured by", "Reduced by", "Reviewed by")) {
      places.add(List.of(new Place(role, style.label(), line)));
    }
    return List.of(new Foot(new SideBySide(places, List.of(1.0, 1.0, 1.0), 18)));
  }

  /**
   * What belongs at the foot of the last page.
   *
   * @param places the places to sign
   */
  private record Foot(SideBySide places) implements Block {

    @Override
    public double height(double width) {
      return places.height(width);
    }

    @Override
    public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
        throws IOException {
      places.draw(sheet, parent, x, y, width);
    }

    @Override
    public boolean sinks() {
      return true;
    }
  }

  /**
   * A line to sign on.
   *
   * @param role who signs
   * @param ink how it looks
   * @param line colour of the line
   */
  private record Place(String role, Ink ink, Color line) implements Block {

    private static final double ROOM = 30;

    @Override
    public double height(double width) {
      return ROOM + 3 + ink.leading();
    }

    @Override
    public void draw(Sheet sheet, Structure.Element parent, double x, double y, double width)
        throws IOException {
      sheet.decoration(() -> sheet.line(line, 0.6, x, y + ROOM, x + width, y + ROOM));
      Text.paragraph(ink, role + ": name, date, signature")
          .draw(sheet, parent, x, y + ROOM + 3, width);
    }
  }
}
