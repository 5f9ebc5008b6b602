package org.crossreach.simulate;

import java.time.OffsetDateTime;
import org.crossreach.ingest.JsonNode;
import org.crossreach.survey.Bank;

/**
 * Everything that makes a virtual measurement.
 *
 * @param id name of the measurement
 * @param seed seed of all random numbers
 * @param start time of the first ensemble of the first pass
 * @param passes number of passes, their start banks alternate
 * @param firstBank bank from which the first pass starts
 * @param pauseS time from the end of a pass to the start of the next (s)
 * @param river the river
 * @param boat how the boat crosses
 * @param attitude how the instrument stands in the water
 * @param profiler what the instrument records
 * @param noise random errors
 * @param faults what goes wrong
 * @param decimals decimals of the recorded numbers
 * @param edges edges as {@code measurement.json} is to give them
 * @param facts further members of {@code measurement.json}, an object
 * @param settings a {@code settings.json}, an object; nothing for none
 */
public record Recipe(
    String id,
    long seed,
    OffsetDateTime start,
    int passes,
    Bank firstBank,
    double pauseS,
    River river,
    BoatPlan boat,
    Attitude attitude,
    Profiler profiler,
    Noise noise,
    Faults faults,
    int decimals,
    Edges edges,
    JsonNode facts,
    JsonNode settings) {

  /**
   * Coefficients of the two edges.
   *
   * @param left coefficient of the left edge
   * @param right coefficient of the right edge
   */
  public record Edges(double left, double right) {}

  /** The same recipe with another seed. */
  public Recipe withSeed(long other) {
    return new Recipe(
        id, other, start, passes, firstBank, pauseS, river, boat, attitude, profiler, noise, faults,
        decimals, edges, facts, settings);
  }

  /** Whether a pass, from 0, starts at the left bank. */
  boolean fromLeft(int pass) {
    return (firstBank == Bank.LEFT) == (pass % 2 == 0);
  }

  /** Time from the start of the first pass to that of another (s). */
  double passStartS(int pass) {
    return pass * ((boat.size() - 1) * boat.ensembleS() + pauseS);
  }

  /** Duration of a pass (s). */
  double durationS() {
    return (boat.size() - 1) * boat.ensembleS();
  }
}
