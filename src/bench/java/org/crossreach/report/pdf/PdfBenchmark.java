package org.crossreach.report.pdf;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.survey.UnusableInput;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Making the PDF of one pass and of a measurement, warm and on one thread. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@State(Scope.Benchmark)
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(
    value = 2,
    jvmArgs = {"-Xmx1g", "-XX:+UseSerialGC"})
public class PdfBenchmark {

  @Param({"tern-landing-0418", "saltern-reach-0622"})
  public String sample;

  private Result result;
  private PassDischarge pass;

  @Setup
  public void reduce() throws IOException, UnusableInput {
    Path folder = Path.of("sample-transects", sample);
    result =
        Result.of(new Reducer(1).reduce(MeasurementFolder.read(folder), SettingsFile.read(folder)));
    pass = result.reduction().passes().get(0);
  }

  @Benchmark
  public byte[] transect() throws IOException {
    return TransectPdf.bytes(result, pass, PdfOptions.defaults());
  }

  @Benchmark
  public byte[] transectWithTables() throws IOException {
    return TransectPdf.bytes(
        result, pass, PdfOptions.defaults().withAttachments(Enclosures.of(result, pass)));
  }

  @Benchmark
  public byte[] measurement() throws IOException {
    return MeasurementPdf.bytes(result, PdfOptions.defaults());
  }
}
