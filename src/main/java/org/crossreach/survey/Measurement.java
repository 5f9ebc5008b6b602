package org.crossreach.survey;

import java.util.List;
import java.util.Optional;

/**
 * One measurement of discharge: the facts of {@code measurement.json} with the ensembles of its
 * passes.
 *
 * @param id name of the measurement, unique in an archive
 * @param site where it was made
 * @param party the people's roles or names, as recorded
 * @param remarks free text, may be empty
 * @param stage gauge readings, if any were recorded
 * @param rating the site's stage-discharge relation, if recorded
 * @param water independent readings of the water
 * @param instrument the profiler and how it was mounted
 * @param passes every recorded pass, used or not, in the order of the record
 * @param movingBedTests the moving-bed tests, may be empty
 * @param inputs every file that was read, in the order of reading
 */
public record Measurement(
    String id,
    Site site,
    List<String> party,
    String remarks,
    Optional<Stage> stage,
    Optional<Rating> rating,
    Water water,
    Instrument instrument,
    List<Pass> passes,
    List<MovingBedTest> movingBedTests,
    List<InputFile> inputs) {

  public Measurement {
    party = List.copyOf(party);
    passes = List.copyOf(passes);
    movingBedTests = List.copyOf(movingBedTests);
    inputs = List.copyOf(inputs);
  }

  /** The same measurement with other passes. */
  public Measurement withPasses(List<Pass> others) {
    return new Measurement(
        id, site, party, remarks, stage, rating, water, instrument, others, movingBedTests, inputs);
  }
}
