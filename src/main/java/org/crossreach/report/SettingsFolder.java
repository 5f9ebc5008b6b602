package org.crossreach.report;

import java.io.IOException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.crossreach.settings.Settings;

/** Writes the settings of a measurement into its folder, whole or not at all. */
public final class SettingsFolder {

  private static final String FILE = "settings.json";

  private SettingsFolder() {}

  /**
   * Writes {@code settings.json}.
   *
   * @param settings the choices
   * @param folder the folder of the measurement
   * @return the path of the file
   * @throws FileSystemException when there is a file of this name that is not one of settings
   */
  public static Path write(Settings settings, Path folder) throws IOException {
    Path target = folder.resolve(FILE);
    if (Files.exists(target) && !OutputFolder.holds(target, "\"crossreach-settings/")) {
      throw new FileSystemException(
          target.toString(), null, "this file does not hold settings of crossreach; move it away");
    }
    return WholeFile.write(target, stream -> SettingsJson.write(settings, stream));
  }
}
