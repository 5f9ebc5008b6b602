package org.crossreach.report.chart;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Lets the graphics system start on a machine that has neither a display nor any font.
 *
 * <p>It has to happen before the first use of the graphics system in the process; what somebody has
 * set before is left as it is.
 */
final class FontlessMachine {

  private static Path folder;

  private FontlessMachine() {}

  /**
   * Points the graphics system at a folder of our own.
   *
   * @return the folder, in which faces are to be laid; it goes when the process ends
   * @throws UncheckedIOException when the folder for temporary files cannot be written
   */
  static synchronized Path prepare() {
    if (folder != null) {
      return folder;
    }
    try {
      folder = Files.createTempDirectory("crossreach-fonts");
      folder.toFile().deleteOnExit();
      Path configuration = folder.resolve("fontconfig.properties");
      Files.writeString(configuration, "version=1\nsequence.allfonts=default\n");
      configuration.toFile().deleteOnExit();
      setUnlessSet("java.awt.headless", "true");
      setUnlessSet("sun.awt.fontconfig", configuration.toString());
      setUnlessSet("sun.java2d.fontpath", folder.toString());
      return folder;
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  private static void setUnlessSet(String property, String value) {
    if (System.getProperty(property) == null) {
      System.setProperty(property, value);
    }
  }
}
