package org.crossreach.simulate;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import org.crossreach.ingest.EnsembleCsvWriter;
import org.crossreach.ingest.JsonNode;
import org.crossreach.notation.JsonText;
import org.crossreach.survey.Edge;
import org.crossreach.survey.Pass;

/**
 * Writes virtual measurements as folders: {@code measurement.json}, {@code settings.json} where the
 * recipe has settings, one ensemble CSV for each pass, and {@code truth.json}.
 */
public final class SimulationFolder {

  /** Name and version of the format of the truth. */
  public static final String TRUTH_FORMAT = "crossreach-truth/1";

  private static final String TRUTH = "truth.json";

  private SimulationFolder() {}

  /**
   * Writes a folder; it appears under its name only when it is complete.
   *
   * @param simulation what to write
   * @param folder the folder; it must be missing or a virtual measurement
   * @throws FileSystemException when the folder holds anything else
   */
  public static void write(Simulation simulation, Path folder) throws IOException {
    if (Files.exists(folder) && !isVirtual(folder)) {
      throw new FileSystemException(
          folder.toString(),
          null,
          "this exists and is not a virtual measurement; choose another folder");
    }
    Path absolute = folder.toAbsolutePath();
    Files.createDirectories(absolute.getParent());
    Path unfinished =
        absolute.resolveSibling(
            "." + absolute.getFileName() + "." + ProcessHandle.current().pid() + ".part");
    delete(unfinished);
    try {
      Files.createDirectory(unfinished);
      writeFiles(simulation, unfinished);
      delete(absolute);
      Files.move(unfinished, absolute);
    } finally {
      delete(unfinished);
    }
  }

  private static boolean isVirtual(Path folder) throws IOException {
    Path truth = folder.resolve(TRUTH);
    return Files.isRegularFile(truth) && Files.readString(truth).contains(TRUTH_FORMAT);
  }

  private static void delete(Path folder) throws IOException {
    if (Files.exists(folder)) {
      try (var entries = Files.newDirectoryStream(folder)) {
        for (Path entry : entries) {
          Files.delete(entry);
        }
      }
      Files.delete(folder);
    }
  }

  private interface Content {
    void write(OutputStream target) throws IOException;
  }

  private static void file(Path file, Content content) throws IOException {
    try (OutputStream target = new BufferedOutputStream(Files.newOutputStream(file))) {
      content.write(target);
    }
  }

  private static void writeFiles(Simulation simulation, Path folder) throws IOException {
    Recipe recipe = simulation.recipe();
    for (Pass pass : simulation.measurement().passes()) {
      file(
          folder.resolve(pass.file()),
          target -> EnsembleCsvWriter.write(pass.ensembles(), recipe.decimals(), target));
    }
    file(folder.resolve("measurement.json"), target -> writeMeasurement(simulation, target));
    if (!(recipe.settings() instanceof JsonNode.Nothing)) {
      file(
          folder.resolve("settings.json"),
          target -> {
            try (JsonText json = new JsonText(target)) {
              json.object(() -> members(recipe.settings(), json));
            }
          });
    }
    file(folder.resolve(TRUTH), target -> writeTruth(simulation.truth(), target));
  }

  private static void members(JsonNode object, JsonText json) throws IOException {
    for (Map.Entry<String, JsonNode> member : ((JsonNode.Members) object).members().entrySet()) {
      node(member.getKey(), member.getValue(), json);
    }
  }

  private static void node(String name, JsonNode node, JsonText json) throws IOException {
    if (node instanceof JsonNode.Text text) {
      json.text(name, text.text());
    } else if (node instanceof JsonNode.Number number) {
      json.number(name, number.value());
    } else if (node instanceof JsonNode.Flag flag) {
      json.flag(name, flag.value());
    } else if (node instanceof JsonNode.Members members) {
      json.object(name, () -> members(members, json));
    } else if (node instanceof JsonNode.Elements array) {
      elements(name, array, json);
    }
  }

  private static void elements(String name, JsonNode.Elements array, JsonText json)
      throws IOException {
    if (array.elements().stream().allMatch(JsonNode.Members.class::isInstance)) {
      json.objects(name, array.elements(), element -> members(element, json));
    } else if (array.elements().stream().allMatch(JsonNode.Number.class::isInstance)) {
      json.numbers(
          name,
          array.elements().stream().mapToDouble(e -> ((JsonNode.Number) e).value()).toArray());
    } else {
      json.texts(
          name,
          array.elements().stream()
              .map(e -> e instanceof JsonNode.Text text ? text.text() : e.phrase())
              .toList());
    }
  }

  private static void writeMeasurement(Simulation simulation, OutputStream target)
      throws IOException {
    Recipe recipe = simulation.recipe();
    try (JsonText json = new JsonText(target)) {
      json.object(
          () -> {
            json.text("format", "crossreach-measurement/1");
            json.text("id", recipe.id());
            members(recipe.facts(), json);
            json.objects(
                "passes",
                simulation.measurement().passes(),
                (Pass pass) -> {
                  json.text("file", pass.file());
                  json.text("start_bank", pass.startBank().name().toLowerCase(Locale.ROOT));
                  edge("left_edge", pass.leftEdge().distanceM(), recipe.edges().left(), json);
                  edge("right_edge", pass.rightEdge().distanceM(), recipe.edges().right(), json);
                });
          });
    }
  }

  private static void edge(String name, double distance, double coefficient, JsonText json)
      throws IOException {
    json.object(
        name,
        () -> {
          json.number("distance_m", distance);
          if (coefficient == Edge.SLOPING || coefficient == Edge.WALL) {
            json.text("shape", coefficient == Edge.WALL ? "wall" : "sloping");
          } else {
            json.text("shape", "coefficient");
            json.number("coefficient", coefficient);
          }
        });
  }

  private static void writeTruth(Truth truth, OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      json.object(
          () -> {
            json.text("format", TRUTH_FORMAT);
            json.number("discharge_m3s", truth.dischargeM3s());
            json.number("left_edge_m3s", truth.leftEdgeM3s());
            json.number("right_edge_m3s", truth.rightEdgeM3s());
            json.number("width_m", truth.widthM());
            json.number("area_m2", truth.areaM2());
            json.objects(
                "passes",
                truth.passes(),
                (Truth.PassTruth pass) -> {
                  json.text("name", pass.name());
                  json.number("discharge_m3s", pass.dischargeM3s());
                  json.object(
                      "struck",
                      () -> {
                        for (Fault fault : Fault.values()) {
                          json.whole(fault.key(), pass.struck().get(fault).cardinality());
                        }
                      });
                });
          });
    }
  }
}
