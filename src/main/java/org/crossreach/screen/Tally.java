package org.crossreach.screen;

/**
 * How many samples carry which reason. Every sample is counted once: the counts add up to what was
 * {@linkplain #recorded() recorded}. Immutable.
 */
public final class Tally {

  private final long[] counts;

  private Tally(long[] counts) {
    this.counts = counts;
  }

  /** Counts reasons, those of cells that no ensemble has left aside. */
  static Tally of(byte[] reasons) {
    long[] counts = new long[Reason.values().length];
    for (byte reason : reasons) {
      counts[reason]++;
    }
    counts[Reason.NO_CELL.code()] = 0;
    return new Tally(counts);
  }

  /** Number of samples with a reason; with {@link Reason#NONE}, those that are used. */
  public long of(Reason reason) {
    return counts[reason.ordinal()];
  }

  /** Number of samples that are used. */
  public long used() {
    return of(Reason.NONE);
  }

  /** Number of samples that were recorded, used or not. */
  public long recorded() {
    long sum = 0;
    for (long count : counts) {
      sum += count;
    }
    return sum;
  }

  /** Number of samples with a reason other than {@link Reason#NONE}. */
  public long rejected() {
    return recorded() - used();
  }
}
