package org.crossreach.cli;

import java.io.PrintWriter;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;
import org.crossreach.archive.ArchiveRun;
import org.crossreach.archive.Found;
import org.crossreach.archive.Outcome;

/**
 * Tells how an archive run goes: a bar with rate and time left on a terminal, a line for each
 * measurement elsewhere, and counts at the end.
 */
final class ArchiveProgress implements ArchiveRun.Listener, AutoCloseable {

  private final PrintWriter err;
  private final boolean quiet;
  private final StatusLine line;
  private final ProgressBar bar;
  private final Workload workload;
  private final TimeLeft left;
  private final List<String> failures = new ArrayList<>();
  private int done;
  private int unchanged;
  private int failed;
  private int passes;

  ArchiveProgress(List<Found> measurements, boolean quiet, PrintWriter err) {
    this.err = err;
    this.quiet = quiet;
    if (quiet || System.console() == null) {
      line = null;
      bar = null;
      workload = null;
      left = null;
      return;
    }
    workload = Workload.of(measurements);
    left = new TimeLeft(workload.whole(), System.nanoTime());
    line = new StatusLine(err);
    bar =
        new ProgressBarBuilder()
            .setTaskName("archive")
            .setInitialMax(measurements.size())
            .setStyle(ProgressBarStyle.ASCII)
            .setEtaFunction(state -> left.at(System.nanoTime()))
            .setConsumer(line)
            .continuousUpdate()
            .showSpeed(new DecimalFormat("0.0", DecimalFormatSymbols.getInstance(Locale.ROOT)))
            .build();
  }

  @Override
  public void finished(Outcome outcome) {
    passes += outcome.passes();
    switch (outcome.kind()) {
      case DONE -> done++;
      case UNCHANGED -> unchanged++;
      case FAILED -> failed++;
    }
    if (bar != null) {
      left.finished(workload.sizes().get(outcome.place()), System.nanoTime());
      bar.step();
    } else if (!quiet && outcome.kind() != Outcome.Kind.FAILED) {
      err.println(outcome.place() + ": " + outcome.kind().name().toLowerCase(Locale.ROOT));
    }
    for (String problem : outcome.problems()) {
      failure(outcome.place() + ": failed: " + problem);
    }
  }

  /** Tells of something that could not be looked into; it counts as a failure. */
  void trouble(String text) {
    failed++;
    failure(text);
  }

  private void failure(String text) {
    failures.add(text);
    if (line == null) {
      err.println(text);
    } else {
      line.above(text);
    }
  }

  int done() {
    return done;
  }

  int unchanged() {
    return unchanged;
  }

  int failed() {
    return failed;
  }

  int passes() {
    return passes;
  }

  List<String> failures() {
    failures.sort(null);
    return failures;
  }

  @Override
  public void close() {
    if (bar != null) {
      bar.close();
    }
  }
}
