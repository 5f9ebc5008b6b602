package org.crossreach.ingest;

import java.io.IOException;
import java.io.InterruptedIOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;

/**
 * The outcome of reading one ensemble CSV.
 *
 * @param file what was read, {@code null} when there are problems
 * @param problems what is wrong with the file
 */
record EnsembleReading(EnsembleFile file, List<Problem> problems) {

  private static EnsembleReading of(String name, Path path) throws IOException {
    try {
      return new EnsembleReading(EnsembleCsv.read(path, name), List.of());
    } catch (UnusableInput e) {
      return new EnsembleReading(null, e.problems());
    }
  }

  /**
   * Reads files side by side on the cores there are.
   *
   * @param files the files by the names that problems call them
   * @return the outcomes by the same names, in the same order
   * @throws IOException of the first file that cannot be read from its disk
   */
  static Map<String, EnsembleReading> all(Map<String, Path> files) throws IOException {
    Map<String, EnsembleReading> readings = new LinkedHashMap<>();
    int cores = Math.min(Runtime.getRuntime().availableProcessors(), files.size());
    if (cores < 2) {
      for (Map.Entry<String, Path> file : files.entrySet()) {
        readings.put(file.getKey(), of(file.getKey(), file.getValue()));
      }
      return readings;
    }
    ExecutorService workers = Executors.newFixedThreadPool(cores);
    try {
      Map<String, Future<EnsembleReading>> started = new LinkedHashMap<>();
      files.forEach((name, path) -> started.put(name, workers.submit(() -> of(name, path))));
      for (Map.Entry<String, Future<EnsembleReading>> reading : started.entrySet()) {
        readings.put(reading.getKey(), result(reading.getValue()));
      }
      return readings;
    } finally {
      workers.shutdownNow();
    }
  }

  private static EnsembleReading result(Future<EnsembleReading> reading) throws IOException {
    try {
      return reading.get();
    } catch (ExecutionException e) {
      if (e.getCause() instanceof IOException failure) {
        throw failure;
      }
      if (e.getCause() instanceof Error error) {
        throw error;
      }
      throw new IllegalStateException(e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new InterruptedIOException("reading was interrupted");
    }
  }
}
