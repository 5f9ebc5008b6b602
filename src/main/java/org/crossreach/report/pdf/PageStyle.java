package org.crossreach.report.pdf;

import org.crossreach.report.chart.ChartStyle;
import org.crossreach.report.chart.Face;

/**
 * The inks of the pages, drawn from the style of the pictures.
 *
 * @param chart colours, and the style of the pictures
 * @param title title of the document
 * @param subtitle the line under it
 * @param result the number that everything is about
 * @param unit its unit
 * @param heading headings of sections
 * @param caption titles of pictures
 * @param body running text
 * @param strong running text that matters
 * @param label labels of facts
 * @param remark remarks
 * @param foot foot of the page
 */
record PageStyle(
    ChartStyle chart,
    Ink title,
    Ink subtitle,
    Ink result,
    Ink unit,
    Ink heading,
    Ink caption,
    Ink body,
    Ink strong,
    Ink label,
    Ink remark,
    Ink foot) {

  static PageStyle standard() {
    ChartStyle chart = ChartStyle.standard();
    return new PageStyle(
        chart,
        /* title= */ new Ink(Face.MEDIUM, 17, chart.ink()),
        /* subtitle= */ new Ink(Face.REGULAR, 9.5, chart.quiet()),
        /* result= */ new Ink(Face.MEDIUM, 25, chart.deep()),
        /* unit= */ new Ink(Face.REGULAR, 13, chart.deep()),
        /* heading= */ new Ink(Face.MEDIUM, 9.5, chart.deep()),
        /* caption= */ new Ink(Face.MEDIUM, 9, chart.ink()),
        /* body= */ new Ink(Face.REGULAR, 7.5, chart.ink()),
        /* strong= */ new Ink(Face.MEDIUM, 7.5, chart.ink()),
        /* label= */ new Ink(Face.REGULAR, 6.5, chart.quiet()),
        /* remark= */ new Ink(Face.ITALIC, 7.5, chart.quiet()),
        /* foot= */ new Ink(Face.REGULAR, 6.5, chart.quiet()));
  }

  /** How tables look. */
  Table.Look tables() {
    return new Table.Look(
        new Ink(Face.MEDIUM, 6.8, chart.quiet()), body, strong, chart.faint(), chart.quiet());
  }

  /** A heading of a section, with the room above it. */
  Stack section(String text) {
    return new Stack(java.util.List.of(new Gap(9), new Text("H2", heading, text), new Gap(2.5)));
  }
}
