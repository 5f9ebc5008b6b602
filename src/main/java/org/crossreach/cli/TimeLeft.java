package org.crossreach.cli;

import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/**
 * The time that work still takes, at the rate of late.
 *
 * <p>Work has a size, so that a few large parts among many small ones do not mislead. The rate is
 * that of the last third of the time, or of {@value #SHORTEST_S} s when that is longer, and never
 * that of the first part: a virtual machine gets many times faster within seconds, and what is kept
 * already goes by in no time.
 */
final class TimeLeft {

  private static final int SHORTEST_S = 5;

  /** Before this nothing is said: the first parts say more of the start than of the work. */
  private static final int SILENCE_S = 5;

  private static final double NANOS = 1e9;

  private final long whole;
  private final long start;
  private final Deque<Moment> moments = new ArrayDeque<>();
  private long done;

  /** How much was done by some time. */
  private record Moment(long time, long done) {}

  /**
   * Starts.
   *
   * @param whole size of all the work
   * @param now the time, ns
   */
  TimeLeft(long whole, long now) {
    this.whole = whole;
    this.start = now;
  }

  /**
   * Takes note that a part is finished.
   *
   * @param size its size
   * @param now the time, ns
   */
  synchronized void finished(long size, long now) {
    done += size;
    if (moments.isEmpty() || seconds(moments.getLast().time(), now) >= 1) {
      moments.addLast(new Moment(now, done));
    }
  }

  /**
   * The time left; empty as long as nothing can be said.
   *
   * @param now the time, ns
   */
  synchronized Optional<Duration> at(long now) {
    double window = Math.max(SHORTEST_S, seconds(start, now) / 3);
    while (moments.size() > 1 && seconds(second().time(), now) >= window) {
      moments.removeFirst();
    }
    if (done >= whole) {
      return Optional.of(Duration.ZERO);
    }
    if (seconds(start, now) < SILENCE_S || moments.isEmpty() || done == moments.getFirst().done()) {
      return Optional.empty();
    }
    Moment from = moments.getFirst();
    double rate = (done - from.done()) / seconds(from.time(), now);
    return Optional.of(Duration.ofSeconds(Math.round((whole - done) / rate)));
  }

  private Moment second() {
    return moments.stream().skip(1).findFirst().orElseThrow();
  }

  private static double seconds(long from, long to) {
    return (to - from) / NANOS;
  }
}
