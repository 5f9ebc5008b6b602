package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/**
 * What a process did.
 *
 * @param code its exit code
 * @param out what it wrote to standard output
 * @param err what it wrote to standard error
 */
record Ended(int code, String out, String err) {

  /**
   * Runs a process to its end.
   *
   * @param folder where it starts, and where what it writes is caught
   * @param environment variables beside the inherited ones; empty text takes one away
   * @param words the program and its arguments
   */
  static Ended of(Path folder, Map<String, String> environment, String... words)
      throws IOException, InterruptedException {
    Path out = Files.createTempFile(folder, "out", "");
    Path err = Files.createTempFile(folder, "err", "");
    ProcessBuilder builder =
        new ProcessBuilder(words)
            .directory(folder.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile());
    builder.environment().keySet().removeIf(name -> name.startsWith("CROSSREACH"));
    builder.environment().putAll(environment);
    builder.environment().values().removeIf(String::isEmpty);
    int code = builder.start().waitFor();
    return new Ended(code, Files.readString(out), Files.readString(err));
  }
}
