package org.crossreach.ingest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Frame;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.MovingBedTest;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;

/**
 * Reads a measurement's folder: {@code measurement.json} and every ensemble CSV that it names.
 *
 * <p>The files are read side by side on the cores there are; the result does not depend on their
 * number. {@code settings.json} is looked at as well, so that its problems come together with the
 * others and its digest stands among the inputs; its choices are read by {@link SettingsFile}.
 */
public final class MeasurementFolder {

  private final Path folder;
  private final FileProblems problems = new FileProblems(MeasurementFile.NAME);
  private final FileProblems settingsProblems = new FileProblems(SettingsFile.NAME);
  private final List<InputFile> inputs = new ArrayList<>();

  private MeasurementFolder(Path folder) {
    this.folder = folder;
  }

  /**
   * Reads a measurement.
   *
   * @param folder its folder
   * @throws UnusableInput with every problem of every file, in the order: {@code measurement.json},
   *     {@code settings.json}, the CSV files in the order in which they are named
   * @throws IOException when there is no such folder, or a file cannot be read from its disk
   */
  public static Measurement read(Path folder) throws UnusableInput, IOException {
    return new MeasurementFolder(folder).read();
  }

  private Measurement read() throws UnusableInput, IOException {
    if (!Files.isDirectory(folder)) {
      throw Files.exists(folder)
          ? new NotDirectoryException(folder.toString())
          : new NoSuchFileException(folder.toString());
    }
    MeasurementFile file = readMeasurementFile();
    readSettings(file);
    Map<String, Path> files = findFiles(file);
    Map<String, EnsembleReading> readings = EnsembleReading.all(files);
    checkBeams(file, readings);

    List<Problem> all = new ArrayList<>(problems.list());
    all.addAll(settingsProblems.list());
    readings.values().forEach(reading -> all.addAll(reading.problems()));
    if (!all.isEmpty()) {
      throw new UnusableInput(all);
    }
    readings.values().forEach(reading -> inputs.add(reading.file().input()));
    return assemble(file, readings);
  }

  private MeasurementFile readMeasurementFile() throws UnusableInput, IOException {
    byte[] bytes = StoredFile.bytes(folder.resolve(MeasurementFile.NAME), problems);
    inputs.add(StoredFile.input(MeasurementFile.NAME, bytes));
    Optional<JsonNode> json = JsonTree.parse(bytes, problems);
    if (json.isEmpty()) {
      problems.throwIfAny();
    }
    return MeasurementFile.of(JsonFields.of(json, problems));
  }

  private void readSettings(MeasurementFile file) throws IOException {
    Path path = folder.resolve(SettingsFile.NAME);
    if (!Files.exists(path)) {
      return;
    }
    Set<String> passes = new LinkedHashSet<>();
    file.passes().forEach(pass -> passes.add(pass.name()));
    try {
      byte[] bytes = StoredFile.bytes(path, settingsProblems);
      inputs.add(StoredFile.input(SettingsFile.NAME, bytes));
      SettingsFile.of(
          JsonTree.parse(bytes, settingsProblems), settingsProblems, Settings.defaults(), passes);
    } catch (UnusableInput e) {
      // The problems are in settingsProblems already and are thrown with all others.
      assert !settingsProblems.isEmpty();
    }
  }

  /** The files that are named and can be opened, each once, by their names. */
  private Map<String, Path> findFiles(MeasurementFile file) throws IOException {
    Map<String, Path> files = new LinkedHashMap<>();
    for (MeasurementFile.PassEntry pass : file.passes()) {
      FolderPath.find(folder, pass.fields(), "file")
          .ifPresent(path -> files.put(pass.file(), path));
    }
    for (MeasurementFile.TestEntry test : file.tests()) {
      FolderPath.find(folder, test.fields(), "file")
          .ifPresent(path -> files.put(test.file(), path));
    }
    return files;
  }

  private void checkBeams(MeasurementFile file, Map<String, EnsembleReading> readings) {
    boolean needed =
        readings.values().stream()
            .anyMatch(
                reading ->
                    reading.problems().isEmpty()
                        && reading.file().ensembles().frame() == Frame.BEAM);
    if (needed && !file.instrumentFields().has("beam_azimuths_deg")) {
      file.instrumentFields()
          .refuse(
              "beam_azimuths_deg",
              "no such key",
              "the four azimuths of the beams, since a file has velocities along beams",
              "add it");
    }
  }

  private Measurement assemble(MeasurementFile file, Map<String, EnsembleReading> readings) {
    List<Pass> passes = new ArrayList<>();
    for (MeasurementFile.PassEntry entry : file.passes()) {
      EnsembleFile read = readings.get(entry.file()).file();
      passes.add(
          new Pass(
              entry.name(),
              entry.file(),
              entry.startBank(),
              entry.used(),
              entry.note(),
              entry.leftEdge(),
              entry.rightEdge(),
              read.ensembles(),
              read.notes()));
    }
    List<MovingBedTest> tests = new ArrayList<>();
    for (MeasurementFile.TestEntry entry : file.tests()) {
      Ensembles ensembles = readings.get(entry.file()).file().ensembles();
      List<Note> notes = readings.get(entry.file()).file().notes();
      tests.add(new MovingBedTest(entry.kind(), entry.file(), ensembles, notes));
    }
    return new Measurement(
        file.id(),
        file.site(),
        file.party(),
        file.remarks(),
        file.stage(),
        file.rating(),
        file.water(),
        file.instrument(),
        passes,
        tests,
        inputs);
  }
}
