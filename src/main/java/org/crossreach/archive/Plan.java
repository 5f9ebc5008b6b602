package org.crossreach.archive;

import java.nio.file.Path;
import java.util.Collections;
import java.util.Set;
import java.util.TreeSet;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.report.FileKind;
import org.crossreach.report.Units;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;

/**
 * What an archive run is to make.
 *
 * @param target folder of the archive
 * @param kinds kinds of files for each measurement; the result JSON always comes with them
 * @param units units of what people read
 * @param jobs number of measurements that are worked on side by side
 * @param overriding choices for all measurements in place of their own, as JSON with the keys of
 *     {@code settings.json}; empty for none
 */
public record Plan(Path target, Set<FileKind> kinds, Units units, int jobs, String overriding) {

  public Plan {
    Set<FileKind> all = new TreeSet<>(kinds);
    all.add(FileKind.JSON);
    kinds = Collections.unmodifiableSet(all);
    if (jobs < 1) {
      throw new IllegalArgumentException("jobs must be at least 1, not " + jobs);
    }
  }

  /** The kinds as one text, for example {@code json,csv,pdf}. */
  String kindKeys() {
    return String.join(",", kinds.stream().map(FileKind::key).toList());
  }

  /** Settings with the overriding choices in place of their own. */
  Settings over(Settings settings) throws UnusableInput {
    return overriding.isEmpty()
        ? settings
        : SettingsFile.parse(overriding, "command line", settings);
  }
}
