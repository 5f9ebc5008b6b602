package org.crossreach.archive;

import java.io.IOException;
import java.nio.file.InvalidPathException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.crossreach.agreement.Result;
import org.crossreach.discharge.Reducer;
import org.crossreach.ingest.MeasurementFolder;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.ingest.StoredInputs;
import org.crossreach.report.FileKind;
import org.crossreach.report.ProgramVersion;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;

/**
 * Keeps one measurement: reads, reduces and writes it, unless it is kept already.
 *
 * @param plan what is to be made
 */
record Keeper(Plan plan) {

  /**
   * Keeps a measurement; whatever is wrong with it or with its place alone becomes its outcome.
   *
   * @throws CannotKeep when the archive cannot be written
   */
  Outcome keep(Found found) throws CannotKeep {
    try {
      return keep(found, new Place(plan.target().resolve(found.place())));
    } catch (InvalidPathException unwritable) {
      return new Outcome(
          found.place(),
          Outcome.Kind.FAILED,
          0,
          List.of("no file can have its name here: " + unwritable.getReason()));
    } catch (CannotKeep trouble) {
      if (!new Place(plan.target()).takesFiles()) {
        throw trouble;
      }
      return new Outcome(
          found.place(), Outcome.Kind.FAILED, 0, List.of("cannot write " + trouble.getMessage()));
    }
  }

  private Outcome keep(Found found, Place place) throws CannotKeep {
    Optional<Manifest> before = Manifest.read(place.folder());
    if (before.isPresent() && before.get().holds(plan, found, place.folder())) {
      place.sweep();
      int passes = before.get().rows().orElseThrow().passes().size();
      return new Outcome(found.place(), Outcome.Kind.UNCHANGED, passes, List.of());
    }
    try {
      Measurement measurement = MeasurementFolder.read(found.folder());
      Result result =
          Result.of(
              new Reducer(1).reduce(measurement, plan.over(SettingsFile.read(found.folder()))));
      write(place, found, result, before);
      int passes = result.reduction().passes().size();
      return new Outcome(found.place(), Outcome.Kind.DONE, passes, List.of());
    } catch (CannotKeep stop) {
      throw stop;
    } catch (UnusableInput unusable) {
      return fail(
          place, found, before, unusable.problems().stream().map(Problem::toString).toList());
    } catch (IOException unreadable) {
      return fail(place, found, before, List.of("cannot read " + unreadable.getMessage()));
    } catch (OutOfMemoryError tooLarge) {
      return falter(
          place,
          found,
          before,
          "the memory is too small for it; give more, or fewer jobs side by side");
    } catch (RuntimeException | Error fault) {
      return falter(place, found, before, "the program itself failed: " + fault);
    }
  }

  /**
   * What the measurement is not to blame for: results that were kept before stay, and the next run
   * tries again.
   */
  private Outcome falter(Place place, Found found, Optional<Manifest> before, String why)
      throws CannotKeep {
    if (before.isPresent() && before.get().done()) {
      return new Outcome(found.place(), Outcome.Kind.FAILED, 0, List.of(why));
    }
    return fail(place, found, before, List.of(why));
  }

  private void write(Place place, Found found, Result result, Optional<Manifest> before)
      throws CannotKeep {
    place.open();
    List<Place.Kept> products = new ArrayList<>();
    for (FileKind kind : plan.kinds()) {
      for (FileKind.OutputFile file : kind.files(result, plan.units())) {
        products.add(place.write(file.name(), file.product()));
      }
    }
    List<InputFile> inputs = result.reduction().measurement().inputs();
    removeOthers(place, before, products);
    keepManifest(place, found, inputs, products, List.of(), Optional.of(IndexRows.of(result)));
  }

  private Outcome fail(Place place, Found found, Optional<Manifest> before, List<String> problems)
      throws CannotKeep {
    place.open();
    removeOthers(place, before, List.of());
    List<InputFile> inputs = StoredInputs.of(found.folder());
    keepManifest(place, found, inputs, List.of(), problems, Optional.empty());
    return new Outcome(found.place(), Outcome.Kind.FAILED, 0, problems);
  }

  /** Removes what an earlier run wrote and this one did not. */
  private static void removeOthers(
      Place place, Optional<Manifest> before, List<Place.Kept> products) throws CannotKeep {
    Set<String> names = new HashSet<>();
    products.forEach(each -> names.add(each.name()));
    if (before.isPresent()) {
      for (Place.Kept each : before.get().products()) {
        if (!names.contains(each.name()) && each.name().indexOf('/') < 0) {
          place.remove(each.name());
        }
      }
    }
  }

  private void keepManifest(
      Place place,
      Found found,
      List<InputFile> inputs,
      List<Place.Kept> products,
      List<String> problems,
      Optional<IndexRows> rows)
      throws CannotKeep {
    Manifest manifest =
        new Manifest(
            ProgramVersion.read(),
            found.place(),
            plan.kindKeys(),
            plan.units().key(),
            plan.overriding(),
            inputs.stream()
                .map(input -> new Place.Kept(input.file(), input.bytes(), input.sha256()))
                .toList(),
            products,
            problems,
            rows);
    place.write(Manifest.NAME, manifest::write);
  }
}
