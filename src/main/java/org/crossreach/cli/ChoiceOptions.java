package org.crossreach.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;
import picocli.CommandLine.Option;

/**
 * The options that overrule choices of {@code settings.json}.
 *
 * <p>All of them say the same as a {@code settings.json} would, and are read by the same reader.
 */
final class ChoiceOptions {

  private final Map<String, String> chosen = new LinkedHashMap<>();

  @Option(
      names = "--method",
      order = 10,
      paramLabel = "NAME",
      description = "section-normal or path-flux.")
  private void setMethod(String key) {
    chosen.put("method", key);
  }

  @Option(
      names = "--section",
      order = 11,
      paramLabel = "LINE",
      description = "each-pass, common, or an azimuth in degrees from true north.")
  private void setSection(String line) {
    boolean azimuth = !line.isEmpty() && "+-.0123456789".indexOf(line.charAt(0)) >= 0;
    chosen.put(azimuth ? "section.line.azimuth_deg" : "section.line", line);
  }

  @Option(
      names = "--depth",
      order = 12,
      paramLabel = "SOURCE",
      description = "slant-mean, slant-inverse-distance or vertical.")
  private void setDepth(String key) {
    chosen.put("depth.source", key);
  }

  @Option(
      names = "--top",
      order = 13,
      paramLabel = "LAW",
      description = "power, constant or three-point.")
  private void setTop(String key) {
    chosen.put("top", key);
  }

  @Option(names = "--bottom", order = 14, paramLabel = "LAW", description = "power or no-slip.")
  private void setBottom(String key) {
    chosen.put("bottom", key);
  }

  @Option(
      names = "--exponent",
      order = 15,
      paramLabel = "NUMBER|RULE",
      description = "A fixed exponent such as 0.1667, or fit-pass or fit-all.")
  private void setExponent(String exponent) {
    boolean number = !exponent.isEmpty() && "+-.0123456789".indexOf(exponent.charAt(0)) >= 0;
    chosen.put("exponent.rule", number ? "fixed" : exponent);
    if (number) {
      chosen.put("exponent.value", exponent);
    }
  }

  @Option(
      names = "--edge-ensembles",
      order = 16,
      paramLabel = "N",
      description = "Number of ensembles averaged beside each edge.")
  private void setEdgeEnsembles(String count) {
    chosen.put("edge_ensembles", count);
  }

  @Option(
      names = "--set",
      order = 17,
      paramLabel = "KEY=VALUE",
      description =
          "Any choice by its key in settings.json, for example screening.spikes_mps=off; may be"
              + " repeated.")
  private void setAny(Map<String, String> choices) {
    chosen.putAll(choices);
  }

  /** The options' choices as JSON with the keys of {@code settings.json}; empty for none. */
  String asJson() {
    return chosen.isEmpty() ? "" : NestedJson.of(chosen);
  }

  /**
   * The settings with the options' choices in place of their own.
   *
   * @throws UnusableInput when a key or a value is not valid
   */
  Settings applyTo(Settings settings) throws UnusableInput {
    return chosen.isEmpty()
        ? settings
        : SettingsFile.parse(NestedJson.of(chosen), "command line", settings);
  }
}
