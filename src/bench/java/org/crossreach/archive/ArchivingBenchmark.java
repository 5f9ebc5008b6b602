package org.crossreach.archive;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.report.FileKind;
import org.crossreach.report.Units;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Keeping one measurement of four passes on one thread, and the shares of that time which reading,
 * reducing and everything but the pages take. What is left of the whole is the writing of pages.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@State(Scope.Benchmark)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 3)
@Fork(
    value = 2,
    jvmArgs = {"-Xmx1g", "-XX:+UseSerialGC"})
public class ArchivingBenchmark {

  private static final Path SAMPLE = Path.of("sample-transects", "tern-landing-0418");
  private static final List<Found> FOUND = List.of(new Found(SAMPLE, "kept"));

  private Path target;
  private org.crossreach.survey.Measurement measurement;

  @Setup
  public void read() throws IOException, UnusableInput {
    target = Files.createTempDirectory("archiving");
    measurement = MeasurementFolder.read(SAMPLE);
  }

  @Setup(Level.Invocation)
  public void forget() throws IOException {
    Files.deleteIfExists(target.resolve("kept").resolve(Manifest.NAME));
  }

  @TearDown
  public void delete() throws IOException {
    try (Stream<Path> files = Files.walk(target)) {
      for (Path each : files.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(each);
      }
    }
  }

  private void keep(Set<FileKind> kinds) throws IOException {
    Plan plan = new Plan(target, kinds, Units.SI, /* jobs= */ 1, "");
    new ArchiveRun(plan, outcome -> {}).keep(FOUND);
  }

  /** Everything: read, reduce, compare, and write JSON, tables and pages. */
  @Benchmark
  public void baseline() throws IOException {
    keep(EnumSet.of(FileKind.JSON, FileKind.CSV, FileKind.PDF));
  }

  @Benchmark
  public void withoutPages() throws IOException {
    keep(EnumSet.of(FileKind.JSON, FileKind.CSV));
  }

  @Benchmark
  public Object reading() throws IOException, UnusableInput {
    return MeasurementFolder.read(SAMPLE);
  }

  @Benchmark
  public Object reducing() throws UnusableInput {
    return Result.of(new Reducer(1).reduce(measurement, Settings.defaults()));
  }
}
