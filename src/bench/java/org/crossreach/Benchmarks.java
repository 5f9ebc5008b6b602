package org.crossreach;

import java.util.Collection;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.openjdk.jmh.infra.BenchmarkParams;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.CommandLineOptionException;
import org.openjdk.jmh.runner.options.CommandLineOptions;

/**
 * Runs benchmarks and prints, for each class that has a method {@code baseline}, how long its other
 * methods take in proportion to it. Arguments are those of JMH, for example a part of a class name.
 */
public final class Benchmarks {

  private static final String BASELINE = ".baseline";

  private Benchmarks() {}

  public static void main(String[] arguments) throws RunnerException, CommandLineOptionException {
    Collection<RunResult> results = new Runner(new CommandLineOptions(arguments)).run();
    Map<String, Double> scores = new TreeMap<>();
    results.forEach(
        result -> scores.put(nameOf(result.getParams()), result.getPrimaryResult().getScore()));
    scores.forEach(
        (name, score) -> {
          int method = name.indexOf('.');
          int parameters = name.indexOf(' ');
          String baseline = name.substring(0, method) + BASELINE + name.substring(parameters);
          if (scores.containsKey(baseline) && !name.equals(baseline)) {
            double ratio = score / scores.get(baseline);
            System.out.println(
                String.format(Locale.ROOT, "%s: %.2f times the baseline", name.strip(), ratio));
          }
        });
  }

  /** Class, method and parameters, for example {@code ReadingBenchmark.reader cells=60}. */
  private static String nameOf(BenchmarkParams parameters) {
    String name = parameters.getBenchmark();
    name = name.substring(name.lastIndexOf('.', name.lastIndexOf('.') - 1) + 1) + " ";
    for (String key : parameters.getParamsKeys()) {
      name += key + "=" + parameters.getParam(key) + " ";
    }
    return name;
  }
}
