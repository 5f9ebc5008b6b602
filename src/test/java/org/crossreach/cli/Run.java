package org.crossreach.cli;

import java.io.PrintWriter;
import java.io.StringWriter;

/**
 * What one command line did, run inside this process.
 *
 * @param code the exit code
 * @param out what it wrote to standard output
 * @param err what it wrote to standard error
 */
record Run(int code, String out, String err) {

  /** Runs a command line. */
  static Run of(String... words) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code = Crossreach.run(words, new PrintWriter(out), new PrintWriter(err));
    return new Run(code, out.toString(), err.toString());
  }
}
