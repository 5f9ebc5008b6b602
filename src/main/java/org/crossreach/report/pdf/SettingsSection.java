package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.screen.FoundLimit;
import org.crossreach.settings.Limit;

/** Every choice by which the measurement was reduced. */
final class SettingsSection implements TransectSection, MeasurementSection {

  private static final int COLUMNS = 3;

  @Override
  public List<Block> blocks(Subject subject, PassDischarge pass) {
    return blocks(subject, pass.section().pass().accounting().limits());
  }

  @Override
  public List<Block> blocks(Subject subject) {
    return blocks(subject, List.of());
  }

  /** A limit that was found in the pass stands beside the choice that asked for it. */
  private static List<Block> blocks(Subject subject, List<FoundLimit> limits) {
    PageStyle style = subject.style();
    Facts facts = Facts.inLine(style.label(), style.body(), COLUMNS);
    for (SettingRows.Row row : SettingRows.of(subject.result().reduction().settings())) {
      facts.add(row.key(), row.value() + found(row.key(), limits));
    }
    List<Block> blocks = new ArrayList<>();
    blocks.add(style.section("Effective settings"));
    blocks.add(facts);
    return blocks;
  }

  private static String found(String key, List<FoundLimit> limits) {
    for (FoundLimit limit : limits) {
      boolean same = key.equals("screening." + limit.criterion().key());
      if (same && limit.kind() == Limit.Kind.AUTO && Double.isFinite(limit.value())) {
        return " (" + Plain.number(limit.value()) + ")";
      }
    }
    return "";
  }
}
