package org.crossreach.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The time left follows the size of the work, and the rate of late. */
class TimeLeftTest {

  private static final long SECOND = 1_000_000_000L;

  private static Optional<Duration> seconds(long count) {
    return Optional.of(Duration.ofSeconds(count));
  }

  @Test
  void saysNothingBeforeAnythingIsKnown() {
    TimeLeft left = new TimeLeft(100, 0);
    assertEquals(Optional.empty(), left.at(5 * SECOND));
    TimeLeft afterAnInstantFailure = new TimeLeft(100, 0);
    afterAnInstantFailure.finished(1, 1000);
    assertEquals(Optional.empty(), afterAnInstantFailure.at(2000));
  }

  @Test
  void isTheSizeLeftAtTheRateSoFar() {
    TimeLeft left = new TimeLeft(1000, 7 * SECOND);
    left.finished(100, 12 * SECOND);
    left.finished(100, 14 * SECOND);
    assertEquals(seconds(16), left.at(14 * SECOND), "the first part only sets the start");
  }

  /**
   * 100 parts of size 1 in 10 s, then one of size 900: by number it would be a tenth of a second.
   */
  @Test
  void isNotMisledByManySmallPartsBeforeALargeOne() {
    TimeLeft left = new TimeLeft(1000, 0);
    for (int i = 1; i <= 100; i++) {
      left.finished(1, i * SECOND / 10);
    }
    assertEquals(seconds(90), left.at(10 * SECOND));
  }

  /**
   * Half the work is there already and goes by in a second; the rest takes a second for each part.
   */
  @Test
  void forgetsWhatWentByInNoTime() {
    TimeLeft left = new TimeLeft(200, 0);
    left.finished(100, SECOND);
    for (int i = 1; i <= 30; i++) {
      left.finished(1, (1 + i) * SECOND);
    }
    assertEquals(seconds(70), left.at(31 * SECOND));
  }

  @Test
  void growsWhileNothingIsFinishedAndEndsWithNought() {
    TimeLeft left = new TimeLeft(20, 0);
    left.finished(5, 3 * SECOND);
    left.finished(5, 5 * SECOND);
    Duration soon = left.at(5 * SECOND).orElseThrow();
    assertTrue(left.at(8 * SECOND).orElseThrow().compareTo(soon) > 0);
    left.finished(10, 9 * SECOND);
    assertEquals(seconds(0), left.at(9 * SECOND));
  }
}
