package org.crossreach.cli;

import java.io.IOException;
import java.nio.file.Path;
import org.crossreach.simulate.Recipe;
import org.crossreach.simulate.RecipeFile;
import org.crossreach.simulate.Simulation;
import org.crossreach.simulate.SimulationFolder;
import org.crossreach.survey.UnusableInput;

/** Makes a virtual river with known discharge, as a measurement's folder. */
final class Simulate implements Job {

  private final Usage usage =
      new Usage(
          "simulate",
          "Make a virtual river with known discharge, as a measurement's folder.",
          this);

  private final Given<Path> file = usage.operand("RECIPE.json", Path.class, "What to make.");

  private final Given<Long> seed =
      usage.option(
          "--seed", "N", Long.class, null, "Seed of the random numbers, in place of the recipe's.");

  private final Given<Path> out =
      usage.option(
          "--out",
          "DIR",
          Path.class,
          null,
          "Make the folder in here (default: beside the recipe).");

  private final Given<Boolean> quiet = usage.flag("--quiet", "Say nothing but errors.");

  @Override
  public Usage usage() {
    return usage;
  }

  @Override
  public Integer call() throws UnusableInput, IOException {
    Recipe read = RecipeFile.read(file.value());
    Recipe recipe = seed.value() == null ? read : read.withSeed(seed.value());
    Path parent = out.value() == null ? file.value().toAbsolutePath().getParent() : out.value();
    Path folder = parent.resolve(recipe.id());
    Simulation simulation = Simulation.run(recipe);
    CannotWrite.unless(folder, () -> SimulationFolder.write(simulation, folder));
    if (!quiet.value()) {
      usage.err().println("written to " + folder);
    }
    return ExitCode.DONE;
  }
}
