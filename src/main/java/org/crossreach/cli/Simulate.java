package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.simulate.Simulation;
import org.crossreach.simulate.SimulationFolder;
import org.crossreach.survey.UnusableInput;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Makes a virtual river with known discharge, as a measurement's folder. */
@Command(
    name = "simulate",
    description = "Make a virtual river with known discharge, as a measurement's folder.")
final class Simulate implements Callable<Integer> {

  @Parameters(paramLabel = "RECIPE.json", description = "What to make.")
  private Path file;

  @Option(
      names = "--seed",
      paramLabel = "N",
      description = "Seed of the random numbers, in place of the recipe's.")
  private Long seed;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "Make the folder in here (default: beside the recipe).")
  private Path out;

  @Option(names = "--quiet", description = "Say nothing but errors.")
  private boolean quiet;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws UnusableInput, IOException {
    Recipe read = RecipeFile.read(file);
    Recipe recipe = seed == null ? read : read.withSeed(seed);
    Path parent = out == null ? file.toAbsolutePath().getParent() : out;
    Path folder = parent.resolve(recipe.id());
    Simulation simulation = Simulation.run(recipe);
    CannotWrite.unless(folder, () -> SimulationFolder.write(simulation, folder));
    if (!quiet) {
      spec.commandLine().getErr().println("written to " + folder);
    }
    return ExitCode.DONE;
  }
}
