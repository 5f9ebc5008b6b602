package org.crossreach.ingest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.UnusableInput;

/** The files of a measurement that nothing could be made of, as far as they can be read. */
public final class StoredInputs {

  private StoredInputs() {}

  /**
   * Size and SHA-256 of {@code measurement.json}, of {@code settings.json} and of every file that
   * {@code measurement.json} names within the folder. What is not there or cannot be read is left
   * out, and nobody is told: the failure itself says why.
   *
   * @param folder the measurement's folder
   * @return the files, in the order in which they are named
   */
  public static List<InputFile> of(Path folder) {
    Map<String, Path> files = new LinkedHashMap<>();
    files.put(MeasurementFile.NAME, folder.resolve(MeasurementFile.NAME));
    files.put(SettingsFile.NAME, folder.resolve(SettingsFile.NAME));
    files.putAll(named(folder));
    List<InputFile> inputs = new ArrayList<>();
    files.forEach((name, file) -> input(name, file).ifPresent(inputs::add));
    return inputs;
  }

  private static Map<String, Path> named(Path folder) {
    Map<String, Path> files = new LinkedHashMap<>();
    FileProblems problems = new FileProblems(MeasurementFile.NAME);
    try {
      byte[] bytes = StoredFile.bytes(folder.resolve(MeasurementFile.NAME), problems);
      Optional<JsonNode> json = JsonTree.parse(bytes, problems);
      if (json.isPresent()) {
        JsonFields root = JsonFields.of(json, problems);
        List<JsonFields> all = new ArrayList<>(root.findObjects("passes"));
        all.addAll(root.findObjects("moving_bed_tests"));
        for (JsonFields each : all) {
          Optional<Path> file = FolderPath.find(folder, each, "file");
          if (file.isPresent()) {
            files.put(each.text("file"), file.get());
          }
        }
      }
    } catch (IOException | UnusableInput unreadable) {
      return files; // with those that were found
    }
    return files;
  }

  private static Optional<InputFile> input(String name, Path file) {
    if (!Files.isRegularFile(file)) {
      return Optional.empty();
    }
    try (DigestedStream stream = new DigestedStream(Files.newInputStream(file))) {
      return Optional.of(stream.input(name));
    } catch (IOException unreadable) {
      return Optional.empty();
    }
  }
}
