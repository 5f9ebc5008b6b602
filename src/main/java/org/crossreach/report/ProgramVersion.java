package org.crossreach.report;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import org.crossreach.notation.JsonText;

/** The name and version of the program, as every result gives them. */
public final class ProgramVersion {

  /** Name of the program. */
  public static final String NAME = "crossreach";

  private static final String RESOURCE = "version.txt";

  private ProgramVersion() {}

  /**
   * The version of this build, for example {@code 1.2.0}.
   *
   * @throws IllegalStateException when the build left the version out
   */
  public static String read() {
    try (InputStream stream = ProgramVersion.class.getResourceAsStream(RESOURCE)) {
      if (stream == null) {
        throw new IllegalStateException("this build has no " + RESOURCE);
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8).strip();
    } catch (IOException unreadable) {
      throw new IllegalStateException("this build has no readable " + RESOURCE, unreadable);
    }
  }

  /** Writes the member {@code program} of a file of ours, with a version of the program. */
  public static void write(String version, JsonText json) throws IOException {
    json.object(
        "program",
        () -> {
          json.text("name", NAME);
          json.text("version", version);
        });
  }
}
