package org.crossreach.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import org.crossreach.ingest.SettingsFile;
import org.crossreach.settings.Settings;
import org.crossreach.survey.UnusableInput;

/**
 * The options that overrule choices of {@code settings.json}.
 *
 * <p>All of them say the same as a {@code settings.json} would, and are read by the same reader. An
 * option of its own wins over {@code --set} with the same key.
 */
final class ChoiceOptions {

  private final Given<String> method;
  private final Given<String> section;
  private final Given<String> depth;
  private final Given<String> top;
  private final Given<String> bottom;
  private final Given<String> exponent;
  private final Given<String> edgeEnsembles;
  private final Given<Map<String, String>> any;

  ChoiceOptions(Usage usage) {
    method = choice(usage, "--method", "NAME", "section-normal or path-flux.");
    section =
        choice(
            usage,
            "--section",
            "LINE",
            "each-pass, common, or an azimuth in degrees from true north.");
    depth = choice(usage, "--depth", "SOURCE", "slant-mean, slant-inverse-distance or vertical.");
    top = choice(usage, "--top", "LAW", "power, constant or three-point.");
    bottom = choice(usage, "--bottom", "LAW", "power or no-slip.");
    exponent =
        choice(
            usage,
            "--exponent",
            "NUMBER|RULE",
            "A fixed exponent such as 0.1667, or fit-pass or fit-all.");
    edgeEnsembles =
        choice(usage, "--edge-ensembles", "N", "Number of ensembles averaged beside each edge.");
    any =
        usage.pairs(
            "--set",
            "KEY=VALUE",
            "Any choice by its key in settings.json, for example screening.spikes_mps=off; may be"
                + " repeated.");
  }

  private static Given<String> choice(Usage usage, String name, String label, String description) {
    return usage.option(name, label, String.class, null, description);
  }

  /** The options' choices as JSON with the keys of {@code settings.json}; empty for none. */
  String asJson() {
    Map<String, String> chosen = new LinkedHashMap<>(any.value());
    put(chosen, "method", method);
    put(chosen, isNumber(section.value()) ? "section.line.azimuth_deg" : "section.line", section);
    put(chosen, "depth.source", depth);
    put(chosen, "top", top);
    put(chosen, "bottom", bottom);
    if (isNumber(exponent.value())) {
      chosen.put("exponent.rule", "fixed");
      put(chosen, "exponent.value", exponent);
    } else {
      put(chosen, "exponent.rule", exponent);
    }
    put(chosen, "edge_ensembles", edgeEnsembles);
    return chosen.isEmpty() ? "" : NestedJson.of(chosen);
  }

  private static void put(Map<String, String> chosen, String key, Given<String> given) {
    if (given.value() != null) {
      chosen.put(key, given.value());
    }
  }

  private static boolean isNumber(String given) {
    return given != null && !given.isEmpty() && "+-.0123456789".indexOf(given.charAt(0)) >= 0;
  }

  /**
   * The settings with the options' choices in place of their own.
   *
   * @throws UnusableInput when a key or a value is not valid
   */
  Settings applyTo(Settings settings) throws UnusableInput {
    String json = asJson();
    return json.isEmpty() ? settings : SettingsFile.parse(json, "command line", settings);
  }
}
