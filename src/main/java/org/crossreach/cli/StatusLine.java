package org.crossreach.cli;

import java.io.PrintWriter;
import me.tongfei.progressbar.ConsoleProgressBarConsumer;

/** The last line of a terminal, drawn again and again, with other lines appearing above it. */
final class StatusLine extends ConsoleProgressBarConsumer {

  private final PrintWriter terminal;
  private String drawn = "";

  StatusLine(PrintWriter terminal) {
    super(System.err);
    this.terminal = terminal;
  }

  /** Draws the line in place of what it was. */
  @Override
  public synchronized void accept(String line) {
    int longest = Math.max(1, getMaxRenderedLength());
    String shown = line.substring(0, Math.min(longest, line.length())).stripTrailing();
    terminal.print("\r" + shown + " ".repeat(Math.max(0, drawn.length() - shown.length())));
    terminal.flush();
    drawn = shown;
  }

  /** Prints a line for good, above this one. */
  synchronized void above(String line) {
    terminal.print("\r" + " ".repeat(drawn.length()) + "\r");
    terminal.println(line);
    terminal.print(drawn);
    terminal.flush();
  }

  /** Leaves the line as it was drawn last. */
  @Override
  public synchronized void close() {
    terminal.println();
    terminal.flush();
    drawn = "";
  }
}
