package org.crossreach.cli;

import java.io.PrintWriter;
import java.io.Writer;

/**
 * Runs the everyday commands once, for the virtual machine to note the classes that a start needs;
 * the launcher keeps them in an archive.
 */
final class Rehearsal {

  private Rehearsal() {}

  /**
   * Runs the commands on a sample and throws away what they print.
   *
   * @param words the folder of the sample
   */
  public static void main(String[] words) {
    String sample = words[0];
    rehearse("--help");
    rehearse("reduce", sample);
    rehearse("reduce", sample, "--json");
    rehearse("check", sample);
    rehearse("check", sample, "--json");
    rehearse("compare", sample);
  }

  private static void rehearse(String... words) {
    PrintWriter nowhere = new PrintWriter(Writer.nullWriter());
    int code = Crossreach.run(words, nowhere, nowhere);
    if (code > ExitCode.FAULTS_FOUND) {
      throw new IllegalStateException(
          "crossreach " + String.join(" ", words) + " ended with " + code);
    }
  }
}
