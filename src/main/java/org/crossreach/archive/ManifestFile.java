package org.crossreach.archive;

import org.crossreach.notation.JsonText;
import org.crossreach.report.OutputFolder;

/** A manifest as a file. */
final class ManifestFile {

  private ManifestFile() {}

  static OutputFolder.Product of(Manifest manifest) {
    return target -> {
      try (JsonText json = new JsonText(target)) {
        manifest.write(json);
      }
    };
  }
}
