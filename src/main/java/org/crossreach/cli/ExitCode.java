package org.crossreach.cli;

import java.util.LinkedHashMap;
import java.util.Map;

/** What the process tells its caller when it ends. */
final class ExitCode {

  /** The work is done and nothing was found wrong. */
  static final int DONE = 0;

  /** The work is done, and the results carry at least one note of level fault. */
  static final int FAULTS_FOUND = 1;

  /** The command line was wrong; nothing was done. */
  static final int WRONG_USAGE = 2;

  /** An input could not be read or used; nothing was written. */
  static final int UNREADABLE_INPUT = 3;

  /** A result could not be written. */
  static final int CANNOT_WRITE = 4;

  /** The program itself failed, which is worth a report to its keepers. */
  static final int PROGRAM_FAULT = 70;

  private ExitCode() {}

  /** The list for the help texts, in order. */
  static Map<String, String> explained() {
    Map<String, String> meanings = new LinkedHashMap<>();
    meanings.put(" " + DONE, "done");
    meanings.put(" " + FAULTS_FOUND, "done, but the results carry a fault");
    meanings.put(" " + WRONG_USAGE, "wrong usage");
    meanings.put(" " + UNREADABLE_INPUT, "an input cannot be read; nothing was written");
    meanings.put(" " + CANNOT_WRITE, "an output cannot be written");
    meanings.put("" + PROGRAM_FAULT, "the program itself failed");
    return meanings;
  }
}
